package connate.darcy;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.PermeabilityThickness;
import connate.quantity.Pressure;
import connate.quantity.Rate;
import connate.quantity.Units;
import connate.quantity.Viscosity;
import connate.series.Series;

/**
 * Flow between a well and its cell of a grid, after Peaceman; injectivity of a five-spot, after
 * Muskat.
 *
 * <pre>
 * WI = 2π k h / (ln(r_o/r_w) + s),  r_o = Δx e^(−γ)/√8
 * Δp = q μ (ln(d/r_w) − 0.6173857) / (π k h)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>WI</td><td>well index</td><td>m³</td></tr>
 * <tr><td>r_o</td><td>radius at which the cell has the pressure of the flow around the well</td><td>m</td></tr>
 * <tr><td>Δx</td><td>size of the square cell</td><td>m</td></tr>
 * <tr><td>d</td><td>distance from injector to producer</td><td>m</td></tr>
 * </table>
 *
 * <p><b>Valid</b> single phase, uniform square cells, the well in the middle of its cell and far
 * from others.
 *
 * <p><b>Source</b>: Peaceman (1978), SPE Journal 18, 183–194; Muskat (1937), The Flow of
 * Homogeneous Fluids.
 *
 * <p><b>Checked</b> in {@code FlowLawsTest}.
 */
public final class WellIndex {

  /** The facts on the grid of Peaceman. */
  public static final MethodCard RADIUS =
      MethodCard.named("peaceman-radius", "Peaceman radius")
          .equation("r_o = Δx e^-γ / √8")
          .input("Δx", "cell size", Units.m, Range.POSITIVE)
          .result("r_o", "equivalent radius", Units.m)
          .source("Peaceman (1978), SPE Journal 18, 183–194")
          .constants(Constants.EXACT)
          .topics("well", "grid", "flow")
          .note("0.1985 Δx in the limit of a large grid; 0.2 is the fit to small ones.")
          .build();

  /** The facts on the index of Peaceman. */
  public static final MethodCard INDEX =
      MethodCard.named("peaceman-index", "Peaceman well index")
          .equation("WI = 2π k h / (ln(r_o/r_w) + s)")
          .input("k", "permeability", Units.squareMetres, Range.from(0))
          .input("h", "thickness", Units.m, Range.POSITIVE)
          .input("Δx", "cell size", Units.m, Range.POSITIVE)
          .input("r_w", "well radius", Units.m, Range.POSITIVE)
          .input("s", "skin", Units.number)
          .result("WI", "well index", Units.kh)
          .source("Peaceman (1978), SPE Journal 18, 183–194")
          .constants(Constants.EXACT)
          .topics("well", "grid", "flow")
          .note("Square isotropic cells.")
          .build();

  /** The facts on the pattern of Muskat. */
  public static final MethodCard FIVE_SPOT =
      MethodCard.named("five-spot", "Five-spot injectivity")
          .equation("Δp = q μ (ln(d/r_w) - 0.6173857) / (π k h)")
          .input("q", "rate", Units.m3PerSecond, Range.from(0))
          .input("μ", "viscosity", Units.PaS, Range.POSITIVE)
          .input("k", "permeability", Units.squareMetres, Range.POSITIVE)
          .input("h", "thickness", Units.m, Range.POSITIVE)
          .input("d", "distance", Units.m, Range.POSITIVE)
          .input("r_w", "well radius", Units.m, Range.POSITIVE)
          .result("Δp", "pressure difference", Units.Pa)
          .source("Muskat (1937), The Flow of Homogeneous Fluids")
          .constants(Constants.EXACT)
          .topics("well", "flow", "injection")
          .note("Unit mobility ratio. Injection pressure is bounded by local codes; an estimate.")
          .build();

  private static final Formula<Length> RADIUS_FORMULA =
      Formula.of(RADIUS, Units.m, size -> WellIndex.equivalentRadiusNumber(size));

  private static final Formula<PermeabilityThickness> INDEX_FORMULA =
      Formula.ofAny(INDEX, Units.kh, in -> WellIndex.ofNumber(in[0], in[1], in[2], in[3], in[4]));

  private static final Formula<Pressure> FIVE_SPOT_FORMULA =
      Formula.ofAny(
          FIVE_SPOT,
          Units.Pa,
          in -> WellIndex.fiveSpotDropNumber(in[0], in[1], in[2], in[3], in[4], in[5]));

  private WellIndex() {}

  /** Returns the equivalent radius of one sample by the grid of Peaceman. */
  public static Length equivalentRadius(Length cellSize) {
    return RADIUS_FORMULA.value(cellSize);
  }

  /** Returns the equivalent radius of each row by the grid of Peaceman. */
  public static Series equivalentRadius(Operand cellSize) {
    return RADIUS_FORMULA.series(cellSize);
  }

  static double equivalentRadiusNumber(double size) {
    return size * StrictMath.exp(-0.57721566490153286) / StrictMath.sqrt(8);
  }

  /** Returns the well index of one sample by the index of Peaceman. */
  public static PermeabilityThickness of(
      Permeability permeability,
      Length thickness,
      Length cellSize,
      Length wellRadius,
      double skin) {
    return INDEX_FORMULA.value(permeability, thickness, cellSize, wellRadius, Units.number(skin));
  }

  /** Returns the well index of each row by the index of Peaceman. */
  public static Series of(
      Operand permeability, Operand thickness, Operand cellSize, Operand wellRadius, Operand skin) {
    return INDEX_FORMULA.series(permeability, thickness, cellSize, wellRadius, skin);
  }

  static double ofNumber(double k, double h, double size, double rw, double skin) {
    return 2 * StrictMath.PI * k * h / (StrictMath.log(equivalentRadiusNumber(size) / rw) + skin);
  }

  /** Returns the pressure difference of one sample by the pattern of Muskat. */
  public static Pressure fiveSpotDrop(
      Rate rate,
      Viscosity viscosity,
      Permeability permeability,
      Length thickness,
      Length distance,
      Length wellRadius) {
    return FIVE_SPOT_FORMULA.value(rate, viscosity, permeability, thickness, distance, wellRadius);
  }

  /** Returns the pressure difference of each row by the pattern of Muskat. */
  public static Series fiveSpotDrop(
      Operand rate,
      Operand viscosity,
      Operand permeability,
      Operand thickness,
      Operand distance,
      Operand wellRadius) {
    return FIVE_SPOT_FORMULA.series(rate, viscosity, permeability, thickness, distance, wellRadius);
  }

  static double fiveSpotDropNumber(double q, double mu, double k, double h, double d, double rw) {
    return q * mu * (StrictMath.log(d / rw) - 0.6173857) / (StrictMath.PI * k * h);
  }
}
