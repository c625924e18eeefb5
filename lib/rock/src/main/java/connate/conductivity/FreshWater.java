package connate.conductivity;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Density;
import connate.quantity.Operand;
import connate.quantity.Temperature;
import connate.quantity.Units;
import connate.quantity.Viscosity;
import connate.series.Series;

/**
 * Viscosity and density of fresh water at atmospheric pressure.
 *
 * <pre>
 * μ = Σ aᵢ (T/300 K)^bᵢ,   a = 280.68 511.45 61.131 0.45903 µPa·s,  b = −1.9 −7.7 −19.6 −40
 * ρ = (999.83952 + 16.945176 t − 7.9870401e-3 t² − 46.170461e-6 t³ + 105.56302e-9 t⁴
 *      − 280.54253e-12 t⁵) / (1 + 16.879850e-3 t),   t in °C
 * </pre>
 *
 * <p><b>Valid</b> from 0 to 100 °C (viscosity from −20 °C). Salt adds to both: 3.5 % of it 7 % to
 * the viscosity.
 *
 * <p><b>Source</b>: Pátek and others (2009), J. Phys. Chem. Reference Data 38, 21–29; Kell (1975),
 * J. Chemical and Engineering Data 20, 97–105. Constants from memory, results checked against
 * handbook values.
 *
 * <p><b>Checked</b> in {@code FreshWaterTest}.
 */
public final class FreshWater {

  /** The facts on the viscosity. */
  public static final MethodCard VISCOSITY =
      MethodCard.named("water-viscosity", "Viscosity of fresh water")
          .equation("μ = Σ a (T/300 K)^b")
          .input("T", "temperature", Units.K, Range.of(253.15, 383.15))
          .valid(273.15, 373.15)
          .result("μ", "viscosity", Units.mPaS)
          .source("Pátek and others (2009), J. Phys. Chem. Reference Data 38, 21–29")
          .constants(Constants.FROM_MEMORY)
          .topics("water", "viscosity", "hydraulic conductivity")
          .note("At atmospheric pressure, without salt.")
          .build();

  /** The facts on the density. */
  public static final MethodCard DENSITY =
      MethodCard.named("water-density", "Density of fresh water")
          .equation("ρ = polynomial(t) / (1 + 0.01687985 t)")
          .input("t", "temperature", Units.degC, Range.of(-20, 110))
          .valid(0, 100)
          .result("ρ", "density", Units.kgPerM3)
          .source("Kell (1975), J. Chemical and Engineering Data 20, 97–105")
          .constants(Constants.FROM_MEMORY)
          .topics("water", "density", "hydraulic conductivity")
          .note("At atmospheric pressure, without salt.")
          .build();

  /** Standard gravity in m/s². */
  static final double GRAVITY = 9.80665;

  private static final double ZERO_CELSIUS = 273.15;
  private static final double REFERENCE = 300;
  private static final double[] A = {280.68, 511.45, 61.131, 0.45903};
  private static final double[] B = {-1.9, -7.7, -19.6, -40};
  private static final double[] RHO = {
    999.83952, 16.945176, -7.9870401e-3, -46.170461e-6, 105.56302e-9, -280.54253e-12
  };

  private static final Formula<Viscosity> VISCOSITY_FORMULA =
      Formula.of(VISCOSITY, Units.mPaS, FreshWater::viscosityMilliPascalSeconds);
  private static final Formula<Density> DENSITY_FORMULA =
      Formula.of(DENSITY, Units.kgPerM3, FreshWater::densityKgPerM3);

  private FreshWater() {}

  /** Returns the viscosity. */
  public static Viscosity viscosity(Temperature temperature) {
    return VISCOSITY_FORMULA.value(temperature);
  }

  /** Returns the viscosity of each row. */
  public static Series viscosity(Operand temperature) {
    return VISCOSITY_FORMULA.series(temperature);
  }

  /** Returns the density. */
  public static Density density(Temperature temperature) {
    return DENSITY_FORMULA.value(temperature);
  }

  /** Returns the density of each row. */
  public static Series density(Operand temperature) {
    return DENSITY_FORMULA.series(temperature);
  }

  static double viscosityMilliPascalSeconds(double kelvin) {
    double sum = 0;
    for (int i = 0; i < A.length; i++) {
      sum += A[i] * StrictMath.pow(kelvin / REFERENCE, B[i]);
    }
    return sum / 1000;
  }

  static double densityKgPerM3(double celsius) {
    double sum = 0;
    for (int i = RHO.length - 1; i >= 0; i--) {
      sum = sum * celsius + RHO[i];
    }
    return sum / (1 + 16.879850e-3 * celsius);
  }

  /** Returns g/ν in 1/(m s). */
  static double gravityOverViscosity(double celsius) {
    double mu = viscosityMilliPascalSeconds(celsius + ZERO_CELSIUS) / 1000;
    return GRAVITY * densityKgPerM3(celsius) / mu;
  }
}
