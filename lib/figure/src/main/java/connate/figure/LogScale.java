package connate.figure;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/** Even decades. */
record LogScale(double low, double high) implements Scale {

  private static final double ROOM = 0.04;
  private static final int SMALL_MARKS = 6;
  private static final int[][] INSIDE = {{1}, {1, 3}, {1, 2, 5}, {1, 2, 3, 4, 5, 6, 8}};

  static LogScale around(double[]... columns) {
    double[] ends = Extent.of(0, columns);
    double low = StrictMath.log10(ends[0]);
    double high = StrictMath.log10(ends[1]);
    double room = Math.max((high - low) * ROOM, 0.02);
    return new LogScale(StrictMath.pow(10, low - room), StrictMath.pow(10, high + room));
  }

  @Override
  public boolean isLog() {
    return true;
  }

  @Override
  public double position(double value) {
    double from = StrictMath.log10(low);
    return (StrictMath.log10(value) - from) / (StrictMath.log10(high) - from);
  }

  @Override
  public double value(double position) {
    double from = StrictMath.log10(low);
    return StrictMath.pow(10, from + position * (StrictMath.log10(high) - from));
  }

  @Override
  public boolean holds(double value) {
    return value > 0 && Double.isFinite(value);
  }

  @Override
  public List<Tick> ticks(int wanted) {
    int first = (int) StrictMath.floor(StrictMath.log10(low));
    int last = (int) StrictMath.floor(StrictMath.log10(high));
    int[] inside = INSIDE[0];
    for (int i = 1; i < INSIDE.length && count(inside, first, last) < Math.min(3, wanted); i++) {
      inside = INSIDE[i];
    }
    if (count(inside, first, last) < 2) {
      return new LinearScale(low, high).ticks(Math.min(4, wanted));
    }
    int every = 1 + count(INSIDE[0], first, last) / (Math.max(2, wanted) + 1);
    return ticks(inside, first, last, every);
  }

  private int count(int[] inside, int first, int last) {
    int count = 0;
    for (int exponent = first; exponent <= last; exponent++) {
      for (int m : inside) {
        count += isInside(m, exponent) ? 1 : 0;
      }
    }
    return count;
  }

  private boolean isInside(int m, int exponent) {
    double value = value(m, exponent).doubleValue();
    return value >= low && value <= high;
  }

  private static BigDecimal value(int m, int exponent) {
    return BigDecimal.valueOf(m).scaleByPowerOfTen(exponent);
  }

  private List<Tick> ticks(int[] inside, int first, int last, int every) {
    boolean power = first < -4 || last > 5;
    List<Tick> ticks = new ArrayList<>();
    for (int exponent = first; exponent <= last; exponent++) {
      for (int m = 1; m <= 9; m++) {
        if (isInside(m, exponent)) {
          boolean major = holds(inside, m) && Math.floorMod(exponent, every) == 0;
          if (major) {
            ticks.add(major(m, exponent, power));
          } else if (last - first <= SMALL_MARKS) {
            ticks.add(Tick.of(value(m, exponent).doubleValue(), ""));
          }
        }
      }
    }
    return ticks;
  }

  private static Tick major(int m, int exponent, boolean power) {
    BigDecimal value = value(m, exponent);
    if (power && m == 1) {
      return new Tick(value.doubleValue(), Integer.toString(exponent), true);
    }
    String plain = power ? m + "e" + exponent : value.toPlainString();
    return Tick.of(value.doubleValue(), plain);
  }

  private static boolean holds(int[] inside, int m) {
    for (int i : inside) {
      if (i == m) {
        return true;
      }
    }
    return false;
  }
}
