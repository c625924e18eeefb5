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
 * Permeability from porosity and irreducible water: the family √k = C φ^x / S^y of Wyllie and Rose.
 *
 * <pre>
 * Tixier            √k = 250 φ³ / S
 * Morris–Biggs, gas √k = 79 φ³ / S
 * Timur, root form  √k = 100 φ^2.25 / S
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * <tr><td>S</td><td>irreducible water saturation</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for clastic rock above the transition zone, where water is irreducible.
 *
 * <p><b>Source</b>: Wyllie and Rose (1950), Trans. AIME 189, 105–118; Tixier (1949); Morris and
 * Biggs (1967); constants from memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class WyllieRose {

  /** The facts on the law named Tixier. */
  public static final MethodCard TIXIER =
      MethodCard.named("tixier", "Tixier")
          .equation("√k = 250 φ³ / S")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .input("S", "irreducible water saturation", Units.fraction, Range.above(0).to(1))
          .result("k", "permeability", Units.mD)
          .source(
              "Tixier (1949), Oil and Gas Journal; in the family of Wyllie and Rose (1950), Trans. AIME 189, 105–118")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "porosity", "saturation", "logs")
          .note("One online text prints 730 mD at φ 0.30, S 0.25 and another factor beside it.")
          .note("Above the transition zone only: the water must be irreducible.")
          .build();

  /** The facts on the law named Morris–Biggs, gas. */
  public static final MethodCard MORRIS_BIGGS_GAS =
      MethodCard.named("morris-biggs-gas", "Morris–Biggs, gas")
          .equation("√k = 79 φ³ / S")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .input("S", "irreducible water saturation", Units.fraction, Range.above(0).to(1))
          .result("k", "permeability", Units.mD)
          .source("Morris and Biggs (1967), SPWLA 8th Annual Logging Symposium")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "porosity", "saturation", "logs")
          .note("For gas; for oil the factor is 250, as in Tixier.")
          .note("Above the transition zone only: the water must be irreducible.")
          .build();

  /** The facts on the law named Timur, root form. */
  public static final MethodCard TIMUR_ROOT =
      MethodCard.named("timur-root", "Timur, root form")
          .equation("√k = 100 φ^2.25 / S")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .input("S", "irreducible water saturation", Units.fraction, Range.above(0).to(1))
          .result("k", "permeability", Units.mD)
          .source("form after Timur (1968), The Log Analyst 9(4), 8–17")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "porosity", "saturation", "logs")
          .note("An approximation of Timur; differs from it by some per cent.")
          .note("Above the transition zone only: the water must be irreducible.")
          .build();

  private static final Formula<Permeability> TIXIER_FORMULA =
      Formula.of(TIXIER, Units.mD, (phi, s) -> WyllieRose.tixierNumber(phi, s));

  private static final Formula<Permeability> MORRIS_BIGGS_GAS_FORMULA =
      Formula.of(MORRIS_BIGGS_GAS, Units.mD, (phi, s) -> WyllieRose.morrisBiggsGasNumber(phi, s));

  private static final Formula<Permeability> TIMUR_ROOT_FORMULA =
      Formula.of(TIMUR_ROOT, Units.mD, (phi, s) -> WyllieRose.timurRootNumber(phi, s));

  private WyllieRose() {}

  /** Returns the permeability of one sample by the law named Tixier. */
  public static Permeability tixier(Fraction porosity, Fraction irreducibleWaterSaturation) {
    return TIXIER_FORMULA.value(porosity, irreducibleWaterSaturation);
  }

  /** Returns the permeability of each row by the law named Tixier. */
  public static Series tixier(Operand porosity, Operand irreducibleWaterSaturation) {
    return TIXIER_FORMULA.series(porosity, irreducibleWaterSaturation);
  }

  static double tixierNumber(double phi, double s) {
    double root = 250 * phi * phi * phi / s;
    return root * root;
  }

  /** Returns the permeability of one sample by the law named Morris–Biggs, gas. */
  public static Permeability morrisBiggsGas(
      Fraction porosity, Fraction irreducibleWaterSaturation) {
    return MORRIS_BIGGS_GAS_FORMULA.value(porosity, irreducibleWaterSaturation);
  }

  /** Returns the permeability of each row by the law named Morris–Biggs, gas. */
  public static Series morrisBiggsGas(Operand porosity, Operand irreducibleWaterSaturation) {
    return MORRIS_BIGGS_GAS_FORMULA.series(porosity, irreducibleWaterSaturation);
  }

  static double morrisBiggsGasNumber(double phi, double s) {
    double root = 79 * phi * phi * phi / s;
    return root * root;
  }

  /** Returns the permeability of one sample by the law named Timur, root form. */
  public static Permeability timurRoot(Fraction porosity, Fraction irreducibleWaterSaturation) {
    return TIMUR_ROOT_FORMULA.value(porosity, irreducibleWaterSaturation);
  }

  /** Returns the permeability of each row by the law named Timur, root form. */
  public static Series timurRoot(Operand porosity, Operand irreducibleWaterSaturation) {
    return TIMUR_ROOT_FORMULA.series(porosity, irreducibleWaterSaturation);
  }

  static double timurRootNumber(double phi, double s) {
    double root = 100 * StrictMath.pow(phi, 2.25) / s;
    return root * root;
  }
}
