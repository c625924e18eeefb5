package connate.logs;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Units;
import connate.quantity.Velocity;
import connate.series.Series;

/**
 * Velocities of shaly sandstone, after Han.
 *
 * <pre>
 * Vp = 5.59 − 6.93 φ − 2.18 C
 * Vs = 3.52 − 4.91 φ − 1.89 C
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>Vp, Vs</td><td>compressional and shear velocity</td><td>km/s</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * <tr><td>C</td><td>clay content</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for water-wet sandstone at 40 MPa, φ 0.02 to 0.30, C to 0.50.
 *
 * <p><b>Source</b>: Han, Nur and Morgan (1986), Geophysics 51, 2093–2107, abstract.
 *
 * <p><b>Checked</b> in {@code LogLawsTest}.
 */
public final class HanVelocity {

  /** The facts on the regression of Han. */
  public static final MethodCard P =
      MethodCard.named("han-p", "Han compressional velocity")
          .equation("Vp = 5.59 - 6.93 φ - 2.18 C")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .valid(0.02, 0.3)
          .input("C", "clay content", Units.fraction, Range.PART)
          .valid(0, 0.5)
          .result("Vp", "compressional velocity", Units.kmPerSecond)
          .source("Han, Nur and Morgan (1986), Geophysics 51, 2093–2107")
          .constants(Constants.CHECKED)
          .topics("logs", "sonic", "clay")
          .note("Brine, 40 MPa.")
          .build();

  /** The facts on the regression of Han. */
  public static final MethodCard S =
      MethodCard.named("han-s", "Han shear velocity")
          .equation("Vs = 3.52 - 4.91 φ - 1.89 C")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .valid(0.02, 0.3)
          .input("C", "clay content", Units.fraction, Range.PART)
          .valid(0, 0.5)
          .result("Vs", "shear velocity", Units.kmPerSecond)
          .source("Han, Nur and Morgan (1986), Geophysics 51, 2093–2107")
          .constants(Constants.CHECKED)
          .topics("logs", "sonic", "clay")
          .note("Brine, 40 MPa.")
          .build();

  private static final Formula<Velocity> P_FORMULA =
      Formula.of(P, Units.kmPerSecond, (phi, c) -> HanVelocity.compressionalNumber(phi, c));

  private static final Formula<Velocity> S_FORMULA =
      Formula.of(S, Units.kmPerSecond, (phi, c) -> HanVelocity.shearNumber(phi, c));

  private HanVelocity() {}

  /** Returns the compressional velocity of one sample by the regression of Han. */
  public static Velocity compressional(Fraction porosity, Fraction clayContent) {
    return P_FORMULA.value(porosity, clayContent);
  }

  /** Returns the compressional velocity of each row by the regression of Han. */
  public static Series compressional(Operand porosity, Operand clayContent) {
    return P_FORMULA.series(porosity, clayContent);
  }

  static double compressionalNumber(double phi, double c) {
    return 5.59 - 6.93 * phi - 2.18 * c;
  }

  /** Returns the shear velocity of one sample by the regression of Han. */
  public static Velocity shear(Fraction porosity, Fraction clayContent) {
    return S_FORMULA.value(porosity, clayContent);
  }

  /** Returns the shear velocity of each row by the regression of Han. */
  public static Series shear(Operand porosity, Operand clayContent) {
    return S_FORMULA.series(porosity, clayContent);
  }

  static double shearNumber(double phi, double c) {
    return 3.52 - 4.91 * phi - 1.89 * c;
  }
}
