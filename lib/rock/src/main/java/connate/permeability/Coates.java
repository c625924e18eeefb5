package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability from free fluid, after Coates.
 *
 * <pre>
 * k = (100 φ² (1 − S)/S)²
 * k = (100 φ/C)⁴ (FFI/BVI)² with C = 10, φ, FFI and BVI as fractions
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * <tr><td>S</td><td>irreducible water saturation</td><td>1</td></tr>
 * <tr><td>FFI, BVI</td><td>free and bound fluid, FFI + BVI = φ</td><td>1</td></tr>
 * <tr><td>C</td><td>constant, to be calibrated to core</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for clastic rock; calibrate C to core.
 *
 * <p><b>Source</b>: Coates free-fluid equation as in Tiab and Donaldson (2004), Petrophysics, 2nd
 * ed., p. 125.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class Coates {

  /** The facts on the free-fluid law. */
  public static final MethodCard CARD =
      MethodCard.named("coates", "Coates free fluid")
          .equation("k = (100 φ² (1 - S)/S)²")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .input("S", "irreducible water saturation", Units.fraction, Range.above(0).to(1))
          .result("k", "permeability", Units.mD)
          .source("Tiab and Donaldson (2004), Petrophysics, 2nd ed., p. 125")
          .constants(Constants.CHECKED)
          .topics("permeability", "porosity", "saturation", "magnetic resonance", "logs")
          .note("The textbook example prints 0.111 for (1 - 0.24) 0.15, which is 0.114.")
          .build();

  /** The facts on the law of free and bound fluid. */
  public static final MethodCard BOUND_FLUID =
      MethodCard.named("coates-bound-fluid", "Coates, free and bound fluid")
          .equation("k = (100 φ/C)⁴ (FFI/BVI)²")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .input("BVI", "bound fluid", Units.fraction, Range.above(0).to(1))
          .input("C", "constant", Units.number, Range.POSITIVE)
          .valid(5, 20)
          .result("k", "permeability", Units.mD)
          .source("Tiab and Donaldson (2004), Petrophysics, 2nd ed., p. 125")
          .constants(Constants.CHECKED)
          .topics("permeability", "porosity", "magnetic resonance", "logs")
          .note("Calibrate C to core; 10 is the usual start. φ in per cent over C inside.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(CARD, Units.mD, (phi, s) -> Coates.ofNumber(phi, s));

  private static final Formula<Permeability> BOUND_FLUID_FORMULA =
      Formula.of(
          BOUND_FLUID, Units.mD, (phi, bound, c) -> Coates.fromBoundFluidNumber(phi, bound, c));

  private Coates() {}

  /** Returns the permeability of one sample by the free-fluid law. */
  public static Permeability of(Fraction porosity, Fraction irreducibleWaterSaturation) {
    return CARD_FORMULA.value(porosity, irreducibleWaterSaturation);
  }

  /** Returns the permeability of each row by the free-fluid law. */
  public static Series of(Operand porosity, Operand irreducibleWaterSaturation) {
    return CARD_FORMULA.series(porosity, irreducibleWaterSaturation);
  }

  static double ofNumber(double phi, double s) {
    double root = 100 * phi * phi * (1 - s) / s;
    return root * root;
  }

  /** Returns the permeability of one sample by the law of free and bound fluid. */
  public static Permeability fromBoundFluid(
      Fraction porosity, Fraction boundFluid, double constant) {
    return BOUND_FLUID_FORMULA.value(porosity, boundFluid, Units.number(constant));
  }

  /** Returns the permeability of each row by the law of free and bound fluid. */
  public static Series fromBoundFluid(Operand porosity, Operand boundFluid, double constant) {
    return BOUND_FLUID_FORMULA.series(porosity, boundFluid, Units.number(constant));
  }

  static double fromBoundFluidNumber(double phi, double bound, double c) {
    if (bound > phi) {
      throw new IllegalArgumentException(
          "bound fluid " + bound + " is more than the porosity " + phi);
    }
    double root = StrictMath.pow(100 * phi / c, 2) * (phi - bound) / bound;
    return root * root;
  }
}
