package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability of Fontainebleau sandstone from porosity, after Bourbié and Zinszner.
 *
 * <pre>
 * k = 0.303 φ^3.05 above 9 %
 * k = 2.75e-5 φ^7.33 up to 9 %
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>%</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for clean quartz-cemented sandstone of one grain size, 2 to 28 %. The two laws
 * differ by some 10 % where they meet.
 *
 * <p><b>Source</b>: Bourbié and Zinszner (1985), J. Geophys. Res. 90, 11524–11532; quoted by Wangen
 * (2010), p. 17; constants from memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class Fontainebleau {

  /** The facts on the laws of Fontainebleau. */
  public static final MethodCard CARD =
      MethodCard.named("fontainebleau", "Fontainebleau")
          .equation("k = 0.303 φ^3.05 above 9 %, 2.75e-5 φ^7.33 up to 9 %")
          .input("φ", "porosity", Units.percent, Range.from(0).to(100))
          .valid(2, 28)
          .result("k", "permeability", Units.mD)
          .source("Bourbié and Zinszner (1985), J. Geophys. Res. 90, 11524–11532")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "porosity", "sandstone")
          .note(
              "Clean quartz sandstone of one grain size; the laws differ by 10 % where they meet.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(CARD, Units.mD, phi -> Fontainebleau.ofNumber(phi));

  private Fontainebleau() {}

  /** Returns the permeability of one sample by the laws of Fontainebleau. */
  public static Permeability of(Fraction porosity) {
    return CARD_FORMULA.value(porosity);
  }

  /** Returns the permeability of each row by the laws of Fontainebleau. */
  public static Series of(Operand porosity) {
    return CARD_FORMULA.series(porosity);
  }

  static double ofNumber(double phi) {
    return phi > 9 ? 0.303 * StrictMath.pow(phi, 3.05) : 2.75e-5 * StrictMath.pow(phi, 7.33);
  }
}
