package connate.darcy;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Angle;
import connate.quantity.Density;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.quantity.Velocity;
import connate.quantity.Viscosity;
import connate.series.Series;

/**
 * Flux of a buoyant fluid along a dipping carrier bed, after Hubbert.
 *
 * <pre>
 * q = k k_r Δρ g sin θ / μ
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>q</td><td>flux</td><td>m/s</td></tr>
 * <tr><td>k, k_r</td><td>permeability and the part that is open to the fluid</td><td>m², 1</td></tr>
 * <tr><td>Δρ</td><td>difference of density to the water</td><td>kg/m³</td></tr>
 * <tr><td>θ</td><td>dip</td><td>°</td></tr>
 * <tr><td>μ</td><td>viscosity of the fluid</td><td>Pa·s</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for a thin stringer; only the wetted part of the carrier conducts.
 *
 * <p><b>Source</b>: Hubbert (1953), AAPG Bulletin 37, 1954–2026.
 *
 * <p><b>Checked</b> in {@code FlowLawsTest}.
 */
public final class BuoyantFlux {

  /** The facts on buoyancy along a dip. */
  public static final MethodCard CARD =
      MethodCard.named("buoyant-flux", "Buoyant flux")
          .equation("q = k k_r Δρ g sin θ / μ")
          .input("k", "permeability", Units.squareMetres, Range.from(0))
          .input("k_r", "relative permeability", Units.fraction, Range.PART)
          .input("Δρ", "density difference", Units.kgPerM3, Range.from(0))
          .input("θ", "dip", Units.degrees, Range.from(0))
          .input("μ", "viscosity", Units.PaS, Range.POSITIVE)
          .result("q", "flux", Units.metresPerSecond)
          .source("Hubbert (1953), AAPG Bulletin 37, 1954–2026")
          .constants(Constants.EXACT)
          .topics("flow", "migration", "buoyancy")
          .note("Divide by porosity and saturation for the velocity of the stringer.")
          .build();

  private static final Formula<Velocity> CARD_FORMULA =
      Formula.ofAny(
          CARD,
          Units.metresPerSecond,
          in -> BuoyantFlux.ofNumber(in[0], in[1], in[2], in[3], in[4]));

  private BuoyantFlux() {}

  /** Returns the flux of one sample by buoyancy along a dip. */
  public static Velocity of(
      Permeability permeability,
      Fraction relativePermeability,
      Density densityDifference,
      Angle dip,
      Viscosity viscosity) {
    return CARD_FORMULA.value(
        permeability, relativePermeability, densityDifference, dip, viscosity);
  }

  /** Returns the flux of each row by buoyancy along a dip. */
  public static Series of(
      Operand permeability,
      Operand relativePermeability,
      Operand densityDifference,
      Operand dip,
      Operand viscosity) {
    return CARD_FORMULA.series(
        permeability, relativePermeability, densityDifference, dip, viscosity);
  }

  static double ofNumber(double k, double kr, double density, double dip, double mu) {
    return k * kr * density * 9.80665 * StrictMath.sin(StrictMath.toRadians(dip)) / mu;
  }
}
