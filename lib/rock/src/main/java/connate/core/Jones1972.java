package connate.core;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Pressure;
import connate.quantity.Units;
import connate.series.Series;

/**
 * The slip factor of gas as a function of permeability, after Jones.
 *
 * <pre>b = 6.9 k^-0.36</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>b</td><td>slip factor</td><td>psi</td></tr>
 * <tr><td>k</td><td>liquid permeability</td><td>mD</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for helium on cores; quoted with an example in Ahmed, Reservoir Engineering
 * Handbook.
 *
 * <p><b>Source</b>: Jones (1972), SPE Journal 12, 383–397; constants from memory.
 *
 * <p><b>Checked</b> in {@code KlinkenbergTest}.
 */
public final class Jones1972 {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("jones-1972", "Jones slip factor")
          .equation("b = 6.9 k^-0.36")
          .input("k", "liquid permeability", Units.mD, Range.POSITIVE)
          .result("b", "slip factor", Units.psi)
          .source("Jones (1972), SPE Journal 12, 383–397")
          .constants(Constants.CHECKED)
          .topics("core", "gas slip", "permeability")
          .note("Published correlations differ by a factor of three at 0.1 mD.")
          .build();

  private static final Formula<Pressure> FORMULA = Formula.of(CARD, Units.psi, Jones1972::psi);

  /** The law for a slip correction. */
  public static final SlipLaw SLIP = new SlipLaw(CARD, Jones1972::psi);

  private Jones1972() {}

  /** Returns the slip factor at a liquid permeability. */
  public static Pressure of(Permeability liquid) {
    return FORMULA.value(liquid);
  }

  /** Returns the slip factor of each row. */
  public static Series of(Operand liquid) {
    return FORMULA.series(liquid);
  }

  private static double psi(double k) {
    return 6.9 * StrictMath.pow(k, -0.36);
  }
}
