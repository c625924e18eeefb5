package connate.calibration;

import connate.quantity.Numbers;
import connate.series.Listed;
import connate.series.Listing;
import java.util.List;
import org.apache.commons.math3.distribution.FDistribution;
import org.apache.commons.math3.distribution.TDistribution;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.QRDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.SingularMatrixException;

/**
 * Ordinary least squares of one variable on others, with an intercept, by QR decomposition.
 *
 * <pre>y = β0 + β1 x1 + … + e;  s² = RSS / (n − p);  SE(β) = s √diag((XᵀX)⁻¹)</pre>
 *
 * <p>Columns are scaled to unit length before the decomposition, so that regressors of very
 * different size do no harm.
 */
public final class LeastSquares implements Listed {

  private final List<String> names;
  private final double[] scale;
  private final double[] coefficients;
  private final RealMatrix unscaledCovariance;
  private final double[] residuals;
  private final double[] leverages;
  private final double totalSquares;

  private LeastSquares(List<String> names, double[][] rows, double[] y) {
    this.names = names;
    this.scale = lengths(rows);
    RealMatrix x = scaled(rows, scale);
    QRDecomposition qr = new QRDecomposition(x, 1e-13);
    double[] beta = solve(qr, y);
    this.unscaledCovariance = covariance(qr, x.getColumnDimension());
    this.residuals = residuals(x, beta, y);
    this.leverages = leverages(x, unscaledCovariance);
    this.coefficients = new double[beta.length];
    for (int i = 0; i < beta.length; i++) {
      coefficients[i] = beta[i] / scale[i];
    }
    this.totalSquares = squaresAboutMean(y);
  }

  /**
   * Fits y on the columns.
   *
   * @param names the names of the columns
   * @param columns one array for each regressor, without the intercept
   * @param y the variable
   * @throws IllegalArgumentException if there are too few rows or the columns depend on each other
   */
  public static LeastSquares fit(List<String> names, double[][] columns, double[] y) {
    int terms = columns.length + 1;
    if (y.length <= terms) {
      throw new IllegalArgumentException(
          "a fit of "
              + terms
              + " coefficients needs more than "
              + terms
              + " rows, found "
              + y.length);
    }
    double[][] rows = new double[y.length][terms];
    for (int row = 0; row < y.length; row++) {
      rows[row][0] = 1;
      for (int i = 0; i < columns.length; i++) {
        rows[row][i + 1] = columns[i][row];
      }
    }
    List<String> all = new java.util.ArrayList<>(List.of("(intercept)"));
    all.addAll(names);
    return new LeastSquares(List.copyOf(all), rows, y);
  }

  /** Returns the coefficients, the intercept first. */
  public double[] coefficients() {
    return coefficients.clone();
  }

  /** Returns the standard error of each coefficient. */
  public double[] standardErrors() {
    double[] errors = new double[coefficients.length];
    for (int i = 0; i < errors.length; i++) {
      errors[i] = scatter() * StrictMath.sqrt(unscaledCovariance.getEntry(i, i)) / scale[i];
    }
    return errors;
  }

  /** Returns coefficient over standard error. */
  public double[] tValues() {
    double[] t = standardErrors();
    for (int i = 0; i < t.length; i++) {
      t[i] = coefficients[i] / t[i];
    }
    return t;
  }

  /** Returns the two-sided probability of so large a t by chance. */
  public double[] pValues() {
    double[] p = tValues();
    TDistribution t = new TDistribution(null, degreesOfFreedom());
    for (int i = 0; i < p.length; i++) {
      p[i] = 2 * t.cumulativeProbability(-StrictMath.abs(p[i]));
    }
    return p;
  }

  /** Returns the number of rows. */
  public int n() {
    return residuals.length;
  }

  /** Returns the rows less the coefficients. */
  public int degreesOfFreedom() {
    return n() - coefficients.length;
  }

  /** Returns the residuals, row by row. */
  public double[] residuals() {
    return residuals.clone();
  }

  /** Returns the diagonal of the hat matrix. */
  public double[] leverages() {
    return leverages.clone();
  }

  /** Returns the sum of squared residuals. */
  public double residualSquares() {
    return sumOfSquares(residuals);
  }

  /** Returns the residual standard deviation on the degrees of freedom. */
  public double scatter() {
    return StrictMath.sqrt(residualSquares() / degreesOfFreedom());
  }

  /** Returns the coefficient of determination. */
  public double rSquared() {
    return 1 - residualSquares() / totalSquares;
  }

  /** Returns the coefficient of determination, corrected for the number of terms. */
  public double adjustedRSquared() {
    return 1 - (1 - rSquared()) * (n() - 1) / degreesOfFreedom();
  }

  /** Returns the F statistic of all regressors together. */
  public double fValue() {
    int regressors = coefficients.length - 1;
    return (totalSquares - residualSquares()) / regressors / (scatter() * scatter());
  }

  /** Returns the probability of so large an F by chance. */
  public double fProbability() {
    FDistribution f = new FDistribution(null, coefficients.length - 1, degreesOfFreedom());
    return 1 - f.cumulativeProbability(fValue());
  }

  /** Returns the log-likelihood under normal errors. */
  public double logLikelihood() {
    double n = n();
    return -n / 2 * (StrictMath.log(2 * StrictMath.PI * residualSquares() / n) + 1);
  }

