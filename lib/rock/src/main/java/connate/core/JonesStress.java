package connate.core;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Pressure;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability under net stress from one without, after Jones.
 *
 * <pre>k = k0 exp(a (exp(−σ/σ*) − 1)) / (1 + C σ),  σ* = 3000 psi,  C = 3e-6 /psi</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k0</td><td>permeability without stress</td><td>mD</td></tr>
 * <tr><td>a</td><td>stress sensitivity of the rock, from two measurements</td><td>1</td></tr>
 * <tr><td>σ</td><td>net stress</td><td>psi</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for sandstone plugs under hydrostatic stress. In the rock the load is uniaxial:
 * 0.85 of the net vertical stress is the usual equivalent (common practice, no source). Clean sands
 * lose 5 to 30 %, tight rocks far more.
 *
 * <p><b>Source</b>: Jones (1988), SPE Formation Evaluation 3, 93–100; constants from memory.
 *
 * <p><b>Checked</b> in {@code JonesStressTest}.
 */
public final class JonesStress {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("jones-stress", "Jones stress correction")
          .equation("k = k0 exp(a (exp(-σ/3000) - 1)) / (1 + 3e-6 σ)")
          .input("k0", "permeability without stress", Units.mD, Range.from(0))
          .input("σ", "net stress", Units.psi, Range.from(0))
          .valid(0, 10_000)
          .input("a", "stress sensitivity", Units.number, Range.from(0))
          .result("k", "permeability in situ", Units.mD)
          .source("Jones (1988), SPE Formation Evaluation 3, 93–100")
          .constants(Constants.FROM_MEMORY)
          .topics("core", "stress", "permeability")
          .note("Hydrostatic stress: in the rock take about 0.85 of the net vertical stress.")
          .note("Without a measured sensitivity a = 0.25 is taken, a clean sand (from memory).")
          .build();

  /** The sensitivity of a clean sand, taken where none was measured; from memory. */
  public static final Ratio CLEAN_SAND = Units.number(0.25);

  private static final Formula<Permeability> FORMULA =
      Formula.of(CARD, Units.mD, JonesStress::stressed);

  private JonesStress() {}

  /** Returns the permeability of one plug of clean sand under stress. */
  public static Permeability atStress(Permeability unstressed, Pressure netStress) {
    return FORMULA.value(unstressed, netStress, CLEAN_SAND);
  }

  /** Returns the permeability of one plug under stress. */
  public static Permeability atStress(
      Permeability unstressed, Pressure netStress, double sensitivity) {
    return FORMULA.value(unstressed, netStress, Units.number(sensitivity));
  }

  /** Returns the permeability of each row under stress, for clean sand. */
  public static Series atStress(Operand unstressed, Operand netStress) {
    return atStress(unstressed, netStress, CLEAN_SAND);
  }

  /** Returns the permeability of each row under stress; it carries the trait {@code in situ}. */
  public static Series atStress(Operand unstressed, Operand netStress, Operand sensitivity) {
    if (unstressed instanceof Series k && "in situ".equals(k.traits().get(Series.STRESS))) {
      throw new IllegalArgumentException(
          "«" + k.name() + "» stands under stress already: it would be corrected twice");
    }
    return FORMULA.series(unstressed, netStress, sensitivity).with(Series.STRESS, "in situ");
  }

  private static double stressed(double k0, double stress, double a) {
    return k0 * StrictMath.exp(a * StrictMath.expm1(-stress / 3000)) / (1 + 3e-6 * stress);
  }
}
