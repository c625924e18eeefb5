package connate.grains;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * The engineer's coefficients of a grain-size curve.
 *
 * <pre>Cu = d60 / d10,  Cc = d30² / (d10 d60)</pre>
 *
 * <p>dX is the size than which X % of the weight is finer.
 *
 * <p><b>Source</b>: Hazen (1892), Some physical properties of sands and gravels, Massachusetts
 * State Board of Health, 24th Annual Report, for Cu; ASTM D2487 for Cc. Worked values of Cu in the
 * Groundwater Project's exercises.
 *
 * <p><b>Checked</b> in {@code UniformityTest}.
 */
public final class Uniformity {

  /** The facts on the uniformity coefficient. */
  public static final MethodCard CARD =
      MethodCard.named("uniformity-coefficient", "Coefficient of uniformity")
          .equation("Cu = d60/d10")
          .input("d60", "size with 60 % finer", Units.mm, Range.POSITIVE)
          .input("d10", "size with 10 % finer", Units.mm, Range.POSITIVE)
          .result("Cu", "uniformity coefficient", Units.number)
          .source("Hazen (1892), Massachusetts State Board of Health, 24th Annual Report")
          .constants(Constants.EXACT)
          .topics("grain size", "sorting", "grains")
          .note("At least 1; d10 has 10 % of the weight finer, not coarser.")
          .build();

  /** The facts on the coefficient of curvature. */
  public static final MethodCard CURVATURE =
      MethodCard.named("curvature-coefficient", "Coefficient of curvature")
          .equation("Cc = d30²/(d10 d60)")
          .input("d60", "size with 60 % finer", Units.mm, Range.POSITIVE)
          .input("d30", "size with 30 % finer", Units.mm, Range.POSITIVE)
          .input("d10", "size with 10 % finer", Units.mm, Range.POSITIVE)
          .result("Cc", "curvature coefficient", Units.number)
          .source("ASTM D2487, Unified Soil Classification System")
          .constants(Constants.EXACT)
          .topics("grain size", "sorting", "grains")
          .build();

  private static final Formula<Ratio> FORMULA =
      Formula.of(CARD, Units.number, (d60, d10) -> coefficient(d60, d10));
  private static final Formula<Ratio> CURVATURE_FORMULA =
      Formula.of(CURVATURE, Units.number, (d60, d30, d10) -> curvature(d60, d30, d10));

  private Uniformity() {}

  /**
   * Returns the coefficient of two sizes.
   *
   * @throws IllegalArgumentException if d60 is below d10: finer and coarser mixed up
   */
  public static Ratio of(Length d60, Length d10) {
    return FORMULA.value(d60, d10);
  }

  /** Returns the coefficient of each row. */
  public static Series of(Operand d60, Operand d10) {
    return FORMULA.series(d60, d10);
  }

  /** Returns the coefficient of a curve. */
  public static Ratio of(GrainCurve curve) {
    return of(curve.d(60), curve.d(10));
  }

  /** Returns the coefficient of each curve. */
  public static Series of(GrainCurves curves) {
    Listening.used(CARD);
    return curves.map("uniformity", Units.number, c -> c.sizeMm(60) / c.sizeMm(10));
  }

  /** Returns the coefficient of curvature of three sizes. */
  public static Ratio curvature(Length d60, Length d30, Length d10) {
    return CURVATURE_FORMULA.value(d60, d30, d10);
  }

  /** Returns the coefficient of curvature of each row. */
  public static Series curvature(Operand d60, Operand d30, Operand d10) {
    return CURVATURE_FORMULA.series(d60, d30, d10);
  }

  /** Returns the coefficient of curvature of a curve. */
  public static Ratio curvature(GrainCurve curve) {
    return curvature(curve.d(60), curve.d(30), curve.d(10));
  }

  static double coefficient(double d60, double d10) {
    if (d60 < d10) {
      throw new IllegalArgumentException(
          "d60 "
              + d60
              + " mm is below d10 "
              + d10
              + " mm: d10 has 10 % finer; were they counted from the coarse side?");
    }
    return d60 / d10;
  }

  static double curvature(double d60, double d30, double d10) {
    coefficient(d60, d10);
    return d30 * d30 / (d10 * d60);
  }
}
