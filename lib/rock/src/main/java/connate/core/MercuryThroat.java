package connate.core;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Angle;
import connate.quantity.InterfacialTension;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Pressure;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Pore throat radius and permeability scale from mercury pressure.
 *
 * <pre>
 * r = 2 γ |cos θ| / P
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>r</td><td>radius of the throat</td><td>m</td></tr>
 * <tr><td>γ</td><td>interfacial tension, 480 mN/m for mercury and air</td><td>N/m</td></tr>
 * <tr><td>θ</td><td>contact angle, 140° for mercury and air</td><td>°</td></tr>
 * <tr><td>P</td><td>capillary pressure</td><td>Pa</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for round throats. With 480 mN/m and 140°, r in µm is near 107 over P in psi.
 *
 * <p><b>Source</b>: Washburn (1921), Proc. Natl. Acad. Sci. 7, 115–116.
 *
 * <p><b>Checked</b> in {@code CoreLawsTest}.
 */
public final class MercuryThroat {

  /** The facts on the equation of Washburn. */
  public static final MethodCard CARD =
      MethodCard.named("washburn", "Washburn throat radius")
          .equation("r = 2 γ |cos θ| / P")
          .input("γ", "interfacial tension", Units.NPerM, Range.POSITIVE)
          .input("θ", "contact angle", Units.degrees, Range.from(0))
          .input("P", "capillary pressure", Units.Pa, Range.POSITIVE)
          .result("r", "throat radius", Units.m)
          .source("Washburn (1921), Proc. Natl. Acad. Sci. 7, 115–116")
          .constants(Constants.EXACT)
          .topics("core", "mercury", "capillary pressure", "pore throat")
          .note("Mercury and air: 480 mN/m and 140°.")
          .build();

  private static final Formula<Length> CARD_FORMULA =
      Formula.of(CARD, Units.m, (gamma, theta, p) -> MercuryThroat.radiusNumber(gamma, theta, p));

  private MercuryThroat() {}

  /** Returns the throat radius of one sample by the equation of Washburn. */
  public static Length radius(
      InterfacialTension interfacialTension, Angle contactAngle, Pressure capillaryPressure) {
    return CARD_FORMULA.value(interfacialTension, contactAngle, capillaryPressure);
  }

  /** Returns the throat radius of each row by the equation of Washburn. */
  public static Series radius(
      Operand interfacialTension, Operand contactAngle, Operand capillaryPressure) {
    return CARD_FORMULA.series(interfacialTension, contactAngle, capillaryPressure);
  }

  static double radiusNumber(double gamma, double theta, double p) {
    return 2 * gamma * StrictMath.abs(StrictMath.cos(StrictMath.toRadians(theta))) / p;
  }
}
