/// # Well AST-02: plugs, logs, and a transform
/// Real data of the Roer Valley Graben (Luijendijk and Gleeson 2015, Geofluids 15, 67–83).

var plugs = table("porperm_data_well_AST02.csv").unit("permeability_measured", "m2").unit("porosity", fraction);
var logs  = table("well_logs_AST02.csv").unit("depth", m).unit("RHOB", gPerCm3).unit("GR", gAPI);
plugs

/// ## Transform

var phi = plugs.get("porosity");
var k   = plugs.get("permeability_measured");
var fit = LogLinear.fit(phi, k);
fit
keep("slope", fit.slope());
keep("intercept", fit.intercept());
keep("R2", fit.rSquared());
keep("n", fit.n());
keep("scatter", fit.scatter());
keep("log10 of the geometric mean in mD", k.to(mD).log10().mean());
show(crossplot(phi, k).line(fit).band(fit.prediction(0.80)));

/// ## Log permeability with core over it

var well = Well.of("AST-02", logs);
well.add("PHI", DensityPorosity.of(well.get("RHOB"), gPerCm3(2.65), gPerCm3(1.05)).map(p -> Math.max(p, 0)));
well.add("K", fit.expected(well.get("PHI")));
show(depthPlot(well).track("GR").track("PHI", plugs.unit("depth", m).get("porosity"))
    .track("K", plugs.unit("depth", m).get("permeability_measured")).between(m(1220), m(1545)));
