package connate.series;

import connate.quantity.Numbers;
import connate.quantity.Unit;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;

/** A series over an array of its own. */
final class ArraySeries implements Series {

  private final String name;
  private final Unit<?> unit;
  private final double[] values;
  private final Map<String, String> traits;
  private final Series depth;

  ArraySeries(
      String name, Unit<?> unit, double[] values, Map<String, String> traits, Series depth) {
    this.name = Objects.requireNonNull(name, "name");
    this.unit = Objects.requireNonNull(unit, "unit");
    this.values = values;
    this.traits = traits;
    if (depth != null && depth.size() != values.length) {
      throw new IllegalArgumentException(
          name + " has " + values.length + " rows, its depth " + depth.size());
    }
    this.depth = depth;
  }

  @Override
  public String name() {
    return name;
  }

  @Override
  public Unit<?> unit() {
    return unit;
  }

  @Override
  public int size() {
    return values.length;
  }

  @Override
  public double value(int row) {
    return values[row];
  }

  @Override
  public double[] values() {
    return values.clone();
  }

  @Override
  public Optional<Series> depth() {
    return Optional.ofNullable(depth);
  }

  @Override
  public Map<String, String> traits() {
    return traits;
  }

  @Override
  public String toString() {
    return Summary.line(this, Numbers::text);
  }
}
