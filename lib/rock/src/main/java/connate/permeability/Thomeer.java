package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Pressure;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Mercury capillary curve as a hyperbola, and permeability from it, after Thomeer.
 *
 * <pre>
 * B = B∞ exp(−G / log10(P/Pd))
 * k = 3.8068 G^(−1.3334) (B∞/Pd)²
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>B, B∞</td><td>mercury of bulk volume at P, and at the end</td><td>%</td></tr>
 * <tr><td>G</td><td>pore geometrical factor, on decimal logarithms</td><td>1</td></tr>
 * <tr><td>Pd</td><td>displacement pressure</td><td>psi</td></tr>
 * <tr><td>k</td><td>air permeability</td><td>mD</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for pores of one kind. Some authors write the law with natural logarithms; their
 * G is 2.303 times larger and the constant no longer applies.
 *
 * <p><b>Source</b>: Thomeer (1960), J. Pet. Technol. 12, 73–77; Thomeer (1983), J. Pet. Technol.
 * 35, 809–814; constants from memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class Thomeer {

  /** The facts on the curve of Thomeer. */
  public static final MethodCard CURVE =
      MethodCard.named("thomeer-curve", "Thomeer capillary curve")
          .equation("B = B∞ exp(-G / log10(P/Pd))")
          .input("P", "pressure", Units.psi, Range.POSITIVE)
          .input("B∞", "mercury at the end", Units.percent, Range.above(0).to(100))
          .input("G", "pore geometrical factor", Units.number, Range.POSITIVE)
          .valid(0.05, 2)
          .input("Pd", "displacement pressure", Units.psi, Range.POSITIVE)
          .result("B", "mercury of bulk volume", Units.percent)
          .source("Thomeer (1960), J. Pet. Technol. 12, 73–77")
          .constants(Constants.EXACT)
          .topics("capillary pressure", "mercury", "core")
          .note("G belongs to decimal logarithms.")
          .build();

  /** The facts on the law of Thomeer. */
  public static final MethodCard PERMEABILITY =
      MethodCard.named("thomeer-permeability", "Thomeer permeability")
          .equation("k = 3.8068 G^-1.3334 (B∞/Pd)²")
          .input("B∞", "mercury at the end", Units.percent, Range.above(0).to(100))
          .input("G", "pore geometrical factor", Units.number, Range.POSITIVE)
          .valid(0.05, 2)
          .input("Pd", "displacement pressure", Units.psi, Range.POSITIVE)
          .result("k", "air permeability", Units.mD)
          .source("Thomeer (1983), J. Pet. Technol. 35, 809–814")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "capillary pressure", "mercury", "core")
          .note("Pores of one kind; G on decimal logarithms.")
          .build();

  private static final Formula<Fraction> CURVE_FORMULA =
      Formula.of(
          CURVE, Units.percent, (p, most, g, entry) -> Thomeer.mercuryNumber(p, most, g, entry));

  private static final Formula<Permeability> PERMEABILITY_FORMULA =
      Formula.of(
          PERMEABILITY, Units.mD, (most, g, entry) -> Thomeer.permeabilityNumber(most, g, entry));

  private Thomeer() {}

  /** Returns the mercury of bulk volume of one sample by the curve of Thomeer. */
  public static Fraction mercury(
      Pressure pressure,
      Fraction mercuryAtTheEnd,
      double poreGeometricalFactor,
      Pressure displacementPressure) {
    return CURVE_FORMULA.value(
        pressure, mercuryAtTheEnd, Units.number(poreGeometricalFactor), displacementPressure);
  }

  /** Returns the mercury of bulk volume of each row by the curve of Thomeer. */
  public static Series mercury(
      Operand pressure,
      Operand mercuryAtTheEnd,
      Operand poreGeometricalFactor,
      Operand displacementPressure) {
    return CURVE_FORMULA.series(
        pressure, mercuryAtTheEnd, poreGeometricalFactor, displacementPressure);
  }

  static double mercuryNumber(double p, double most, double g, double entry) {
    return p <= entry ? 0 : most * StrictMath.exp(-g / StrictMath.log10(p / entry));
  }

  /** Returns the air permeability of one sample by the law of Thomeer. */
  public static Permeability permeability(
      Fraction mercuryAtTheEnd, double poreGeometricalFactor, Pressure displacementPressure) {
    return PERMEABILITY_FORMULA.value(
        mercuryAtTheEnd, Units.number(poreGeometricalFactor), displacementPressure);
  }

  /** Returns the air permeability of each row by the law of Thomeer. */
  public static Series permeability(
      Operand mercuryAtTheEnd, Operand poreGeometricalFactor, Operand displacementPressure) {
    return PERMEABILITY_FORMULA.series(
        mercuryAtTheEnd, poreGeometricalFactor, displacementPressure);
  }

  static double permeabilityNumber(double most, double g, double entry) {
    return 3.8068 * StrictMath.pow(g, -1.3334) * (most / entry) * (most / entry);
  }
}
