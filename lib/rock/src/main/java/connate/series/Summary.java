package connate.series;

import connate.quantity.Quantity;
import java.util.Arrays;
import java.util.function.DoubleFunction;
import java.util.function.ToDoubleFunction;

/** What a column comes to: extremes, mean, median, one line of text. */
final class Summary {

  private Summary() {}

  static Quantity<?> of(Series series, ToDoubleFunction<double[]> statistic) {
    double[] present = series.present();
    if (present.length == 0) {
      throw new IllegalArgumentException("«" + series.name() + "» has no value in any row");
    }
    return series.unit().of(statistic.applyAsDouble(present));
  }

  static double[] present(Series series) {
    double[] values = series.values();
    int count = 0;
    for (double value : values) {
      if (!Double.isNaN(value)) {
        values[count++] = value;
      }
    }
    return Arrays.copyOf(values, count);
  }

  static double min(double[] values) {
    return Arrays.stream(values).min().orElse(Double.NaN);
  }

  static double max(double[] values) {
    return Arrays.stream(values).max().orElse(Double.NaN);
  }

  static double mean(double[] values) {
    double sum = 0;
    for (double value : values) {
      sum += value;
    }
    return sum / values.length;
  }

  static double median(double[] values) {
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    int half = sorted.length / 2;
    return sorted.length % 2 == 1 ? sorted[half] : (sorted[half - 1] + sorted[half]) / 2;
  }

  static String line(Series series, DoubleFunction<String> write) {
    double[] present = series.present();
    String unit = series.unit().suffix();
    StringBuilder out = new StringBuilder(series.name()).append(": ");
    out.append(series.size()).append(" rows");
    if (present.length < series.size()) {
      out.append(", ").append(series.size() - present.length).append(" missing");
    }
    if (present.length > 0) {
      out.append(", ").append(write.apply(min(present))).append(" to ");
      out.append(write.apply(max(present))).append(unit);
      out.append(", mean ").append(write.apply(mean(present))).append(unit);
    }
    return out.toString();
  }
}
