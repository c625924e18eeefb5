package connate.chance;

import connate.quantity.Quantity;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;

/** The realisations of a simulation: a sample of each result and the inputs that gave it. */
public final class Runs implements Listed {

  private final Map<String, Sample> results;
  private final Map<String, Series> inputs;
  private final Map<String, Distribution> laws;
  private final Sampling sampling;
  private final Function<Draw, Outcome> calculation;

  private Runs(
      Map<String, Sample> results,
      Map<String, Series> inputs,
      Map<String, Distribution> laws,
      Sampling sampling,
      Function<Draw, Outcome> calculation) {
    this.results = results;
    this.inputs = inputs;
    this.laws = laws;
    this.sampling = sampling;
    this.calculation = calculation;
  }

  static Runs of(
      List<Simulation.Realisation> done, Sampling sampling, Function<Draw, Outcome> calculation) {
    Map<String, Sample> results = new LinkedHashMap<>();
    Map<String, Quantity<?>> first = done.get(0).outcome().values();
    first.forEach((name, value) -> results.put(name, sample(name, value.unit(), done)));
    Map<String, Series> inputs = new LinkedHashMap<>();
    done.get(0).draw().drawn().keySet().forEach(name -> inputs.put(name, input(name, done)));
    return new Runs(results, inputs, done.get(0).draw().laws(), sampling, calculation);
  }

  /** Returns the sample of a result. */
  public Sample get(String name) {
    Sample sample = results.get(name);
    if (sample == null) {
      throw new IllegalArgumentException(
          "the runs have no «" + name + "», but " + String.join(", ", results.keySet()));
    }
    return sample;
  }

  /** Returns the names of the results. */
  public List<String> names() {
    return List.copyOf(results.keySet());
  }

  /** Returns the names of the inputs that were drawn. */
  public List<String> inputs() {
    return List.copyOf(inputs.keySet());
  }

  /** Returns the numbers that were drawn for an input. */
  public Series input(String name) {
    Series series = inputs.get(name);
    if (series == null) {
      throw new IllegalArgumentException(
          "no input «" + name + "» was drawn, but " + String.join(", ", inputs.keySet()));
    }
    return series;
  }

  /** Returns the law of an input, as the first run stated it. */
  public Distribution law(String name) {
    input(name);
    return laws.get(name);
  }

  /** Returns the number of realisations. */
  public int size() {
    return results.values().iterator().next().size();
  }

  /**
   * Runs the calculation once more with chosen probabilities for the inputs, 0.5 for the others.
   */
  Outcome at(Map<String, Double> probabilities) {
    return calculation.apply(new Draw(0, name -> probabilities.getOrDefault(name, 0.5)));
  }

  @Override
  public Listing listing() {
    Listing.Builder table =
        Listing.titled(size() + " runs, " + sampling)
            .column("result")
            .column("mean")
            .column("90 % exceed")
            .column("50 % exceed")
            .column("10 % exceed");
    results.forEach(
        (name, s) ->
            table.row(name, s.mean(), s.exceededBy(90), s.exceededBy(50), s.exceededBy(10)));
    laws.forEach((name, law) -> table.note(name + ": " + law.words()));
    return table.build();
  }

  @Override
  public String toString() {
    return listing().toString();
  }

  private static Sample sample(String name, Unit<?> unit, List<Simulation.Realisation> done) {
    double[] values = new double[done.size()];
    for (int run = 0; run < values.length; run++) {
      Quantity<?> value = done.get(run).outcome().values().get(name);
      if (value == null || value.unit().dimension() != unit.dimension()) {
        throw new IllegalArgumentException(
            "run " + run + " gives no «" + name + "» in " + unit + ": every run must");
      }
      values[run] = value.unit().convert(value.number(), unit);
    }
    return new Sample(Series.over(name, unit, values, null));
  }

  private static Series input(String name, List<Simulation.Realisation> done) {
    double[] values = new double[done.size()];
    for (int run = 0; run < values.length; run++) {
      values[run] = done.get(run).draw().drawn().getOrDefault(name, Double.NaN);
    }
    return Series.over(name, Units.number, values, null);
  }
}
