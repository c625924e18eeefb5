package connate.figure;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.distribution.NormalDistribution;

/** Percent on a scale on which a normal law is a straight line. */
record NormalScale(double low, double high) implements Scale {

  private static final NormalDistribution NORMAL = new NormalDistribution(null, 0, 1);
  private static final double[] MARKS = {0.01, 0.1, 1, 5, 10, 25, 50, 75, 90, 95, 99, 99.9, 99.99};

  @Override
  public double position(double value) {
    double from = z(low);
    return (z(value) - from) / (z(high) - from);
  }

  @Override
  public double value(double position) {
    double from = z(low);
    return 100 * NORMAL.cumulativeProbability(from + position * (z(high) - from));
  }

  @Override
  public boolean holds(double value) {
    return value > 0 && value < 100;
  }

  @Override
  public List<Tick> ticks(int wanted) {
    List<Tick> ticks = new ArrayList<>();
    for (double mark : MARKS) {
      if (mark >= low && mark <= high) {
        ticks.add(Tick.of(mark, connate.quantity.Numbers.text(mark)));
      }
    }
    return ticks;
  }

  /** Returns the standard normal value below which so many percent lie. */
  static double z(double percent) {
    return NORMAL.inverseCumulativeProbability(percent / 100);
  }
}
