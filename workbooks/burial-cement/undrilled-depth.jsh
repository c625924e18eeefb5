/// # Porosity and permeability of the Brede Sandstone at 4,100 m
/// No well has reached it. Its burial history, its grains and its coats are known from a shallower
/// well; compaction and quartz cement are run along the history to the present. The Brede Sandstone
/// does not exist: all data are invented.

var points = table("burial.csv");
points

/// ## Assumptions

var grain   = assume("grain size", um(280));
var sorting = assume("sorting, Trask", 1.3);
var quartz  = assume("quartz of the grains", percent(82));
var coat    = assume("coat on the quartz", percent(55));
var rate    = assume("factor on the rate of quartz cement", 1.0);

/// ## The sand at deposition
/// Sorting sets the porosity at deposition; the table of packed sands is the check.

var sand = Sandstone.of(grain, number(sorting), quartz).coated(coat);
sand
keep("porosity at deposition", sand.initial());
keep("packed sand of this size and sorting", BeardWeyl.porosity(grain, number(sorting)));

/// ## Through time
/// The volume between the grains falls with the greatest stress felt; quartz grows from 70 °C on,
/// faster with each degree, slower as the open surface goes. Clay coats keep surface from growing.

var burial = BurialHistory.of(points.get("age"), points.get("depth"), points.get("temperature"));
var model  = BurialModel.of(sand).with("rate", rate);
var past   = model.along(burial);
past
show(curves(past.age(), past.porosity(), past.cement(), past.intergranularVolume()).quantity("share of the rock"));
show(curves(past.age(), past.permeability()).logAxis());
show(curves(past.depth(), past.porosity()).downwards());
keep("porosity at 4,100 m, middle case", past.finalPorosity());
keep("permeability at 4,100 m, middle case", past.finalPermeability());

/// Kozeny and Carman's law is made for loose grains and flatters cemented rock; a fit to the plugs of a
/// cemented sandstone is the other opinion.

keep("permeability by the fit to Garn plugs", model.with(PermeabilityRule.GARN).along(burial).finalPermeability());

/// ## What coats are worth
/// The same sand without coats, and with the coats that the best samples have.

var bare = model.with("coat", 0).along(burial);
var best = model.with("coat", 0.95).along(burial);
keep("porosity without coats", bare.finalPorosity());
keep("porosity with 95 % coats", best.finalPorosity());
show(curves(past.age(), bare.porosity().named("no coat"), past.porosity().named("55 % coat"), best.porosity().named("95 % coat")).quantity("porosity"));

/// ## With range
/// Coat, grain size and quartz vary within the bed; the rate of cement differs between provinces by
/// a factor of two or more. Each run draws all four.

var uncertain = model
    .uncertain("coat", normal(coat.fraction(), 0.12))
    .uncertain("grain size", normal(grain, um(40)))
    .uncertain("quartz", normal(quartz.fraction(), 0.05))
    .uncertain("rate", lognormal(rate, 0.5));
var runs = simulate(20_000, seed(7), draw -> uncertain.with(draw).along(burial).present());
runs
show(histogram(runs.get("porosity")));
show(histogram(runs.get("permeability")).logAxis());
keep("porosity at 4,100 m", runs.get("porosity").exceedance(90, 50, 10));
keep("permeability at 4,100 m", runs.get("permeability").exceedance(90, 50, 10));
show(tornado(runs, "permeability"));

/// The model knows no oil charge, no pressure solution elsewhere and no other cement; its rate is
/// that of one province. These are estimates from invented data; a decision to drill needs more.
