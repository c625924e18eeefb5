package connate.conductivity;

import connate.method.MethodCard;
import connate.quantity.HydraulicConductivity;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Estimate;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;

/** Conductivities by many formulas, each marked where the sand is outside the formula's range. */
public final class ConductivityTable implements Listed {

  private final List<MethodCard> cards;
  private final double[][] metresPerDay;
  private final String[][] outside;

  ConductivityTable(List<MethodCard> cards, double[][] metresPerDay, String[][] outside) {
    this.cards = cards;
    this.metresPerDay = metresPerDay;
    this.outside = outside;
  }

  /** Returns the ids of the formulas. */
  public List<String> formulas() {
    return cards.stream().map(MethodCard::id).toList();
  }

  /** Returns the number of sands. */
  public int size() {
    return metresPerDay[0].length;
  }

  /**
   * Returns the conductivities by one formula; missing where it has none.
   *
   * @throws IllegalArgumentException if there is no such formula
   */
  public Series get(String formula) {
    return Series.of("K " + formula, Units.mPerDay, metresPerDay[index(formula)]);
  }

  /** Returns why a sand is outside the range of a formula, empty where it is within. */
  public String outside(String formula, int row) {
    return outside[index(formula)][row];
  }

  /** Returns the table without the values that are outside the range of their formula. */
  public ConductivityTable within() {
    double[][] kept = new double[metresPerDay.length][];
    for (int f = 0; f < kept.length; f++) {
      kept[f] = metresPerDay[f].clone();
      for (int row = 0; row < kept[f].length; row++) {
        kept[f][row] = outside[f][row].isEmpty() ? kept[f][row] : Double.NaN;
      }
    }
    return new ConductivityTable(cards, kept, outside);
  }

  /**
   * Returns the geometric mean of all values.
   *
   * @throws IllegalArgumentException if there is none
   */
  public HydraulicConductivity geometricMean() {
    return Units.mPerDay(StrictMath.exp(logs().average().orElseThrow(ConductivityTable::none)));
  }

  /** Returns the geometric mean with the least and the largest value. */
  public Estimate<HydraulicConductivity> range() {
    return new Estimate<>(
        geometricMean(),
        Units.mPerDay(StrictMath.exp(logs().min().orElseThrow(ConductivityTable::none))),
        Units.mPerDay(StrictMath.exp(logs().max().orElseThrow(ConductivityTable::none))),
        "least to largest");
  }

  /** Returns the geometric mean over the formulas for each sand. */
  public Series geometricMeans() {
    double[] means = new double[size()];
    for (int row = 0; row < means.length; row++) {
      int at = row;
      means[row] =
          StrictMath.exp(
              Arrays.stream(metresPerDay)
                  .mapToDouble(k -> k[at])
                  .filter(k -> k > 0)
                  .map(StrictMath::log)
                  .average()
                  .orElse(Double.NaN));
    }
    return Series.of("K", Units.mPerDay, means);
  }

  /** Returns the standard deviation of log10 of the values about their mean, in decades. */
  public Ratio spread() {
    double[] logs = logs().toArray();
    double mean = DoubleStream.of(logs).average().orElseThrow(ConductivityTable::none);
    double squares = DoubleStream.of(logs).map(v -> (v - mean) * (v - mean)).sum();
    return Units.decades(
        StrictMath.sqrt(squares / Math.max(1, logs.length - 1)) / StrictMath.log(10));
  }

  private DoubleStream logs() {
    return Arrays.stream(metresPerDay)
        .flatMapToDouble(Arrays::stream)
        .filter(k -> k > 0)
        .map(StrictMath::log);
  }

  private static IllegalArgumentException none() {
    return new IllegalArgumentException(
        "no formula has a value here: every one is outside its range; look at the whole table");
  }

  private int index(String formula) {
    int index = formulas().indexOf(formula);
    if (index < 0) {
      throw new IllegalArgumentException(
          "no formula «" + formula + "», but " + String.join(", ", formulas()));
    }
    return index;
  }

  @Override
  public Listing listing() {
    return size() == 1 ? ofOne() : ofMany();
  }

  private Listing ofOne() {
    Listing.Builder table =
        Listing.titled("hydraulic conductivity from grain size")
            .column("formula")
            .column("K", Units.mPerDay)
            .column("outside its range");
    for (int f = 0; f < metresPerDay.length; f++) {
      table.row(cards.get(f).title(), metresPerDay[f][0], outside[f][0]);
    }
    return table.build();
  }

  private Listing ofMany() {
    Listing.Builder table =
        Listing.titled("hydraulic conductivity of " + size() + " sands from grain size")
            .column("formula")
            .column("values")
            .column("outside its range")
            .column("geometric mean", Units.mPerDay)
            .column("least", Units.mPerDay)
            .column("largest", Units.mPerDay);
    for (int f = 0; f < metresPerDay.length; f++) {
      table.row(summary(f).toArray());
    }
    return table.build();
  }

  private List<Object> summary(int f) {
    double[] k = Arrays.stream(metresPerDay[f]).filter(v -> v > 0).toArray();
    List<Object> row = new ArrayList<>();
    row.add(cards.get(f).title());
    row.add(k.length);
    row.add((int) Arrays.stream(outside[f]).filter(text -> !text.isEmpty()).count());
    double mean = DoubleStream.of(k).map(StrictMath::log).average().orElse(Double.NaN);
    row.add(StrictMath.exp(mean));
    row.add(DoubleStream.of(k).min().orElse(Double.NaN));
    row.add(DoubleStream.of(k).max().orElse(Double.NaN));
    return row;
  }

  @Override
  public String toString() {
    return listing().toString();
  }
}
