package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Density;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Resistivity;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability from resistivity at irreducible water, after Coates and Dumanoir.
 *
 * <pre>
 * √k = (C/w⁴) φ^(2w) / (Rw/Rt)
 * w² = 3.75 − φ + ½ (log10(Rw/Rt) + 2.2)²
 * C = 23 + 465 ρ − 188 ρ²
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * <tr><td>Rw</td><td>resistivity of the water</td><td>ohm·m</td></tr>
 * <tr><td>Rt</td><td>resistivity of the rock at irreducible water</td><td>ohm·m</td></tr>
 * <tr><td>ρ</td><td>density of the hydrocarbon</td><td>g/cm³</td></tr>
 * </table>
 *
 * <p><b>Valid</b> where Rt is that at irreducible water; clean rock.
 *
 * <p><b>Source</b>: Coates and Dumanoir (1974), The Log Analyst 15(1), 17–29; constants from
 * memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class CoatesDumanoir {

  /** The facts on the law of Coates and Dumanoir. */
  public static final MethodCard CARD =
      MethodCard.named("coates-dumanoir", "Coates–Dumanoir")
          .equation(
              "√k = (C/w⁴) φ^(2w) / (Rw/Rt), w² = 3.75 - φ + ½ (log10(Rw/Rt) + 2.2)², C = 23 + 465 ρ - 188 ρ²")
          .input("φ", "porosity", Units.fraction, Range.above(0).below(1))
          .input("Rw", "water resistivity", Units.ohmM, Range.POSITIVE)
          .input("Rt", "resistivity at irreducible water", Units.ohmM, Range.POSITIVE)
          .input("ρ", "hydrocarbon density", Units.gPerCm3, Range.POSITIVE)
          .valid(0.1, 1.0)
          .result("k", "permeability", Units.mD)
          .source("Coates and Dumanoir (1974), The Log Analyst 15(1), 17–29")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "resistivity", "logs")
          .note("Rt must be that at irreducible water.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(
          CARD, Units.mD, (phi, rw, rt, density) -> CoatesDumanoir.ofNumber(phi, rw, rt, density));

  private CoatesDumanoir() {}

  /** Returns the permeability of one sample by the law of Coates and Dumanoir. */
  public static Permeability of(
      Fraction porosity,
      Resistivity waterResistivity,
      Resistivity resistivityAtIrreducibleWater,
      Density hydrocarbonDensity) {
    return CARD_FORMULA.value(
        porosity, waterResistivity, resistivityAtIrreducibleWater, hydrocarbonDensity);
  }

  /** Returns the permeability of each row by the law of Coates and Dumanoir. */
  public static Series of(
      Operand porosity,
      Operand waterResistivity,
      Operand resistivityAtIrreducibleWater,
      Operand hydrocarbonDensity) {
    return CARD_FORMULA.series(
        porosity, waterResistivity, resistivityAtIrreducibleWater, hydrocarbonDensity);
  }

  static double ofNumber(double phi, double rw, double rt, double density) {
    double w = exponent(phi, rw / rt);
    double c = 23 + 465 * density - 188 * density * density;
    double root = c / (w * w * w * w) * StrictMath.pow(phi, 2 * w) / (rw / rt);
    return root * root;
  }

  static double exponent(double phi, double ratio) {
    double term = StrictMath.log10(ratio) + 2.2;
    return StrictMath.sqrt(3.75 - phi + term * term / 2);
  }
}
