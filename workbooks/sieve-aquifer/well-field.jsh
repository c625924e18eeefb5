/// # Well field at Sallow Fen: conductivity from sieves, drawdown of a new well
/// Eight sieve samples of one borehole in a sand aquifer. Sallow Fen does not exist: borehole and
/// numbers are invented.

var samples = table("sieves.csv");
var sand    = GrainCurves.of(samples.series());
samples

/// ## Assumptions

var porosity    = assume("porosity", fraction(0.34));
var temperature = assume("temperature of the groundwater", degC(11));
var thickness   = assume("thickness of the aquifer", m(22));
var storativity = assume("storativity", 2e-4);
var rate        = assume("pumping rate", m3PerDay(900));
var distance    = assume("distance to the wet meadow", m(50));

/// ## Grain-size curves

sand
var finest = IntStream.range(0, sand.size())
    .mapToObj(i -> sand.curve(i).cumulative().named(samples.labels("sample").label(i)))
    .toArray(Series[]::new);
show(curves(sand.curve(0).limits(), finest));
keep("median d10", sand.d(10).median());
keep("median d50", sand.d(50).median());

/// ## Conductivity, every formula side by side
/// Each formula has its own range of grain sizes and sorting. Values out of range are marked and do
/// not count; what is left still differs by a factor, which is the honest range of the method.

var all = Conductivity.all(sand, porosity, temperature);
all
var k = all.within();
keep("K, geometric mean", k.geometricMean());
keep("K, range of formulas and samples", k.range());
show(bars(samples.labels("sample"), k.geometricMeans()).logAxis());
keep("permeability", Conductivity.permeability(k.geometricMean(), temperature).to(darcy));

/// ## Drawdown
/// Theis: a confined, unbounded, uniform aquifer. Sieves see small disturbed samples; a pumping test
/// sees the aquifer. The range of K is carried through.

var t = k.geometricMean().times(thickness);
keep("transmissivity", t);
keep("drawdown after 30 d", Theis.drawdown(rate, t, storativity, distance, days(30)));
keep("drawdown after 30 d, low K", Theis.drawdown(rate, k.range().low().times(thickness), storativity, distance, days(30)));
keep("drawdown after 30 d, high K", Theis.drawdown(rate, k.range().high().times(thickness), storativity, distance, days(30)));

var radii = Series.of("distance", m, 5, 10, 20, 50, 100, 200, 500, 1000);
var s30   = Theis.drawdown(rate, t, number(storativity), radii, days(30)).named("after 30 d");
var s365  = Theis.drawdown(rate, t, number(storativity), radii, days(365)).named("after 1 year");
show(curves(radii, s30, s365).logX().quantity("drawdown"));

/// Abstraction near wetlands and wells needs the regulator's licence and a pumping test; this is an
/// estimate from invented data.
