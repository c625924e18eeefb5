/// # Tarn Hill: permeability of the Lower Sand
/// Core plugs from TH-1 and TH-3 give the transform; the logs of four wells carry it to the layers.
/// Tarn Hill does not exist: field, wells and numbers are invented.

var plugs = table("core-plugs.csv");
var wells = wells("wells/*.las");
var tops  = tops("tops.csv");
plugs
wells

/// ## Assumptions
/// Each of these can be overridden at replay: `--assume "porosity cutoff=10 %"`.

var matrix  = assume("matrix density", gPerCm3(2.65));
var fluid   = assume("fluid density", gPerCm3(1.05));
var clean   = assume("gamma ray of clean sand", gAPI(22));
var shale   = assume("gamma ray of shale", gAPI(130));
var bound   = assume("porosity of shale", percent(12));
var stress  = assume("net stress", MPa(24));
var cutoff  = assume("porosity cutoff", percent(8));

/// ## Plugs to reservoir conditions
/// The laboratory measured air permeability at low pressure. Gas slips along the pore walls, which
/// flatters tight plugs most; then the rock's own stress closes pores.

var kLiquid = Klinkenberg.liquid(plugs.get("k_air"), plugs.get("mean_pressure"), JonesOwens.SLIP);
var kInsitu = JonesStress.atStress(kLiquid, stress);
var core    = plugs.with("k", kInsitu);
show(histogram(core.get("k")).logAxis().byGroup(core.labels("facies")));

/// ## Rock types
/// The flow zone indicator groups plugs by pore throat; the groups must make sense against facies.

var types = FlowZones.cluster(core.get("porosity"), core.get("k"));
show(types);

/// ## Which transform
/// Candidates side by side, each tested on a well that it has not seen. Errors are in decades.

show(Transforms.compare(core.get("porosity"), core.get("k"), leaveOut(core.labels("well")),
    LogLinear.FORM, PowerLaw.FORM, KozenyCarman.FORM));
var fit = LogLinear.fit(core.get("porosity"), core.get("k"));
fit
show(crossplot(core.get("porosity"), core.get("k")).byGroup(core.labels("facies"))
    .line(fit).band(fit.prediction(0.80)));
keep("scatter of the transform", fit.scatter());
keep("mean over median", fit.meanFactor());

/// ## Core and logs on one depth
/// Core depth is driller's depth. The shift is where density porosity follows core porosity best.

var th1   = wells.named("TH-1");
var phi1  = DensityPorosity.of(th1.get("RHOB"), matrix, fluid);
var shift = CoreShift.best(phi1, core.where("well", "TH-1").get("porosity"), m(2));
shift
keep("core shift, TH-1", shift.shift());

/// ## Along the wells
/// Effective porosity is density porosity less what shale holds; permeability is the mean that the
/// transform gives, not its median.

for (var w : wells) {
    var vsh = ShaleVolume.larionovOlder(w.get("GR"), clean, shale);
    var phi = DensityPorosity.of(w.get("RHOB"), matrix, fluid).less(vsh.times(bound));
    w.add("PHI", phi.map(p -> Math.max(p, 0)));
    w.add("K", fit.expected(w.get("PHI")));
}
var core3 = core.where("well", "TH-3");
show(depthPlot(wells.named("TH-3"))
    .track("GR")
    .track("PHI", core3.get("porosity"))
    .track("K", core3.get("k"))
    .zones(tops));

/// ## Layers
/// Along the layers the arithmetic mean holds, across them the harmonic; the truth for a block lies
/// between. The range is that between the wells.

var layers = Layers.of(wells, tops).where("PHI", above(cutoff));
show(layers.summary("PHI", "K"));
show(Layers.of(wells, tops).in("Lower Sand")
    .sensitivity("PHI", "K", percent(0), percent(4), percent(6), percent(8), percent(10), percent(12)));
var sand = layers.in("Lower Sand");
keep("porosity, Lower Sand", sand.mean("PHI"));
keep("net to gross, Lower Sand", sand.netToGross());
keep("k along, Lower Sand", sand.arithmetic("K"));
keep("k across, Lower Sand", sand.harmonic("K"));
keep("kh, Lower Sand", sand.kh("K"));
keep("Dykstra-Parsons, plugs", DykstraParsons.of(core.get("k")));

/// ## What it means for a well
/// Steady flow of oil to a well at the TH-5 location, no skin.

var q = Darcy.radial(sand.arithmetic("K").value(), m(18), bar(35), cP(0.9), m(400), m(0.11));
keep("rate, TH-5 location", q.to(m3PerDay));

/// These are estimates from invented data. A real decision to drill or inject needs tests, local codes
/// and licensed practice.
