/// # Rock slices: permeability from the shape of pores
/// Real data, R's data set rock (BP Research): 12 cores, four slices each. Slices of one core share
/// one permeability, so only 12 of the 48 rows are independent.

var rock = table("rock.csv");
var lnK  = rock.get("perm").map(Math::log);
var fit  = LeastSquares.fit(List.of("area", "peri", "shape"),
    new double[][] {rock.get("area").values(), rock.get("peri").values(), rock.get("shape").values()},
    lnK.values());
fit
keep("intercept", fit.coefficients()[0]);
keep("area / 1e4", 1e4 * fit.coefficients()[1]);
keep("peri / 1e4", 1e4 * fit.coefficients()[2]);
keep("shape", fit.coefficients()[3]);
keep("s", fit.scatter());
keep("R2", fit.rSquared());

/// ## Slices of one core are not independent

var cores = Labels.of("core", java.util.stream.IntStream.range(0, 48).mapToObj(i -> "core " + (i / 4 + 1)).toArray(String[]::new));
var x = new double[][] {rock.get("area").values(), rock.get("peri").values(), rock.get("shape").values()};
keep("error, leaving one slice out", LeaveOut.each().error(x, lnK.values()));
keep("error, leaving one core out", LeaveOut.of(cores).error(x, lnK.values()));
Replicates.warn(rock.get("perm"));
