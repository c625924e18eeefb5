package connate.calibration;

import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.quantity.Numbers;
import connate.quantity.Units;
import java.util.Arrays;

/**
 * A line that a few wild plugs do not move: the median of the slopes of all pairs.
 *
 * <pre>slope = median((y_j − y_i) / (x_j − x_i));  intercept = median(y − slope x)</pre>
 *
 * <p><b>Valid</b> while fewer than 29 % of the rows are wild. Memory grows with n²: at most 6,000
 * rows.
 *
 * <p><b>Source</b>: Theil (1950), Proc. K. Ned. Akad. Wet. 53, 386–392; Sen (1968), J. Am. Stat.
 * Assoc. 63, 1379–1389.
 *
 * <p><b>Checked</b> in {@code LinesTest}.
 *
 * @param slope the slope
 * @param intercept the intercept
 */
public record TheilSen(double slope, double intercept) {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("theil-sen", "Theil–Sen line")
          .equation("slope = median((y_j - y_i) / (x_j - x_i)); intercept = median(y - slope x)")
          .input("x", "the given variable", Units.number)
          .input("y", "the other variable", Units.number)
          .source(
              "Theil (1950), Proc. K. Ned. Akad. Wet. 53, 386–392; Sen (1968), J. Am. Stat. Assoc."
                  + " 63, 1379–1389")
          .constants(Constants.EXACT)
          .topics("calibration", "regression", "robust")
          .note("Holds while fewer than 29 % of the rows are wild.")
          .build();

  private static final int MOST = 6000;

  /** Returns the line of the rows in which both are present. */
  public static TheilSen fit(double[] x, double[] y) {
    Pairs pairs = Pairs.of(x, y);
    if (pairs.size() > MOST) {
      throw new IllegalArgumentException(
          "Theil–Sen takes at most " + MOST + " rows, found " + pairs.size());
    }
    Listening.used(CARD);
    double slope = median(slopes(pairs));
    double[] rest = new double[pairs.size()];
    for (int i = 0; i < rest.length; i++) {
      rest[i] = pairs.y()[i] - slope * pairs.x()[i];
    }
    return new TheilSen(slope, median(rest));
  }

  private static double[] slopes(Pairs pairs) {
    int n = pairs.size();
    double[] slopes = new double[n * (n - 1) / 2];
    int count = 0;
    for (int i = 0; i < n; i++) {
      for (int j = i + 1; j < n; j++) {
        double dx = pairs.x()[j] - pairs.x()[i];
        if (dx != 0) {
          slopes[count++] = (pairs.y()[j] - pairs.y()[i]) / dx;
        }
      }
    }
    return Arrays.copyOf(slopes, count);
  }

  private static double median(double[] values) {
    Arrays.sort(values);
    return connate.chance.Quantiles.of(values, 0.5);
  }

  @Override
  public String toString() {
    return "y = " + Numbers.text(slope) + " x + " + Numbers.text(intercept);
  }
}
