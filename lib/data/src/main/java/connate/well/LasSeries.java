package connate.well;

import connate.las.LasCurve;
import connate.quantity.Unit;
import connate.series.Series;
import java.util.Optional;

/** A curve of a file seen as a series, without a copy of its numbers. */
record LasSeries(String name, Unit<?> unit, LasCurve source, Series at) implements Series {

  @Override
  public int size() {
    return source.size();
  }

  @Override
  public double value(int row) {
    return source.value(row);
  }

  @Override
  public double[] values() {
    return source.values();
  }

  @Override
  public Optional<Series> depth() {
    return Optional.of(at);
  }

  @Override
  public String toString() {
    return named(name).toString();
  }
}
