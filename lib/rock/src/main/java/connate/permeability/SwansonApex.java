package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability from the apex of a mercury capillary curve, after Swanson.
 *
 * <pre>
 * k_air = 399 A^1.691
 * k_brine = 355 A^2.005
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>A</td><td>largest mercury saturation of bulk volume over pressure</td><td>%/psi</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for clean plugs; closure must be corrected first. A is read where the curve
 * touches the 45° line.
 *
 * <p><b>Source</b>: Swanson (1981), J. Pet. Technol. 33, 2498–2504; constants from memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class SwansonApex {

  /** The facts on the law for air. */
  public static final MethodCard AIR =
      MethodCard.named("swanson-air", "Swanson, air permeability")
          .equation("k = 399 A^1.691")
          .input("A", "apex Sb/Pc in %/psi", Units.number, Range.POSITIVE)
          .result("k", "air permeability", Units.mD)
          .source("Swanson (1981), J. Pet. Technol. 33, 2498–2504")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "capillary pressure", "mercury", "core")
          .note("Correct closure first. Sb in per cent of bulk volume, pressure in psi.")
          .build();

  /** The facts on the law for brine. */
  public static final MethodCard BRINE =
      MethodCard.named("swanson-brine", "Swanson, brine permeability")
          .equation("k = 355 A^2.005")
          .input("A", "apex Sb/Pc in %/psi", Units.number, Range.POSITIVE)
          .result("k", "brine permeability", Units.mD)
          .source("Swanson (1981), J. Pet. Technol. 33, 2498–2504")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "capillary pressure", "mercury", "core")
          .note("Correct closure first. Sb in per cent of bulk volume, pressure in psi.")
          .build();

  private static final Formula<Permeability> AIR_FORMULA =
      Formula.of(AIR, Units.mD, apex -> SwansonApex.airNumber(apex));

  private static final Formula<Permeability> BRINE_FORMULA =
      Formula.of(BRINE, Units.mD, apex -> SwansonApex.brineNumber(apex));

  private SwansonApex() {}

  /** Returns the air permeability of one sample by the law for air. */
  public static Permeability air(double apexSbPcInPsi) {
    return AIR_FORMULA.value(Units.number(apexSbPcInPsi));
  }

  /** Returns the air permeability of each row by the law for air. */
  public static Series air(Operand apexSbPcInPsi) {
    return AIR_FORMULA.series(apexSbPcInPsi);
  }

  static double airNumber(double apex) {
    return 399 * StrictMath.pow(apex, 1.691);
  }

  /** Returns the brine permeability of one sample by the law for brine. */
  public static Permeability brine(double apexSbPcInPsi) {
    return BRINE_FORMULA.value(Units.number(apexSbPcInPsi));
  }

  /** Returns the brine permeability of each row by the law for brine. */
  public static Series brine(Operand apexSbPcInPsi) {
    return BRINE_FORMULA.series(apexSbPcInPsi);
  }

  static double brineNumber(double apex) {
    return 355 * StrictMath.pow(apex, 2.005);
  }
}
