package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity and permeability of sandstone before drilling from grain size, sorting and rigid grains,
 * after Bloch.
 *
 * <pre>
 * φ = −6.1 + 9.8/So + 0.17 R
 * log10 k = −4.67 + 1.34 d + 4.08/So + 3.42 R/100
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>φ</td><td>porosity</td><td>%</td></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>So</td><td>Trask sorting</td><td>1</td></tr>
 * <tr><td>R</td><td>rigid grains</td><td>%</td></tr>
 * <tr><td>d</td><td>grain diameter</td><td>mm</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for the Yacheng field only, where rigid grains are many and cement is little.
 *
 * <p><b>Source</b>: Bloch (1991), AAPG Bulletin 75, 1145–1160; constants from memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class Bloch {

  /** The facts on Bloch's regression of porosity. */
  public static final MethodCard POROSITY =
      MethodCard.named("bloch-porosity", "Bloch porosity")
          .equation("φ = -6.1 + 9.8/So + 0.17 R")
          .input("So", "Trask sorting", Units.number, Range.POSITIVE)
          .valid(1, 2)
          .input("R", "rigid grains", Units.percent, Range.from(0).to(100))
          .result("φ", "porosity", Units.percent)
          .source("Bloch (1991), AAPG Bulletin 75, 1145–1160")
          .constants(Constants.FROM_MEMORY)
          .topics("porosity", "sorting", "sandstone")
          .note("Made for one field; never outside of such rock.")
          .build();

  /** The facts on Bloch's regression of permeability. */
  public static final MethodCard PERMEABILITY =
      MethodCard.named("bloch-permeability", "Bloch permeability")
          .equation("log10 k = -4.67 + 1.34 d + 4.08/So + 3.42 R/100")
          .input("d", "grain diameter", Units.mm, Range.POSITIVE)
          .valid(0.06, 1)
          .input("So", "Trask sorting", Units.number, Range.POSITIVE)
          .valid(1, 2)
          .input("R", "rigid grains", Units.percent, Range.from(0).to(100))
          .result("k", "permeability", Units.mD)
          .source("Bloch (1991), AAPG Bulletin 75, 1145–1160")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "grain size", "sorting", "sandstone")
          .note("Made for one field; never outside of such rock.")
          .build();

  private static final Formula<Fraction> POROSITY_FORMULA =
      Formula.of(POROSITY, Units.percent, (so, rigid) -> Bloch.porosityNumber(so, rigid));

  private static final Formula<Permeability> PERMEABILITY_FORMULA =
      Formula.of(PERMEABILITY, Units.mD, (d, so, rigid) -> Bloch.permeabilityNumber(d, so, rigid));

  private Bloch() {}

  /** Returns the porosity of one sample by Bloch's regression of porosity. */
  public static Fraction porosity(double TraskSorting, Fraction rigidGrains) {
    return POROSITY_FORMULA.value(Units.number(TraskSorting), rigidGrains);
  }

  /** Returns the porosity of each row by Bloch's regression of porosity. */
  public static Series porosity(Operand TraskSorting, Operand rigidGrains) {
    return POROSITY_FORMULA.series(TraskSorting, rigidGrains);
  }

  static double porosityNumber(double so, double rigid) {
    return -6.1 + 9.8 / so + 0.17 * rigid;
  }

  /** Returns the permeability of one sample by Bloch's regression of permeability. */
  public static Permeability permeability(
      Length grainDiameter, double TraskSorting, Fraction rigidGrains) {
    return PERMEABILITY_FORMULA.value(grainDiameter, Units.number(TraskSorting), rigidGrains);
  }

  /** Returns the permeability of each row by Bloch's regression of permeability. */
  public static Series permeability(
      Operand grainDiameter, Operand TraskSorting, Operand rigidGrains) {
    return PERMEABILITY_FORMULA.series(grainDiameter, TraskSorting, rigidGrains);
  }

  static double permeabilityNumber(double d, double so, double rigid) {
    return StrictMath.pow(10, -4.67 + 1.34 * d + 4.08 / so + 3.42 * rigid / 100);
  }
}
