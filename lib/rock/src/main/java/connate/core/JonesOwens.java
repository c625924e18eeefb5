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
 * The slip factor of gas as a function of permeability, after Jones–Owens.
 *
 * <pre>b = 12.639 k^-0.33</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>b</td><td>slip factor</td><td>psi</td></tr>
 * <tr><td>k</td><td>liquid permeability</td><td>mD</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for tight gas sands, 0.0001 to 1 mD, nitrogen or air; used beyond by common
 * practice.
 *
 * <p><b>Source</b>: Jones and Owens (1980), J. Pet. Technol. 32, 1631–1640; constants from memory.
 *
 * <p><b>Checked</b> in {@code KlinkenbergTest}.
 */
public final class JonesOwens {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("jones-owens", "Jones–Owens slip factor")
          .equation("b = 12.639 k^-0.33")
          .input("k", "liquid permeability", Units.mD, Range.POSITIVE)
          .result("b", "slip factor", Units.psi)
          .source("Jones and Owens (1980), J. Pet. Technol. 32, 1631–1640")
          .constants(Constants.FROM_MEMORY)
          .topics("core", "gas slip", "permeability")
          .note("Published correlations differ by a factor of three at 0.1 mD.")
          .build();

  private static final Formula<Pressure> FORMULA = Formula.of(CARD, Units.psi, JonesOwens::psi);

  /** The law for a slip correction. */
  public static final SlipLaw SLIP = new SlipLaw(CARD, JonesOwens::psi);

  private JonesOwens() {}

  /** Returns the slip factor at a liquid permeability. */
  public static Pressure of(Permeability liquid) {
    return FORMULA.value(liquid);
  }

  /** Returns the slip factor of each row. */
  public static Series of(Operand liquid) {
    return FORMULA.series(liquid);
  }

  private static double psi(double k) {
    return 12.639 * StrictMath.pow(k, -0.33);
  }
}
