package connate.figure;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;

/** Even steps. */
record LinearScale(double low, double high) implements Scale {

  private static final double ROOM = 0.04;
  private static final double[] STEPS = {1, 2, 5, 10};

  static LinearScale around(double[]... columns) {
    double[] ends = Extent.of(Double.NEGATIVE_INFINITY, columns);
    double low = ends[0];
    double high = ends[1];
    double room = (high - low) * ROOM;
    if (room == 0) {
      room = low == 0 ? 1 : Math.abs(low) * 0.1;
    }
    boolean fromZero = low >= 0 && low - room < (high - low) * 0.25;
    boolean toZero = high <= 0 && high + room > (low - high) * 0.25;
    return new LinearScale(
        fromZero ? (low == 0 ? -room / 4 : 0) : low - room, toZero ? 0 : high + room);
  }

  /** Returns a scale for lengths of bars: from zero. */
  static LinearScale fromZero(double... values) {
    double[] ends = Extent.of(Double.NEGATIVE_INFINITY, values, new double[] {0});
    double room = Math.max((ends[1] - ends[0]) * ROOM, Double.MIN_NORMAL);
    return new LinearScale(
        ends[0] < 0 ? ends[0] - room : 0, ends[1] > 0 || ends[0] == 0 ? ends[1] + room : 0);
  }

  @Override
  public double position(double value) {
    return (value - low) / (high - low);
  }

  @Override
  public double value(double position) {
    return low + position * (high - low);
  }

  @Override
  public boolean holds(double value) {
    return Double.isFinite(value);
  }

  @Override
  public List<Tick> ticks(int wanted) {
    BigDecimal step = step((high - low) / Math.max(1, wanted));
    List<Tick> ticks = new ArrayList<>();
    double size = step.doubleValue();
    BigDecimal at = step.multiply(BigDecimal.valueOf(low / size).setScale(0, RoundingMode.CEILING));
    for (; at.doubleValue() <= high * (1 + 1e-12); at = at.add(step)) {
      ticks.add(Tick.of(at.doubleValue(), words(at)));
      if (ticks.size() > 100) {
        break;
      }
    }
    return ticks;
  }

  /** Returns the least of 1, 2, 5 times a power of ten that is not less. */
  static BigDecimal step(double least) {
    int exponent = (int) StrictMath.floor(StrictMath.log10(least));
    double mantissa = least / StrictMath.pow(10, exponent);
    for (double step : STEPS) {
      if (step >= mantissa * (1 - 1e-9)) {
        return BigDecimal.valueOf((long) step).scaleByPowerOfTen(exponent).stripTrailingZeros();
      }
    }
    return BigDecimal.ONE.scaleByPowerOfTen(exponent + 1);
  }

  private static String words(BigDecimal at) {
    if (at.signum() == 0) {
      return "0";
    }
    double size = Math.abs(at.doubleValue());
    boolean plain = size >= 1e-4 && size < 1e7;
    String text =
        plain ? at.toPlainString() : at.stripTrailingZeros().round(Extent.DIGITS).toString();
    return text.replace("E+", "e").replace('E', 'e').replace('-', '−');
  }
}
