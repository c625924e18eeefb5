package connate.permeability;

import connate.formula.Formula;
import connate.method.Caution;
import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;

/**
 * The pore throat radius at 35 % mercury saturation, after Winland.
 *
 * <pre>log r35 = 0.732 + 0.588 log k − 0.864 log φ</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>r35</td><td>pore throat radius</td><td>µm</td></tr>
 * <tr><td>k</td><td>air permeability, not corrected for slip</td><td>mD</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>%</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for interparticle pores of sandstones and carbonates; not for vuggy rock.
 *
 * <p><b>Source</b>: Kolodzie (1980), SPE 9382; constants from memory.
 *
 * <p><b>Checked</b> in {@code WinlandTest}.
 */
public final class Winland {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("winland", "Winland r35")
          .equation("log r35 = 0.732 + 0.588 log k - 0.864 log φ")
          .input("φ", "porosity", Units.percent, Range.above(0).to(100))
          .input("k", "air permeability", Units.mD, Range.POSITIVE)
          .result("r35", "pore throat radius r35", Units.um)
          .source("Kolodzie (1980), SPE 9382")
          .constants(Constants.FROM_MEMORY)
          .topics("rock type", "pore throat", "permeability", "core")
          .note("Takes air permeability as measured, not corrected for gas slip.")
          .note("Porosity in percent: as a fraction it would give a radius 50 times too large.")
          .build();

  /** Caution: a permeability that was corrected, where the law wants it as measured. */
  static final String CORRECTED = "K01";

  private static final Formula<Length> FORMULA =
      Formula.of(
          CARD,
          Units.um,
          (phi, k) ->
              StrictMath.pow(
                  10, 0.732 + 0.588 * StrictMath.log10(k) - 0.864 * StrictMath.log10(phi)));

  private Winland() {}

  /** Returns the throat radius of one plug. */
  public static Length r35(Fraction porosity, Permeability airPermeability) {
    return FORMULA.value(porosity, airPermeability);
  }

  /** Returns the throat radius of each row. */
  public static Series r35(Operand porosity, Operand airPermeability) {
    if (airPermeability instanceof Series k
        && !k.traits().getOrDefault(Series.FLUID, "air").equals("air")) {
      Listening.caution(
          Caution.of(
              CORRECTED,
              CARD.id(),
              "Winland r35: «"
                  + k.name()
                  + "» is "
                  + k.traits().get(Series.FLUID)
                  + " permeability; the law was made for air permeability as measured"));
    }
    return FORMULA.series(porosity, airPermeability);
  }

  /** Returns the class of a throat radius: nano, micro, meso, macro or mega. */
  public static String grade(Length radius) {
    double um = radius.in(Units.um);
    if (um < 0.1) {
      return "nano";
    }
    if (um < 0.5) {
      return "micro";
    }
    return um < 2 ? "meso" : um < 10 ? "macro" : "mega";
  }
}
