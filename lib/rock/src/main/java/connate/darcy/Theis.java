package connate.darcy;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Rate;
import connate.quantity.Time;
import connate.quantity.Transmissivity;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Drawdown around a pumped well in a confined aquifer, after Theis; and the straight line of Cooper
 * and Jacob for late time.
 *
 * <pre>
 * s = Q W(u) / (4π T),  u = r² S / (4 T t)
 * W(u) = E1(u) = −γ − ln u + u − u²/(2·2!) + …
 * Cooper–Jacob: W ≈ −0.577216 − ln u for u below 0.01
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>s</td><td>drawdown</td><td>m</td></tr>
 * <tr><td>Q</td><td>rate</td><td>m³/s</td></tr>
 * <tr><td>T</td><td>transmissivity</td><td>m²/s</td></tr>
 * <tr><td>S</td><td>storativity</td><td>1</td></tr>
 * <tr><td>r, t</td><td>distance and time</td><td>m, s</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for a confined, unbounded, uniform aquifer and a well through all of it. Leakage,
 * boundaries and partial penetration break it.
 *
 * <p><b>Source</b>: Theis (1935), Trans. Am. Geophys. Union 16, 519–524; Cooper and Jacob (1946),
 * Trans. Am. Geophys. Union 27, 526–534.
 *
 * <p><b>Checked</b> in {@code FlowLawsTest}.
 */
public final class Theis {

  /** The facts on the well function. */
  public static final MethodCard CARD =
      MethodCard.named("theis", "Theis")
          .equation("s = Q W(u) / (4π T), u = r² S / (4 T t)")
          .input("Q", "rate", Units.m3PerSecond, Range.from(0))
          .input("T", "transmissivity", Units.m2PerSecond, Range.POSITIVE)
          .input("S", "storativity", Units.number, Range.POSITIVE)
          .valid(1e-07, 0.4)
          .input("r", "distance", Units.m, Range.POSITIVE)
          .input("t", "time", Units.s, Range.POSITIVE)
          .result("s", "drawdown", Units.m)
          .source("Theis (1935), Trans. Am. Geophys. Union 16, 519–524")
          .constants(Constants.EXACT)
          .topics("well", "aquifer", "drawdown", "pumping test", "flow")
          .note("Confined, unbounded, uniform; no leakage, no boundary in reach.")
          .build();

  /** The facts on the late straight line. */
  public static final MethodCard LATE =
      MethodCard.named("cooper-jacob", "Cooper–Jacob")
          .equation("s = Q (-0.577216 - ln u) / (4π T), u = r² S / (4 T t)")
          .input("Q", "rate", Units.m3PerSecond, Range.from(0))
          .input("T", "transmissivity", Units.m2PerSecond, Range.POSITIVE)
          .input("S", "storativity", Units.number, Range.POSITIVE)
          .valid(1e-07, 0.4)
          .input("r", "distance", Units.m, Range.POSITIVE)
          .input("t", "time", Units.s, Range.POSITIVE)
          .result("s", "drawdown", Units.m)
          .source("Cooper and Jacob (1946), Trans. Am. Geophys. Union 27, 526–534")
          .constants(Constants.EXACT)
          .topics("well", "aquifer", "drawdown", "pumping test", "flow")
          .note("Needs u below 0.01: refused above 0.1, where it is 5 % and more off.")
          .build();

  private static final Formula<Length> CARD_FORMULA =
      Formula.ofAny(CARD, Units.m, in -> Theis.drawdownNumber(in[0], in[1], in[2], in[3], in[4]));

  private static final Formula<Length> LATE_FORMULA =
      Formula.ofAny(
          LATE, Units.m, in -> Theis.lateDrawdownNumber(in[0], in[1], in[2], in[3], in[4]));

  private Theis() {}

  /** Returns the drawdown of one sample by the well function. */
  public static Length drawdown(
      Rate rate, Transmissivity transmissivity, double storativity, Length distance, Time time) {
    return CARD_FORMULA.value(rate, transmissivity, Units.number(storativity), distance, time);
  }

  /** Returns the drawdown of each row by the well function. */
  public static Series drawdown(
      Operand rate, Operand transmissivity, Operand storativity, Operand distance, Operand time) {
    return CARD_FORMULA.series(rate, transmissivity, storativity, distance, time);
  }

  static double drawdownNumber(double q, double t, double s, double r, double time) {
    return q * wellFunction(r * r * s / (4 * t * time)) / (4 * StrictMath.PI * t);
  }

  /** Returns the drawdown of one sample by the late straight line. */
  public static Length lateDrawdown(
      Rate rate, Transmissivity transmissivity, double storativity, Length distance, Time time) {
    return LATE_FORMULA.value(rate, transmissivity, Units.number(storativity), distance, time);
  }

  /** Returns the drawdown of each row by the late straight line. */
  public static Series lateDrawdown(
      Operand rate, Operand transmissivity, Operand storativity, Operand distance, Operand time) {
    return LATE_FORMULA.series(rate, transmissivity, storativity, distance, time);
  }

  static double lateDrawdownNumber(double q, double t, double s, double r, double time) {
    double u = r * r * s / (4 * t * time);
    if (u > 0.1) {
      throw new IllegalArgumentException(
          "u is " + u + "; Cooper–Jacob needs u below 0.01: use Theis, or a later time");
    }
    return q * (-EULER - StrictMath.log(u)) / (4 * StrictMath.PI * t);
  }

  private static final double EULER = 0.57721566490153286;

  /**
   * Returns the well function W(u), the exponential integral E1: by its series up to 1, above by
   * the continued fraction of Lentz.
   *
   * @throws IllegalArgumentException if u is not above 0
   */
  public static double wellFunction(double u) {
    if (!(u > 0)) {
      throw new IllegalArgumentException("the well function needs u above 0, found " + u);
    }
    return u <= 1 ? series(u) : fraction(u);
  }

  private static double series(double u) {
    double sum = -EULER - StrictMath.log(u);
    double term = 1;
    for (int n = 1; n < 60; n++) {
      term *= -u / n;
      sum -= term / n;
    }
    return sum;
  }

  private static double fraction(double u) {
    double b = u + 1;
    double c = 1e300;
    double d = 1 / b;
    double h = d;
    for (int i = 1; i < 500; i++) {
      double a = -(double) i * i;
      b += 2;
      d = 1 / (a * d + b);
      c = b + a / c;
      double step = c * d;
      h *= step;
      if (StrictMath.abs(step - 1) < 1e-16) {
        break;
      }
    }
    return h * StrictMath.exp(-u);
  }
}
