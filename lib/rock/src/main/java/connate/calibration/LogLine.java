package connate.calibration;

import connate.formula.TransformForm;
import java.util.List;
import org.apache.commons.math3.distribution.TDistribution;

/** The straight line of log10 k on a form's regressor, its slope fitted or fixed at 1. */
final class LogLine {

  private final double intercept;
  private final double slope;
  private final double interceptError;
  private final double slopeError;
  private final double scatter;
  private final double rSquared;
  private final double[] residuals;
  private final LeastSquares squares;

  private LogLine(LeastSquares fit) {
    this.squares = fit;
    this.intercept = fit.coefficients()[0];
    this.slope = fit.coefficients()[1];
    this.interceptError = fit.standardErrors()[0];
    this.slopeError = fit.standardErrors()[1];
    this.scatter = fit.scatter();
    this.rSquared = fit.rSquared();
    this.residuals = fit.residuals();
  }

  /** A line whose slope is 1: only the offset is fitted. */
  private LogLine(double[] x, double[] y) {
    this.squares = null;
    this.slope = 1;
    this.slopeError = 0;
    double sum = 0;
    for (int i = 0; i < x.length; i++) {
      sum += y[i] - x[i];
    }
    this.intercept = sum / x.length;
    this.residuals = new double[x.length];
    double rss = 0;
    double mean = 0;
    for (int i = 0; i < x.length; i++) {
      residuals[i] = y[i] - x[i] - intercept;
      rss += residuals[i] * residuals[i];
      mean += y[i] / y.length;
    }
    double total = 0;
    for (double value : y) {
      total += (value - mean) * (value - mean);
    }
    this.scatter = StrictMath.sqrt(rss / (x.length - 1));
    this.interceptError = scatter / StrictMath.sqrt(x.length);
    this.rSquared = 1 - rss / total;
  }

  static LogLine of(TransformForm form, Plugs plugs) {
    double[] x = plugs.regressor(form.function());
    return form.slopeFree()
        ? new LogLine(LeastSquares.fit(List.of(form.regressor()), new double[][] {x}, plugs.logK()))
        : new LogLine(x, plugs.logK());
  }

  double at(double x) {
    return intercept + slope * x;
  }

  /**
   * Returns the root mean square of the errors when each plug in turn is left out, without fitting
   * anew: by the hat matrix, or by the mean of the others where only the offset is fitted.
   */
  double leaveOneOut() {
    int n = residuals.length;
    double sum = 0;
    if (squares != null) {
      sum = squares.press();
    } else {
      for (double e : residuals) {
        double out = e * n / (n - 1);
        sum += out * out;
      }
    }
    return StrictMath.sqrt(sum / n);
  }

  double predictionHalfWidth(double level, double x) {
    if (squares != null) {
      return squares.predictionHalfWidth(level, x);
    }
    int n = residuals.length;
    double t = new TDistribution(null, n - 1).inverseCumulativeProbability(0.5 + level / 2);
    return t * scatter * StrictMath.sqrt(1 + 1.0 / n);
  }

  double intercept() {
    return intercept;
  }

  double slope() {
    return slope;
  }

  double interceptError() {
    return interceptError;
  }

  double slopeError() {
    return slopeError;
  }

  double scatter() {
    return scatter;
  }

  double rSquared() {
    return rSquared;
  }

  double[] residuals() {
    return residuals.clone();
  }
}
