package connate.darcy;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Area;
import connate.quantity.Length;
import connate.quantity.Permeability;
import connate.quantity.Pressure;
import connate.quantity.Rate;
import connate.quantity.Units;
import connate.quantity.Viscosity;

/**
 * Steady flow of one fluid through rock by Darcy's law, along a body and to a well.
 *
 * <pre>
 * linear  Q = k A Δp / (μ L)
 * radial  Q = 2π k h Δp / (μ (ln(r_e/r_w) + s))
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>SI unit</th></tr>
 * <tr><td>Q</td><td>rate at the conditions of the rock</td><td>m³/s</td></tr>
 * <tr><td>k</td><td>permeability along the flow</td><td>m²</td></tr>
 * <tr><td>A, L</td><td>cross-section and length</td><td>m², m</td></tr>
 * <tr><td>h</td><td>thickness</td><td>m</td></tr>
 * <tr><td>Δp</td><td>difference of potential, not of pressure where the body dips</td><td>Pa</td></tr>
 * <tr><td>μ</td><td>viscosity</td><td>Pa·s</td></tr>
 * <tr><td>r_e, r_w</td><td>radius of drainage, of the well</td><td>m</td></tr>
 * <tr><td>s</td><td>skin</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for creeping flow; radial: confined, steady, well through the whole bed.
 *
 * <p><b>Source</b>: Darcy (1856), Les fontaines publiques de la ville de Dijon; Dupuit (1863);
 * Thiem (1906); Muskat (1937), The Flow of Homogeneous Fluids.
 *
 * <p><b>Checked</b> in {@code DarcyTest}.
 */
public final class Darcy {

  /** The facts on flow along a body. */
  public static final MethodCard LINEAR =
      MethodCard.named("darcy-linear", "Darcy, linear flow")
          .equation("Q = k A Δp / (μ L)")
          .input("k", "permeability", Units.squareMetres, Range.from(0))
          .input("A", "cross-section", Units.m2, Range.POSITIVE)
          .input("Δp", "difference of potential", Units.Pa)
          .input("μ", "viscosity", Units.PaS, Range.POSITIVE)
          .input("L", "length", Units.m, Range.POSITIVE)
          .result("Q", "rate", Units.m3PerSecond)
          .source("Darcy (1856), Les fontaines publiques de la ville de Dijon")
          .constants(Constants.EXACT)
          .topics("flow", "darcy", "rate")
          .note("Where the body dips, take the difference of potential, not of pressure.")
          .build();

  /** The facts on flow to a well. */
  public static final MethodCard RADIAL =
      MethodCard.named("darcy-radial", "Darcy, radial flow to a well")
          .equation("Q = 2π k h Δp / (μ (ln(r_e/r_w) + s))")
          .input("k", "permeability", Units.squareMetres, Range.from(0))
          .input("h", "thickness", Units.m, Range.POSITIVE)
          .input("Δp", "drawdown", Units.Pa)
          .input("μ", "viscosity", Units.PaS, Range.POSITIVE)
          .input("r_e", "radius of drainage", Units.m, Range.POSITIVE)
          .input("r_w", "radius of the well", Units.m, Range.POSITIVE)
          .input("s", "skin", Units.number)
          .result("Q", "rate", Units.m3PerSecond)
          .source("Dupuit (1863); Thiem (1906); Muskat (1937), The Flow of Homogeneous Fluids")
          .constants(Constants.EXACT)
          .topics("flow", "darcy", "rate", "well")
          .note("Steady, confined, the well through the whole bed; at conditions of the rock.")
          .build();

  private static final Formula<Rate> LINEAR_FORMULA =
      Formula.ofAny(LINEAR, Units.m3PerSecond, in -> in[0] * in[1] * in[2] / (in[3] * in[4]));
  private static final Formula<Rate> RADIAL_FORMULA =
      Formula.ofAny(RADIAL, Units.m3PerSecond, Darcy::toWell);

  private Darcy() {}

  /** Returns the rate along a body. */
  public static Rate linear(
      Permeability k, Area section, Pressure difference, Viscosity viscosity, Length length) {
    return LINEAR_FORMULA.value(k, section, difference, viscosity, length).to(Units.m3PerDay);
  }

  /** Returns the rate to a well without skin. */
  public static Rate radial(
      Permeability k,
      Length thickness,
      Pressure drawdown,
      Viscosity viscosity,
      Length drainage,
      Length well) {
    return radial(k, thickness, drawdown, viscosity, drainage, well, 0);
  }

  /**
   * Returns the rate to a well with skin.
   *
   * @throws IllegalArgumentException if the radius of drainage is not above that of the well, or
   *     the skin is so negative that no finite rate is left
   */
  public static Rate radial(
      Permeability k,
      Length thickness,
      Pressure drawdown,
      Viscosity viscosity,
      Length drainage,
      Length well,
      double skin) {
    return RADIAL_FORMULA
        .value(k, thickness, drawdown, viscosity, drainage, well, Units.number(skin))
        .to(Units.m3PerDay);
  }

  private static double toWell(double... in) {
    if (in[4] <= in[5]) {
      throw new IllegalArgumentException(
          "the radius of drainage, "
              + in[4]
              + " m, is not above that of the well, "
              + in[5]
              + " m");
    }
    double resistance = StrictMath.log(in[4] / in[5]) + in[6];
    if (!(resistance > 0)) {
      throw new IllegalArgumentException(
          "a skin of " + in[6] + " leaves no resistance to flow: the well would reach beyond r_e");
    }
    return 2 * StrictMath.PI * in[0] * in[1] * in[2] / (in[3] * resistance);
  }
}
