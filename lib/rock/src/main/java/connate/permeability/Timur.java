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
 * Permeability of sandstone from porosity and irreducible water.
 *
 * <pre>k = 0.136 φ^4.4 / S²</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>%</td></tr>
 * <tr><td>S</td><td>irreducible water saturation</td><td>%</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for clastic rock above the transition zone, where water is irreducible; 155 plugs
 * of three fields. Not for carbonates.
 *
 * <p><b>Source</b>: Timur (1968), The Log Analyst 9(4), 8–17; equation and example in Tiab and
 * Donaldson (2004), Petrophysics, 2nd ed., eq. 3.64, p. 133. One text prints another factor.
 *
 * <p><b>Checked</b> in {@code TimurTest}.
 */
public final class Timur {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("timur", "Timur")
          .equation("k = 0.136 φ^4.4 / S²")
          .input("φ", "porosity", Units.percent, Range.from(0).to(100))
          .valid(2, 40)
          .input("S", "irreducible water saturation", Units.percent, Range.above(0).to(100))
          .valid(5, 95)
          .result("k", "permeability", Units.mD)
          .source("Timur (1968), The Log Analyst 9(4), 8–17")
          .constants(Constants.CHECKED)
          .topics("permeability", "porosity", "saturation", "logs", "sandstone")
          .note("Clastic rock above the transition zone: the water must be irreducible.")
          .note("Range of the inputs from memory of the trade, no source.")
          .build();

  private static final Formula<Permeability> FORMULA =
      Formula.of(CARD, Units.mD, (phi, s) -> 0.136 * StrictMath.pow(phi, 4.4) / (s * s));

  private Timur() {}

  /** Returns the permeability of one sample. */
  public static Permeability of(Fraction porosity, Fraction irreducibleWater) {
    return FORMULA.value(porosity, irreducibleWater);
  }

  /** Returns the permeability of each row. */
  public static Series of(Operand porosity, Operand irreducibleWater) {
    return FORMULA.series(porosity, irreducibleWater);
  }
}
