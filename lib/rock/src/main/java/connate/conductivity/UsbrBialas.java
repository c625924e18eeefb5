package connate.conductivity;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.HydraulicConductivity;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Temperature;
import connate.quantity.Units;
import connate.series.Series;

/**
 * USBR formula: hydraulic conductivity of loose sand from its grain size.
 *
 * <pre>
 * K = (g/ν) 4.8·10⁻⁴ d20[mm]^0.3 d20²
 * </pre>
 *
 * <p>g is 9.80665 m/s², ν the kinematic viscosity of water at the temperature, sizes are in metres
 * unless the equation says mm.
 *
 * <p><b>Valid</b> for medium sand with Cu below 5.
 *
 * <p><b>Source</b>: US Bureau of Reclamation, as told by Bialas (1966) and by Vuković and Soro
 * (1992). Constants from memory.
 *
 * <p><b>Checked</b> in {@code UsbrBialasTest}.
 */
public final class UsbrBialas {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("usbr", "USBR formula")
          .equation("K = (g/ν) 4.8e-4 d20[mm]^0.3 d20[m]²")
          .input("d20", "size with 20 % finer", Units.mm, Range.POSITIVE)
          .input("T", "temperature of the water", Units.degC, Range.of(0, 100))
          .result("K", "hydraulic conductivity", Units.mPerSecond)
          .source(
              "US Bureau of Reclamation, as told by Bialas (1966) and by Vuković and Soro (1992)")
          .constants(Constants.FROM_MEMORY)
          .topics("hydraulic conductivity", "grain size", "aquifer", "sand")
          .note(
              "The simple form 0.36 d20^2.3 cm/s, d20 in mm, is the same at about 10 °C. d20, not d10.")
          .build();

  private static final double BETA = 4.8e-4;

  /** How the table of all formulas asks this one. */
  static final Entry ENTRY =
      new Entry(
          CARD,
          sand -> metresPerSecond(sand.d20(), sand.celsius()),
          sand -> Outside.both(Outside.median(sand, 0.25, 0.5), Outside.uniformity(sand, 0, 5)));

  private static final Formula<HydraulicConductivity> FORMULA =
      Formula.of(CARD, Units.mPerSecond, UsbrBialas::metresPerSecond);

  private UsbrBialas() {}

  /** Returns the conductivity of one sand, in m/d. */
  public static HydraulicConductivity of(Length d20, Temperature temperature) {
    return FORMULA.value(d20, temperature).to(Units.mPerDay);
  }

  /** Returns the conductivity of each row, in m/d. */
  public static Series of(Operand d20, Operand temperature) {
    return FORMULA.series(d20, temperature).to(Units.mPerDay);
  }

  static double metresPerSecond(double mm, double celsius) {
    return FreshWater.gravityOverViscosity(celsius) * factor(mm);
  }

  /** Returns K ν / g in m². */
  static double factor(double mm) {
    double d = mm / 1000;
    return BETA * StrictMath.pow(mm, 0.3) * d * d;
  }
}
