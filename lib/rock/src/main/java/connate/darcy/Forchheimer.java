package connate.darcy;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Density;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.PressureGradient;
import connate.quantity.SpecificSurface;
import connate.quantity.Units;
import connate.quantity.Velocity;
import connate.quantity.Viscosity;
import connate.series.Series;

/**
 * Pressure gradient of fast flow, where inertia counts beside friction, after Forchheimer.
 *
 * <pre>
 * −dp/dx = μ v/k + β ρ v²
 * β = 0.005 / (φ^5.5 √k), β in 1/cm, k in cm² (Geertsma)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>v</td><td>flux</td><td>m/s</td></tr>
 * <tr><td>β</td><td>inertial coefficient</td><td>1/m</td></tr>
 * <tr><td>ρ, μ</td><td>density and viscosity of the fluid</td><td>kg/m³, Pa·s</td></tr>
 * </table>
 *
 * <p><b>Valid</b> near gas wells; inertia counts where β ρ k v/μ is above 0.1. Correlations for β
 * scatter by ten each way.
 *
 * <p><b>Source</b>: Forchheimer (1901), Z. Ver. Dtsch. Ing. 45, 1782–1788; Geertsma (1974), SPE
 * Journal 14, 445–450, β from memory.
 *
 * <p><b>Checked</b> in {@code FlowLawsTest}.
 */
public final class Forchheimer {

  /** The facts on friction and inertia. */
  public static final MethodCard GRADIENT =
      MethodCard.named("forchheimer", "Forchheimer gradient")
          .equation("-dp/dx = μ v/k + β ρ v²")
          .input("k", "permeability", Units.squareMetres, Range.POSITIVE)
          .input("β", "inertial coefficient", Units.perM, Range.from(0))
          .input("ρ", "density", Units.kgPerM3, Range.from(0))
          .input("μ", "viscosity", Units.PaS, Range.POSITIVE)
          .input("v", "flux", Units.metresPerSecond, Range.from(0))
          .result("G", "pressure gradient", Units.PaPerM)
          .source("Forchheimer (1901), Z. Ver. Dtsch. Ing. 45, 1782–1788")
          .constants(Constants.EXACT)
          .topics("flow", "gas", "inertia")
          .note("Matters where β ρ k v/μ is above 0.1.")
          .build();

  /** The facts on the flux of a gradient. */
  public static final MethodCard FLUX =
      MethodCard.named("forchheimer-flux", "Forchheimer flux")
          .equation("v = (-μ/k + √((μ/k)² + 4 β ρ G)) / (2 β ρ)")
          .input("k", "permeability", Units.squareMetres, Range.POSITIVE)
          .input("β", "inertial coefficient", Units.perM, Range.POSITIVE)
          .input("ρ", "density", Units.kgPerM3, Range.POSITIVE)
          .input("μ", "viscosity", Units.PaS, Range.POSITIVE)
          .input("G", "pressure gradient", Units.PaPerM, Range.from(0))
          .result("v", "flux", Units.metresPerSecond)
          .source("Forchheimer (1901), Z. Ver. Dtsch. Ing. 45, 1782–1788")
          .constants(Constants.EXACT)
          .topics("flow", "gas", "inertia")
          .note("The inverse of the gradient.")
          .build();

  /** The facts on the correlation of Geertsma. */
  public static final MethodCard GEERTSMA =
      MethodCard.named("geertsma-beta", "Geertsma inertial coefficient")
          .equation("β = 0.005 / (φ^5.5 √k), β in 1/cm, k in cm²")
          .input("φ", "porosity", Units.fraction, Range.above(0).to(1))
          .input("k", "permeability", Units.squareMetres, Range.POSITIVE)
          .result("β", "inertial coefficient", Units.perM)
          .source("Geertsma (1974), SPE Journal 14, 445–450")
          .constants(Constants.FROM_MEMORY)
          .topics("flow", "gas", "inertia")
          .note("Correlations for β scatter by a factor of ten each way.")
          .build();

  private static final Formula<PressureGradient> GRADIENT_FORMULA =
      Formula.ofAny(
          GRADIENT,
          Units.PaPerM,
          in -> Forchheimer.gradientNumber(in[0], in[1], in[2], in[3], in[4]));

  private static final Formula<Velocity> FLUX_FORMULA =
      Formula.ofAny(
          FLUX,
          Units.metresPerSecond,
          in -> Forchheimer.fluxNumber(in[0], in[1], in[2], in[3], in[4]));

  private static final Formula<SpecificSurface> GEERTSMA_FORMULA =
      Formula.of(GEERTSMA, Units.perM, (phi, k) -> Forchheimer.betaNumber(phi, k));

  private Forchheimer() {}

  /** Returns the pressure gradient of one sample by friction and inertia. */
  public static PressureGradient gradient(
      Permeability permeability,
      SpecificSurface inertialCoefficient,
      Density density,
      Viscosity viscosity,
      Velocity flux) {
    return GRADIENT_FORMULA.value(permeability, inertialCoefficient, density, viscosity, flux);
  }

  /** Returns the pressure gradient of each row by friction and inertia. */
  public static Series gradient(
      Operand permeability,
      Operand inertialCoefficient,
      Operand density,
      Operand viscosity,
      Operand flux) {
    return GRADIENT_FORMULA.series(permeability, inertialCoefficient, density, viscosity, flux);
  }

  static double gradientNumber(double k, double beta, double density, double mu, double v) {
    return mu * v / k + beta * density * v * v;
  }

  /** Returns the flux of one sample by the flux of a gradient. */
  public static Velocity flux(
      Permeability permeability,
      SpecificSurface inertialCoefficient,
      Density density,
      Viscosity viscosity,
      PressureGradient pressureGradient) {
    return FLUX_FORMULA.value(
        permeability, inertialCoefficient, density, viscosity, pressureGradient);
  }

  /** Returns the flux of each row by the flux of a gradient. */
  public static Series flux(
      Operand permeability,
      Operand inertialCoefficient,
      Operand density,
      Operand viscosity,
      Operand pressureGradient) {
    return FLUX_FORMULA.series(
        permeability, inertialCoefficient, density, viscosity, pressureGradient);
  }

  static double fluxNumber(double k, double beta, double density, double mu, double g) {
    double friction = mu / k;
    return 2 * g / (friction + StrictMath.sqrt(friction * friction + 4 * beta * density * g));
  }

  /** Returns the inertial coefficient of one sample by the correlation of Geertsma. */
  public static SpecificSurface beta(Fraction porosity, Permeability permeability) {
    return GEERTSMA_FORMULA.value(porosity, permeability);
  }

  /** Returns the inertial coefficient of each row by the correlation of Geertsma. */
  public static Series beta(Operand porosity, Operand permeability) {
    return GEERTSMA_FORMULA.series(porosity, permeability);
  }

  static double betaNumber(double phi, double k) {
    return 100 * 0.005 / (StrictMath.pow(phi, 5.5) * StrictMath.sqrt(k * 1e4));
  }
}
