package connate.chance;

import connate.quantity.Numbers;
import connate.quantity.Quantity;
import java.util.List;
import java.util.stream.Collectors;

/**
 * Values with the part of the runs that exceed them. The trade writes P90 both for the low and for
 * the high end; here it is always said which.
 *
 * @param name the result
 * @param runs the number of runs
 * @param points the values
 */
public record Exceedance(String name, int runs, List<Point> points) {

  /**
   * A value.
   *
   * @param percent how many percent of the runs exceed it
   * @param value the value
   */
  public record Point(double percent, Quantity<?> value) {

    /** Checks the percentage. */
    public Point {
      if (!(percent > 0 && percent < 100)) {
        throw new IllegalArgumentException(
            "so many percent exceed a value: above 0 and below 100, found " + percent);
      }
    }
  }

  /** Checks that there is a value. */
  public Exceedance {
    if (points.isEmpty()) {
      throw new IllegalArgumentException("name at least one percentage, such as 90, 50, 10");
    }
    points = List.copyOf(points);
  }

  /** Returns the value in the middle of the list, which stands for the whole. */
  public Quantity<?> middle() {
    return points.get(points.size() / 2).value();
  }

  /** Returns the smallest of the values. */
  public Quantity<?> low() {
    return points.stream().map(Point::value).min(Exceedance::bySize).orElseThrow();
  }

  /** Returns the largest of the values. */
  public Quantity<?> high() {
    return points.stream().map(Point::value).max(Exceedance::bySize).orElseThrow();
  }

  /** Returns the percentages in words, such as {@code exceeded by 90, 50, 10 %}. */
  public String words() {
    return "exceeded by "
        + points.stream().map(p -> Numbers.text(p.percent())).collect(Collectors.joining(", "))
        + " %";
  }

  private static int bySize(Quantity<?> a, Quantity<?> b) {
    return Double.compare(a.si(), b.si());
  }

  @Override
  public String toString() {
    return points.stream()
        .map(p -> p.value() + " (exceeded by " + Numbers.text(p.percent()) + " %)")
        .collect(Collectors.joining(", "));
  }
}
