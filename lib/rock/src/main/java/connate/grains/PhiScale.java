package connate.grains;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * The phi scale of grain size after Krumbein: coarse grains have small and negative numbers.
 *
 * <pre>φ = −log2(d / 1 mm),  d = 2^−φ mm</pre>
 *
 * <p><b>Source</b>: Krumbein (1934), J. Sedimentary Petrology 4, 65–77.
 *
 * <p><b>Checked</b> in {@code PhiScaleTest}.
 */
public final class PhiScale {

  /** The facts on size to phi. */
  public static final MethodCard CARD =
      MethodCard.named("phi-scale", "Phi scale of grain size")
          .equation("φ = -log2(d)")
          .input("d", "grain size", Units.mm, Range.POSITIVE)
          .result("φ", "phi", Units.number)
          .source("Krumbein (1934), J. Sedimentary Petrology 4, 65–77")
          .constants(Constants.EXACT)
          .topics("grain size", "grains")
          .note("Average sizes in phi, which is the geometric mean, not in millimetres.")
          .build();

  /** The facts on phi to size. */
  public static final MethodCard SIZE =
      MethodCard.named("phi-size", "Grain size of a phi value")
          .equation("d = 2^(-φ)")
          .input("φ", "phi", Units.number, Range.of(-20, 30))
          .result("d", "grain size", Units.mm)
          .source("Krumbein (1934), J. Sedimentary Petrology 4, 65–77")
          .constants(Constants.EXACT)
          .topics("grain size", "grains")
          .build();

  private static final double LN2 = 0.6931471805599453;

  private static final Formula<Ratio> FORMULA = Formula.of(CARD, Units.number, PhiScale::phi);
  private static final Formula<Length> SIZE_FORMULA = Formula.of(SIZE, Units.mm, PhiScale::mm);

  private PhiScale() {}

  /** Returns the phi value of a grain size. */
  public static Ratio of(Length size) {
    return FORMULA.value(size);
  }

  /** Returns the phi value of each grain size. */
  public static Series of(Operand size) {
    return FORMULA.series(size);
  }

  /** Returns the grain size of a phi value, in mm. */
  public static Length size(Ratio phi) {
    return SIZE_FORMULA.value(phi);
  }

  /** Returns the grain size of each phi value, in mm. */
  public static Series size(Operand phi) {
    return SIZE_FORMULA.series(phi);
  }

  static double phi(double mm) {
    return -StrictMath.log(mm) / LN2;
  }

  static double mm(double phi) {
    return StrictMath.exp(-phi * LN2);
  }
}
