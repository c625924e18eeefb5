/// # Fontainebleau sandstone
/// Real data, digitised from Bourbié and Zinszner (1985), J. Geophys. Res. 90, 11524.

var plugs = table("porperm_Bourbie1985_Fontainebleau_sandstone.csv").unit("permeability_measured", "m2").unit("porosity", fraction);
var high  = plugs.where("porosity", p -> p > 0.08);
var low   = plugs.where("porosity", p -> p <= 0.08);
var above = PowerLaw.fit(high.get("porosity"), high.get("permeability_measured"));
var below = PowerLaw.fit(low.get("porosity"), low.get("permeability_measured"));
above
keep("exponent above 8 %", above.slope());
keep("R2 above 8 %", above.rSquared());
keep("n above 8 %", above.n());
keep("exponent below 8 %", below.slope());
keep("R2 below 8 %", below.rSquared());
keep("n below 8 %", below.n());
keep("arithmetic mean", plugs.get("permeability_measured").to(mD).mean());
keep("log10 of the geometric mean in mD", plugs.get("permeability_measured").to(mD).log10().mean());
show(crossplot(plugs.get("porosity"), plugs.get("permeability_measured")).line(above).line(below));
