package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Time;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability from magnetic resonance, after Kenyon and others.
 *
 * <pre>
 * k = C φ⁴ T²
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>C</td><td>4 for sandstone, 0.1 for carbonate, to be calibrated</td><td>1</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * <tr><td>T</td><td>logarithmic mean of T2</td><td>ms</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for water-filled pores; hydrocarbon in the pores spoils it. Cutoffs of T2 are 33
 * ms in sandstone, 92 ms in carbonate.
 *
 * <p><b>Source</b>: Kenyon and others (1988), SPE Formation Evaluation 3, 622–636; equation in Tiab
 * and Donaldson (2004), p. 135.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class SdrPermeability {

  /** The facts on the law of Kenyon and others. */
  public static final MethodCard CARD =
      MethodCard.named("sdr", "Kenyon T2 permeability")
          .equation("k = C φ⁴ T²")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .input("T", "logarithmic mean of T2", Units.ms, Range.POSITIVE)
          .input("C", "constant", Units.number, Range.POSITIVE)
          .valid(0.05, 10)
          .result("k", "permeability", Units.mD)
          .source("Kenyon and others (1988), SPE Formation Evaluation 3, 622–636")
          .constants(Constants.CHECKED)
          .topics(
              "permeability", "porosity", "magnetic resonance", "logs", "carbonate", "sandstone")
          .note("C is 4 for sandstone and 0.1 for carbonate before calibration to core.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(CARD, Units.mD, (phi, t, c) -> SdrPermeability.ofNumber(phi, t, c));

  private SdrPermeability() {}

  /** Returns the permeability of one sample by the law of Kenyon and others. */
  public static Permeability of(Fraction porosity, Time logarithmicMeanOfT2, double constant) {
    return CARD_FORMULA.value(porosity, logarithmicMeanOfT2, Units.number(constant));
  }

  /** Returns the permeability of each row by the law of Kenyon and others. */
  public static Series of(Operand porosity, Operand logarithmicMeanOfT2, double constant) {
    return CARD_FORMULA.series(porosity, logarithmicMeanOfT2, Units.number(constant));
  }

  static double ofNumber(double phi, double t, double c) {
    return c * phi * phi * phi * phi * t * t;
  }
}
