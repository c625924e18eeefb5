package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Reservoir quality index and flow zone indicator: plugs with the same pore throats share one
 * indicator, whatever their porosity.
 *
 * <pre>
 * RQI = 0.0314 √(k/φ);  FZI = RQI / (φ/(1 − φ));  k = (FZI/0.0314)² φ³/(1 − φ)²
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>RQI</td><td>reservoir quality index</td><td>µm</td></tr>
 * <tr><td>FZI</td><td>flow zone indicator</td><td>µm</td></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> where log RQI against log φ/(1 − φ) has slope 1 within a unit; test it.
 *
 * <p><b>Source</b>: Amaefule and others (1993), SPE 26436; worked example in Tiab and Donaldson
 * (2004), Petrophysics, 2nd ed., p. 125. The exact factor is 0.0314153; the printed 0.0314 gives
 * 1014 where the exact one gives 1013.25.
 *
 * <p><b>Checked</b> in {@code FlowZoneIndicatorTest}.
 */
public final class FlowZoneIndicator {

  /** The facts on the indicator. */
  public static final MethodCard CARD =
      MethodCard.named("flow-zone-indicator", "Flow zone indicator")
          .equation("FZI = 0.0314 √(k/φ) / (φ/(1 - φ))")
          .input("φ", "porosity", Units.fraction, Range.above(0).below(1))
          .input("k", "permeability", Units.mD, Range.POSITIVE)
          .result("FZI", "flow zone indicator", Units.um)
          .source("Amaefule and others (1993), SPE 26436")
          .constants(Constants.CHECKED)
          .topics("rock type", "hydraulic unit", "permeability", "core")
          .note("Constant within a unit only where log RQI on log φ/(1 - φ) has slope 1.")
          .build();

  /** The facts on the quality index. */
  public static final MethodCard QUALITY =
      MethodCard.named("reservoir-quality-index", "Reservoir quality index")
          .equation("RQI = 0.0314 √(k/φ)")
          .input("φ", "porosity", Units.fraction, Range.above(0).below(1))
          .input("k", "permeability", Units.mD, Range.POSITIVE)
          .result("RQI", "reservoir quality index", Units.um)
          .source("Amaefule and others (1993), SPE 26436")
          .constants(Constants.CHECKED)
          .topics("rock type", "hydraulic unit", "permeability", "core")
          .build();

  /** The facts on the permeability of a unit. */
  public static final MethodCard PERMEABILITY =
      MethodCard.named("flow-zone-permeability", "Permeability of a flow zone")
          .equation("k = (FZI/0.0314)² φ³ / (1 - φ)²")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .input("FZI", "flow zone indicator", Units.um, Range.POSITIVE)
          .result("k", "permeability", Units.mD)
          .source("Amaefule and others (1993), SPE 26436")
          .constants(Constants.CHECKED)
          .topics("rock type", "hydraulic unit", "permeability", "porosity")
          .build();

  private static final double FACTOR = 0.0314;

  private static final Formula<Length> INDICATOR_FORMULA =
      Formula.of(CARD, Units.um, FlowZoneIndicator::indicator);
  private static final Formula<Length> QUALITY_FORMULA =
      Formula.of(QUALITY, Units.um, FlowZoneIndicator::quality);
  private static final Formula<Permeability> PERMEABILITY_FORMULA =
      Formula.of(PERMEABILITY, Units.mD, FlowZoneIndicator::millidarcy);

  private FlowZoneIndicator() {}

  /** Returns the flow zone indicator of one plug. */
  public static Length of(Fraction porosity, Permeability permeability) {
    return INDICATOR_FORMULA.value(porosity, permeability);
  }

  /** Returns the flow zone indicator of each row. */
  public static Series of(Operand porosity, Operand permeability) {
    return INDICATOR_FORMULA.series(porosity, permeability);
  }

  /** Returns the reservoir quality index of one plug. */
  public static Length quality(Fraction porosity, Permeability permeability) {
    return QUALITY_FORMULA.value(porosity, permeability);
  }

  /** Returns the reservoir quality index of each row. */
  public static Series quality(Operand porosity, Operand permeability) {
    return QUALITY_FORMULA.series(porosity, permeability);
  }

  /** Returns the permeability of a unit at a porosity. */
  public static Permeability permeability(Fraction porosity, Length indicator) {
    return PERMEABILITY_FORMULA.value(porosity, indicator);
  }

  /** Returns the permeability of a unit at each row's porosity. */
  public static Series permeability(Operand porosity, Operand indicator) {
    return PERMEABILITY_FORMULA.series(porosity, indicator);
  }

  private static double quality(double phi, double k) {
    return FACTOR * StrictMath.sqrt(k / phi);
  }

  private static double indicator(double phi, double k) {
    return quality(phi, k) * (1 - phi) / phi;
  }

  private static double millidarcy(double phi, double indicator) {
    double ratio = indicator / FACTOR;
    double solid = 1 - phi;
    return ratio * ratio * phi * phi * phi / (solid * solid);
  }
}
