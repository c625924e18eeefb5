package connate.chance;

import connate.quantity.Quantity;
import connate.quantity.Unit;
import connate.series.Series;
import java.util.Arrays;

/** The values of one result over all runs. */
public final class Sample implements Series {

  private final Series values;
  private final double[] sorted;

  Sample(Series values) {
    this.values = values;
    this.sorted = values.present();
    Arrays.sort(sorted);
  }

  /** Returns a sample of the present values of any series. */
  public static Sample of(Series series) {
    return new Sample(series);
  }

  @Override
  public String name() {
    return values.name();
  }

  @Override
  public Unit<?> unit() {
    return values.unit();
  }

  @Override
  public int size() {
    return values.size();
  }

  @Override
  public double value(int row) {
    return values.value(row);
  }

  /** Returns the value that so many percent of the runs exceed. */
  public Quantity<?> exceededBy(double percent) {
    return unit().of(Quantiles.of(sorted, 1 - percent / 100));
  }

  /** Returns the values that so many percent of the runs exceed. */
  public Exceedance exceedance(double... percents) {
    return new Exceedance(
        name(),
        sorted.length,
        Arrays.stream(percents).mapToObj(p -> new Exceedance.Point(p, exceededBy(p))).toList());
  }

  /** Returns the mean, with the standard error that comes from the number of runs. */
  public double standardErrorOfMean() {
    double mean = Arrays.stream(sorted).average().orElseThrow();
    double squares = Arrays.stream(sorted).map(v -> (v - mean) * (v - mean)).sum();
    return StrictMath.sqrt(squares / (sorted.length - 1.0) / sorted.length);
  }

  @Override
  public String toString() {
    return exceedance(90, 50, 10).toString();
  }
}
