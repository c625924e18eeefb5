/// # The library's words
var density = assume("matrix density", gPerCm3(2.65));
var cutoff = assume("porosity cutoff", percent(8));
assume("exponent", 1.8)
assume("count", 3)
assume("well", "TH-1")
assume("gas", false)
keep("density", density);
keep("number", 1.0 / 3);
keep("count", 4);
show(density, cutoff, "text", null);
show("alone");
show();
var phi = Series.of("porosity", percent, 18, 21, Double.NaN);
phi.in(fraction)
phi.times(2)
var many = IntStream.range(0, 200).boxed().toList();
many
density.in(kgPerM3)
mD(250).to(darcy)
m(3).compareTo(ft(3)) > 0
Permeability.parse("250 mD")
List<Quantity<?>> mixed = List.of(mD(1), m(2));
mixed
var both = List.of(mD(1), m(2));
both.get(0)
List.of(1, 2.5).get(1)
Map.of("a", 1)
Listing.titled("rows").column("name").column("k", mD).row("a", mD(3)).build()
new Object()
seed(3)
Stream.of(3, 1, 2).sorted(Comparator.reverseOrder()).map(v -> mD(v)).toList()
var runs = simulate(100, seed(7), draw -> Outcome.of("k", draw.of("k", lognormal(2.0, 0.5))));
keep("k", runs.get("k").exceedance(90, 50, 10));
show(crossplot(Series.of("x", m, 1, 2, 3), Series.of("y", mD, 10, 20, 15)));
histogram(Series.of("x", m, 1, 2, 3, 3, 4))
above(percent(8))
