package connate.conductivity;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.HydraulicConductivity;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Temperature;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Barr: hydraulic conductivity of loose sand from its grain size.
 *
 * <pre>
 * K = (g/ν) n³ / (1 − n)² d10² / (36 · 5 · Cs²)
 * </pre>
 *
 * <p>g is 9.80665 m/s², ν the kinematic viscosity of water at the temperature, sizes are in metres
 * unless the equation says mm.
 *
 * <p><b>Valid</b> for clean sand.
 *
 * <p><b>Source</b>: Barr (2001), Ground Water 39, 829–833. Constants from memory.
 *
 * <p><b>Checked</b> in {@code BarrTest}.
 */
public final class Barr {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("barr", "Barr")
          .equation("K = (g/ν) n³/(1 - n)² d10²/(180 Cs²), sizes in m")
          .input("d10", "size with 10 % finer", Units.mm, Range.POSITIVE)
          .input("n", "porosity", Units.fraction, Range.above(0).below(1))
          .input("T", "temperature of the water", Units.degC, Range.of(0, 100))
          .input("Cs", "surface factor", Units.number, Range.from(1))
          .valid(1, 1.35)
          .result("K", "hydraulic conductivity", Units.mPerSecond)
          .source("Barr (2001), Ground Water 39, 829–833")
          .constants(Constants.FROM_MEMORY)
          .topics("hydraulic conductivity", "grain size", "aquifer", "sand")
          .note(
              "Cs from 1 for spheres to 1.35 for angular grains, the default; with 1 it is Kozeny–Carman with 1/180. Others take 1.175, the middle.")
          .build();

  /** The surface factor of angular grains, the cautious default. */
  public static final double ANGULAR = 1.35;

  /** How the table of all formulas asks this one. */
  static final Entry ENTRY =
      new Entry(
          CARD, sand -> metresPerSecond(sand.d10(), sand.n(), sand.celsius(), ANGULAR), sand -> "");

  private static final Formula<HydraulicConductivity> FORMULA =
      Formula.of(CARD, Units.mPerSecond, Barr::metresPerSecond);

  private Barr() {}

  /** Returns the conductivity of one sand, in m/d. */
  public static HydraulicConductivity of(
      Length d10, Fraction porosity, Temperature temperature, Ratio shape) {
    return FORMULA.value(d10, porosity, temperature, shape).to(Units.mPerDay);
  }

  /** Returns the conductivity of each row, in m/d. */
  public static Series of(Operand d10, Operand porosity, Operand temperature, Operand shape) {
    return FORMULA.series(d10, porosity, temperature, shape).to(Units.mPerDay);
  }

  /** Returns the conductivity of one sand of angular grains, in m/d. */
  public static HydraulicConductivity of(Length d10, Fraction porosity, Temperature temperature) {
    return of(d10, porosity, temperature, Units.number(ANGULAR));
  }

  /** Returns the conductivity of each row with angular grains, in m/d. */
  public static Series of(Operand d10, Operand porosity, Operand temperature) {
    return of(d10, porosity, temperature, Units.number(ANGULAR));
  }

  static double metresPerSecond(double mm, double n, double celsius, double shape) {
    return FreshWater.gravityOverViscosity(celsius) * factor(mm, n, shape);
  }

  /** Returns K ν / g in m². */
  static double factor(double mm, double n, double shape) {
    double d = mm / 1000;
    return n * n * n / ((1 - n) * (1 - n)) * d * d / (180 * shape * shape);
  }
}
