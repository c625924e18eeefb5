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
 * The slip factor of gas as a function of permeability, after Heid.
 *
 * <pre>b = 11.419 k^-0.39</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>b</td><td>slip factor</td><td>psi</td></tr>
 * <tr><td>k</td><td>liquid permeability</td><td>mD</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for dry cores of several fields, air.
 *
 * <p><b>Source</b>: Heid and others (1950), API Drilling and Production Practice, 230–246;
 * constants from memory.
 *
 * <p><b>Checked</b> in {@code KlinkenbergTest}.
 */
public final class Heid {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("heid", "Heid slip factor")
          .equation("b = 11.419 k^-0.39")
          .input("k", "liquid permeability", Units.mD, Range.POSITIVE)
          .result("b", "slip factor", Units.psi)
          .source("Heid and others (1950), API Drilling and Production Practice, 230–246")
          .constants(Constants.FROM_MEMORY)
          .topics("core", "gas slip", "permeability")
          .note("Published correlations differ by a factor of three at 0.1 mD.")
          .build();

  private static final Formula<Pressure> FORMULA = Formula.of(CARD, Units.psi, Heid::psi);

  /** The law for a slip correction. */
  public static final SlipLaw SLIP = new SlipLaw(CARD, Heid::psi);

  private Heid() {}

  /** Returns the slip factor at a liquid permeability. */
  public static Pressure of(Permeability liquid) {
    return FORMULA.value(liquid);
  }

  /** Returns the slip factor of each row. */
  public static Series of(Operand liquid) {
    return FORMULA.series(liquid);
  }

  private static double psi(double k) {
    return 11.419 * StrictMath.pow(k, -0.39);
  }
}
