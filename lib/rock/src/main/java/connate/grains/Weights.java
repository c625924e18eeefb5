package connate.grains;

import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Fraction;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Locale;

/** Checks and sums of the weights of an analysis. */
final class Weights {

  /** Caution: weights do not add up to 100. */
  static final String SUM = "M11";

  /** How far a sum of percents may be from 100, by rounding. */
  static final double SLACK = 1;

  private Weights() {}

  /** Returns the weights in percent of their sum. */
  static double[] percents(Series weights) {
    boolean parts = weights.unit().dimension() == Fraction.DIMENSION;
    double[] values = parts ? weights.in(Units.percent) : weights.values();
    double sum = sum(weights.name(), values);
    if (Math.abs(sum - 100) > SLACK) {
      String text =
          String.format(
              Locale.ROOT,
              "the weights of %s add up to %.2f, expected 100 %%",
              weights.name(),
              sum);
      if (parts) {
        throw new IllegalArgumentException(text);
      }
      if (sum > 90 && sum < 110) {
        Listening.caution(Caution.of(SUM, weights.name(), text + "; they were taken as masses"));
      }
    }
    for (int i = 0; i < values.length; i++) {
      values[i] *= 100 / sum;
    }
    return values;
  }

  private static double sum(String name, double... values) {
    double sum = 0;
    for (double value : values) {
      if (!(value >= 0) || Double.isInfinite(value)) {
        throw new IllegalArgumentException(
            "a weight of " + name + " is " + value + ": weights are 0 or more, none missing");
      }
      sum += value;
    }
    if (!(sum > 0)) {
      throw new IllegalArgumentException("the weights of " + name + " are all 0");
    }
    return sum;
  }

  /** Returns the sums from the fine end, from 0 to 100 exactly. */
  static double[] cumulate(double... percents) {
    double[] finer = new double[percents.length + 1];
    int lastWithWeight = 0;
    for (int i = 0; i < percents.length; i++) {
      finer[i + 1] = Math.min(100, finer[i] + percents[i]);
      lastWithWeight = percents[i] > 0 ? i + 1 : lastWithWeight;
    }
    for (int i = lastWithWeight; i < finer.length; i++) {
      finer[i] = 100;
    }
    return finer;
  }

  static void checkAscending(double... limits) {
    for (int i = 1; i < limits.length; i++) {
      if (!(limits[i] > limits[i - 1]) || limits[0] < 0) {
        throw new IllegalArgumentException(
            String.format(
                Locale.ROOT,
                "the limits of size classes must differ and stand in order from 0 up; found %s mm"
                    + " after %s mm",
                limits[i],
                limits[i - 1]));
      }
    }
  }

  static void reverse(double... values) {
    for (int i = 0, j = values.length - 1; i < j; i++, j--) {
      double kept = values[i];
      values[i] = values[j];
      values[j] = kept;
    }
  }
}