  /** Returns Akaike's criterion, the variance counted as a parameter. */
  public double aic() {
    return 2.0 * (coefficients.length + 1) - 2 * logLikelihood();
  }

  /** Returns the residuals that each row would have if it were left out of the fit. */
  public double[] leaveOneOut() {
    double[] out = new double[n()];
    for (int row = 0; row < out.length; row++) {
      out[row] = residuals[row] / (1 - leverages[row]);
    }
    return out;
  }

  /** Returns the sum of squared leave-one-out residuals. */
  public double press() {
    return sumOfSquares(leaveOneOut());
  }

  /** Returns the fitted value at a point, given without the 1 of the intercept. */
  public double predict(double... at) {
    double y = coefficients[0];
    for (int i = 0; i < at.length; i++) {
      y += coefficients[i + 1] * at[i];
    }
    return y;
  }

  /**
   * Returns half the width of the interval in which a new observation lies with the given chance.
   *
   * <pre>t(1 − (1 − level)/2, df) · s · √(1 + xᵀ (XᵀX)⁻¹ x)</pre>
   */
  public double predictionHalfWidth(double level, double... at) {
    return quantile(level) * scatter() * StrictMath.sqrt(1 + leverageAt(at));
  }

  /** Returns half the width of the interval in which the mean lies with the given chance. */
  public double confidenceHalfWidth(double level, double... at) {
    return quantile(level) * scatter() * StrictMath.sqrt(leverageAt(at));
  }

  @Override
  public Listing listing() {
    Listing.Builder table =
        Listing.titled("least squares, n " + n())
            .column("term")
            .column("coefficient")
            .column("standard error")
            .column("t")
            .column("p");
    for (int i = 0; i < coefficients.length; i++) {
      table.row(names.get(i), coefficients[i], standardErrors()[i], tValues()[i], pValues()[i]);
    }
    return table
        .note("s " + Numbers.text(scatter()) + " on " + degreesOfFreedom() + " degrees of freedom")
        .note("R² " + Numbers.text(rSquared()) + ", adjusted " + Numbers.text(adjustedRSquared()))
        .build();
  }

  @Override
  public String toString() {
    return listing().toString();
  }

  private double quantile(double level) {
    if (!(level > 0 && level < 1)) {
      throw new IllegalArgumentException("a level is between 0 and 1, found " + level);
    }
    return new TDistribution(null, degreesOfFreedom())
        .inverseCumulativeProbability(0.5 + level / 2);
  }

  private double leverageAt(double... at) {
    double[] x = new double[coefficients.length];
    x[0] = 1 / scale[0];
    for (int i = 0; i < at.length; i++) {
      x[i + 1] = at[i] / scale[i + 1];
    }
    ArrayRealVector vector = new ArrayRealVector(x, false);
    return vector.dotProduct(unscaledCovariance.operate(vector));
  }

  private static double[] lengths(double[][] rows) {
    double[] lengths = new double[rows[0].length];
    for (int i = 0; i < lengths.length; i++) {
      double sum = 0;
      for (double[] row : rows) {
        sum += row[i] * row[i];
      }
      lengths[i] = sum == 0 ? 1 : StrictMath.sqrt(sum);
    }
    return lengths;
  }

  private static RealMatrix scaled(double[][] rows, double[] scale) {
    double[][] out = new double[rows.length][scale.length];
    for (int row = 0; row < rows.length; row++) {
      for (int i = 0; i < scale.length; i++) {
        out[row][i] = rows[row][i] / scale[i];
      }
    }
    return new Array2DRowRealMatrix(out, false);
  }

  private static double[] solve(QRDecomposition qr, double[] y) {
    try {
      return qr.getSolver().solve(new ArrayRealVector(y, false)).toArray();
    } catch (SingularMatrixException e) {
      throw new IllegalArgumentException(
          "the regressors depend on each other, or one does not vary: leave one out", e);
    }
  }

  private static RealMatrix covariance(QRDecomposition qr, int terms) {
    RealMatrix r = qr.getR().getSubMatrix(0, terms - 1, 0, terms - 1);
    RealMatrix inverse = new QRDecomposition(r).getSolver().getInverse();
    return inverse.multiply(inverse.transpose());
  }

  private static double[] residuals(RealMatrix x, double[] beta, double[] y) {
    double[] fitted = x.operate(beta);
    double[] out = new double[y.length];
    for (int row = 0; row < y.length; row++) {
      out[row] = y[row] - fitted[row];
    }
    return out;
  }

  private static double[] leverages(RealMatrix x, RealMatrix covariance) {
    double[] out = new double[x.getRowDimension()];
    for (int row = 0; row < out.length; row++) {
      ArrayRealVector vector = new ArrayRealVector(x.getRow(row), false);
      out[row] = vector.dotProduct(covariance.operate(vector));
    }
    return out;
  }

  private static double sumOfSquares(double[] values) {
    double sum = 0;
    for (double value : values) {
      sum += value * value;
    }
    return sum;
  }

  private static double squaresAboutMean(double[] values) {
    double mean = 0;
    for (double value : values) {
      mean += value / values.length;
    }
    double sum = 0;
    for (double value : values) {
      sum += (value - mean) * (value - mean);
    }
    return sum;
  }
}
