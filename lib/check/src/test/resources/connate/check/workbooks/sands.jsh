/// # 3,326 sands: conductivity from grain size against measurement
/// Real data of the Dutch subsurface, TNO TopIntegraal (de Rijk and others 2024).

var samples = table("psd_kf_sand.csv");
var sand    = GrainCurves.of(samples.series(), um);
var kf      = samples.unit("Kf", "m/d").get("Kf");
var all     = Conductivity.all(sand, degC(10));
all

/// ## Error of each formula in decades, formula over measurement

var names  = all.formulas();
var errors = new double[names.size()];
for (int i = 0; i < errors.length; i++) {
    errors[i] = all.get(names.get(i)).to(mPerDay).ratioTo(kf).log10().mean().number();
}
var error = Series.of("mean error", decades, errors);
show(bars(Labels.of("formula", names.toArray(String[]::new)), error));
keep("curves", sand.count());
keep("mean error of Hazen", Units.decades(errors[names.indexOf("hazen")]));
keep("mean log10 Kf", kf.log10().mean());
