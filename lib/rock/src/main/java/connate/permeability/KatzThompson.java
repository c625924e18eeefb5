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
 * Permeability from the threshold of mercury injection and electrical conductivity, after Katz and
 * Thompson.
 *
 * <pre>
 * k = (1/226) l² σ/σ0
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>m²</td></tr>
 * <tr><td>l</td><td>diameter of the throat at threshold</td><td>m</td></tr>
 * <tr><td>σ/σ0</td><td>conductivity of the rock over that of its brine, 1/F</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> where closure and conformance are corrected; they decide the answer.
 *
 * <p><b>Source</b>: Katz and Thompson (1986), Phys. Rev. B 34, 8179–8181; 1/226 from memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class KatzThompson {

  /** The facts on the law of Katz and Thompson. */
  public static final MethodCard CARD =
      MethodCard.named("katz-thompson", "Katz–Thompson")
          .equation("k = (1/226) l² σ/σ0")
          .input("l", "threshold throat diameter", Units.m, Range.POSITIVE)
          .input("σ/σ0", "conductivity ratio", Units.fraction, Range.above(0).to(1))
          .result("k", "permeability", Units.squareMetres)
          .source("Katz and Thompson (1986), Phys. Rev. B 34, 8179–8181")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "capillary pressure", "mercury", "resistivity", "core")
          .note("l is a diameter. 1/226 is of the order of 0.01 and depends weakly on the model.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(CARD, Units.squareMetres, (l, ratio) -> KatzThompson.ofNumber(l, ratio));

  private KatzThompson() {}

  /** Returns the permeability of one sample by the law of Katz and Thompson. */
  public static Permeability of(Length thresholdThroatDiameter, Fraction conductivityRatio) {
    return CARD_FORMULA.value(thresholdThroatDiameter, conductivityRatio);
  }

  /** Returns the permeability of each row by the law of Katz and Thompson. */
  public static Series of(Operand thresholdThroatDiameter, Operand conductivityRatio) {
    return CARD_FORMULA.series(thresholdThroatDiameter, conductivityRatio);
  }

  static double ofNumber(double l, double ratio) {
    return l * l * ratio / 226;
  }
}
