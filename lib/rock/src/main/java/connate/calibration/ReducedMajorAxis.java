package connate.calibration;

import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.quantity.Numbers;
import connate.quantity.Units;
import org.apache.commons.math3.stat.correlation.PearsonsCorrelation;
import org.apache.commons.math3.stat.descriptive.moment.StandardDeviation;

/**
 * The line of two variables of which neither is given: both carry error.
 *
 * <pre>slope = sign(r) s_y / s_x;  intercept = ȳ − slope x̄</pre>
 *
 * <p><b>Valid</b> for the relation itself; for the prediction of y from x use ordinary least
 * squares. The reverse regression of x on y never predicts.
 *
 * <p><b>Source</b>: Kermack and Haldane (1950), Biometrika 37, 30–41.
 *
 * <p><b>Checked</b> in {@code LinesTest}.
 *
 * @param slope the slope
 * @param intercept the intercept
 * @param correlation Pearson's r
 */
public record ReducedMajorAxis(double slope, double intercept, double correlation) {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("reduced-major-axis", "Reduced major axis")
          .equation("slope = sign(r) s_y / s_x; intercept = ȳ - slope x̄")
          .input("x", "one variable", Units.number)
          .input("y", "the other variable", Units.number)
          .source("Kermack and Haldane (1950), Biometrika 37, 30–41")
          .constants(Constants.EXACT)
          .topics("calibration", "regression")
          .note("For the relation of two variables that both carry error, not for prediction.")
          .build();

  /** Returns the line of the rows in which both are present. */
  public static ReducedMajorAxis fit(double[] x, double[] y) {
    Pairs pairs = Pairs.of(x, y);
    Listening.used(CARD);
    double r = new PearsonsCorrelation().correlation(pairs.x(), pairs.y());
    StandardDeviation sd = new StandardDeviation();
    double slope = StrictMath.signum(r) * sd.evaluate(pairs.y()) / sd.evaluate(pairs.x());
    return new ReducedMajorAxis(slope, pairs.meanY() - slope * pairs.meanX(), r);
  }

  @Override
  public String toString() {
    return "y = "
        + Numbers.text(slope)
        + " x + "
        + Numbers.text(intercept)
        + ", r "
        + Numbers.text(correlation);
  }
}
