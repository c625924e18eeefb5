package connate.core;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Area;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Pressure;
import connate.quantity.Rate;
import connate.quantity.Units;
import connate.quantity.Viscosity;
import connate.series.Series;

/**
 * Permeability of a plug from its flow of liquid or gas.
 *
 * <pre>
 * liquid  k = q μ L / (A Δp)
 * gas     k = 2 Q P μ L / (A (P1² − P2²))
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>D</td></tr>
 * <tr><td>q</td><td>rate of liquid</td><td>cm³/s</td></tr>
 * <tr><td>Q, P</td><td>rate of gas and the pressure at which it is measured</td><td>cm³/s, atm</td></tr>
 * <tr><td>μ</td><td>viscosity</td><td>cP</td></tr>
 * <tr><td>L, A</td><td>length and cross-section</td><td>cm, cm²</td></tr>
 * <tr><td>P1, P2</td><td>pressures at both ends, absolute</td><td>atm</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for creeping flow. Pressures are absolute; gauge pressures give too high a gas
 * permeability.
 *
 * <p><b>Source</b>: Darcy (1856); American Petroleum Institute (1998), Recommended Practice 40.
 *
 * <p><b>Checked</b> in {@code CoreLawsTest}.
 */
public final class PlugFlow {

  /** The facts on Darcy flow of liquid. */
  public static final MethodCard LIQUID =
      MethodCard.named("plug-liquid", "Plug permeability to liquid")
          .equation("k = q μ L / (A Δp)")
          .input("q", "rate", Units.cm3PerSecond, Range.from(0))
          .input("μ", "viscosity", Units.cP, Range.POSITIVE)
          .input("L", "length", Units.cm, Range.POSITIVE)
          .input("A", "cross-section", Units.cm2, Range.POSITIVE)
          .input("Δp", "pressure difference", Units.atm, Range.POSITIVE)
          .result("k", "permeability", Units.darcy)
          .source("API (1998), Recommended Practice 40")
          .constants(Constants.EXACT)
          .topics("core", "plug", "permeability")
          .note("Creeping flow.")
          .build();

  /** The facts on Darcy flow of gas. */
  public static final MethodCard GAS =
      MethodCard.named("plug-gas", "Plug permeability to gas")
          .equation("k = 2 Q P μ L / (A (P1² - P2²))")
          .input("Q", "gas rate", Units.cm3PerSecond, Range.from(0))
          .input("P", "pressure of the rate", Units.atm, Range.POSITIVE)
          .input("μ", "viscosity", Units.cP, Range.POSITIVE)
          .input("L", "length", Units.cm, Range.POSITIVE)
          .input("A", "cross-section", Units.cm2, Range.POSITIVE)
          .input("P1", "upstream pressure", Units.atm, Range.POSITIVE)
          .input("P2", "downstream pressure", Units.atm, Range.POSITIVE)
          .result("k", "gas permeability", Units.darcy)
          .source("API (1998), Recommended Practice 40")
          .constants(Constants.EXACT)
          .topics("core", "plug", "gas", "permeability")
          .note("Absolute pressures; correct for slip afterwards.")
          .build();

  private static final Formula<Permeability> LIQUID_FORMULA =
      Formula.ofAny(
          LIQUID, Units.darcy, in -> PlugFlow.liquidNumber(in[0], in[1], in[2], in[3], in[4]));

  private static final Formula<Permeability> GAS_FORMULA =
      Formula.ofAny(
          GAS,
          Units.darcy,
          in -> PlugFlow.gasNumber(in[0], in[1], in[2], in[3], in[4], in[5], in[6]));

  private PlugFlow() {}

  /** Returns the permeability of one sample by Darcy flow of liquid. */
  public static Permeability liquid(
      Rate rate,
      Viscosity viscosity,
      Length length,
      Area crossSection,
      Pressure pressureDifference) {
    return LIQUID_FORMULA.value(rate, viscosity, length, crossSection, pressureDifference);
  }

  /** Returns the permeability of each row by Darcy flow of liquid. */
  public static Series liquid(
      Operand rate,
      Operand viscosity,
      Operand length,
      Operand crossSection,
      Operand pressureDifference) {
    return LIQUID_FORMULA.series(rate, viscosity, length, crossSection, pressureDifference);
  }

  static double liquidNumber(double q, double mu, double l, double a, double dp) {
    return q * mu * l / (a * dp);
  }

  /** Returns the gas permeability of one sample by Darcy flow of gas. */
  public static Permeability gas(
      Rate gasRate,
      Pressure pressureOfTheRate,
      Viscosity viscosity,
      Length length,
      Area crossSection,
      Pressure upstreamPressure,
      Pressure downstreamPressure) {
    return GAS_FORMULA.value(
        gasRate,
        pressureOfTheRate,
        viscosity,
        length,
        crossSection,
        upstreamPressure,
        downstreamPressure);
  }

  /** Returns the gas permeability of each row by Darcy flow of gas. */
  public static Series gas(
      Operand gasRate,
      Operand pressureOfTheRate,
      Operand viscosity,
      Operand length,
      Operand crossSection,
      Operand upstreamPressure,
      Operand downstreamPressure) {
    return GAS_FORMULA.series(
        gasRate,
        pressureOfTheRate,
        viscosity,
        length,
        crossSection,
        upstreamPressure,
        downstreamPressure);
  }

  static double gasNumber(double q, double p, double mu, double l, double a, double p1, double p2) {
    if (p1 <= p2) {
      throw new IllegalArgumentException(
          "the upstream pressure " + p1 + " atm is not above the downstream pressure " + p2);
    }
    return 2 * q * p * mu * l / (a * (p1 * p1 - p2 * p2));
  }
}
