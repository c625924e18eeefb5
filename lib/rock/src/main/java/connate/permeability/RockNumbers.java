package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Numbers by which plugs are sorted from their flow zone indicator: discrete rock type and global
 * hydraulic element.
 *
 * <pre>
 * DRT = round(2 ln FZI + 10.6)
 * GHE = 1 at FZI 0.0938 µm, one more with each doubling
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>FZI</td><td>flow zone indicator</td><td>µm</td></tr>
 * <tr><td>DRT</td><td>discrete rock type</td><td>1</td></tr>
 * <tr><td>GHE</td><td>global hydraulic element, 1 to 10; 0 below</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for plugs whose indicator is constant within a unit.
 *
 * <p><b>Source</b>: Amaefule and others (1993), SPE 26436, DRT from memory; Corbett and Potter
 * (2004), SCA 2004-30, bounds from memory.
 *
 * <p><b>Checked</b> in {@code MoreLawsTest}.
 */
public final class RockNumbers {

  /** The facts on discrete rock types. */
  public static final MethodCard DISCRETE =
      MethodCard.named("discrete-rock-type", "Discrete rock type")
          .equation("DRT = round(2 ln FZI + 10.6)")
          .input("FZI", "flow zone indicator", Units.um, Range.POSITIVE)
          .result("DRT", "discrete rock type", Units.number)
          .source("Amaefule and others (1993), SPE 26436")
          .constants(Constants.FROM_MEMORY)
          .topics("rock type", "core")
          .note("Whole numbers.")
          .build();

  /** The facts on global hydraulic elements. */
  public static final MethodCard GLOBAL =
      MethodCard.named("global-hydraulic-element", "Global hydraulic element")
          .equation("GHE = floor(log2(FZI / 0.0938)) + 1, from 0 to 10")
          .input("FZI", "flow zone indicator", Units.um, Range.POSITIVE)
          .result("GHE", "global hydraulic element", Units.number)
          .source("Corbett and Potter (2004), SCA 2004-30")
          .constants(Constants.FROM_MEMORY)
          .topics("rock type", "core")
          .note("Bounds 0.0938, 0.1875, 0.375 … 48 µm, each twice the one before.")
          .build();

  private static final Formula<Ratio> DISCRETE_FORMULA =
      Formula.of(DISCRETE, Units.number, fzi -> RockNumbers.discreteNumber(fzi));

  private static final Formula<Ratio> GLOBAL_FORMULA =
      Formula.of(GLOBAL, Units.number, fzi -> RockNumbers.globalNumber(fzi));

  private RockNumbers() {}

  /** Returns the discrete rock type of one sample by discrete rock types. */
  public static Ratio discrete(Length flowZoneIndicator) {
    return DISCRETE_FORMULA.value(flowZoneIndicator);
  }

  /** Returns the discrete rock type of each row by discrete rock types. */
  public static Series discrete(Operand flowZoneIndicator) {
    return DISCRETE_FORMULA.series(flowZoneIndicator);
  }

  static double discreteNumber(double fzi) {
    return StrictMath.rint(2 * StrictMath.log(fzi) + 10.6);
  }

  /** Returns the global hydraulic element of one sample by global hydraulic elements. */
  public static Ratio global(Length flowZoneIndicator) {
    return GLOBAL_FORMULA.value(flowZoneIndicator);
  }

  /** Returns the global hydraulic element of each row by global hydraulic elements. */
  public static Series global(Operand flowZoneIndicator) {
    return GLOBAL_FORMULA.series(flowZoneIndicator);
  }

  static double globalNumber(double fzi) {
    return StrictMath.max(
        0,
        StrictMath.min(
            10, StrictMath.floor(StrictMath.log(fzi / 0.09375) / StrictMath.log(2) + 1e-12) + 1));
  }
}
