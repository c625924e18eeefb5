package connate.permeability;

import connate.formula.Formula;
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
import java.util.Map;
import java.util.TreeMap;

/**
 * Pore throat radii at given mercury saturations, after Pittman.
 *
 * <pre>log10 r = A + B log10 k − C log10 φ</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>r</td><td>pore throat radius at 10, 15 … 75 % mercury</td><td>µm</td></tr>
 * <tr><td>k</td><td>air permeability, not corrected for slip</td><td>mD</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>%</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for sandstones of 0.05 to 998 mD and 3.3 to 28 %; 202 samples of 14 formations.
 * It gives a smaller r35 than Winland for the same plug; both are right for their own samples.
 *
 * <p><b>Source</b>: Pittman (1992), AAPG Bulletin 76, 191–198; coefficients from memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class Pittman {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("pittman", "Pittman throat radii")
          .equation("log10 r = A + B log10 k - C log10 φ, a row of A, B, C for each saturation")
          .input("φ", "porosity", Units.percent, Range.above(0).to(100))
          .valid(3.3, 28)
          .input("k", "air permeability", Units.mD, Range.POSITIVE)
          .valid(0.05, 998)
          .result("r", "pore throat radius", Units.um)
          .source("Pittman (1992), AAPG Bulletin 76, 191–198")
          .constants(Constants.FROM_MEMORY)
          .topics("rock type", "pore throat", "permeability", "mercury", "core")
          .note("Takes air permeability as measured, not corrected for gas slip.")
          .note("Gives a smaller r35 than Winland for the same plug.")
          .build();

  private static final Map<Integer, double[]> ROWS = rows();

  private Pittman() {}

  private static Map<Integer, double[]> rows() {
    double[][] table = {
      {10, .459, .500, .385}, {15, .333, .509, .344}, {20, .218, .519, .303},
      {25, .204, .531, .350}, {30, .215, .547, .420}, {35, .255, .565, .523},
      {40, .360, .582, .680}, {45, .609, .608, .974}, {50, .778, .626, 1.205},
      {55, .948, .632, 1.426}, {60, 1.096, .648, 1.666}, {65, 1.372, .643, 1.979},
      {70, 1.664, .627, 2.314}, {75, 1.880, .609, 2.626}
    };
    Map<Integer, double[]> rows = new TreeMap<>();
    for (double[] row : table) {
      rows.put((int) row[0], new double[] {row[1], row[2], row[3]});
    }
    return rows;
  }

  /** Returns the throat radius of one plug at a mercury saturation of 10, 15 … 75 %. */
  public static Length radius(int mercuryPercent, Fraction porosity, Permeability airPermeability) {
    return formula(mercuryPercent).value(porosity, airPermeability);
  }

  /** Returns the throat radius of each row at a mercury saturation of 10, 15 … 75 %. */
  public static Series radius(int mercuryPercent, Operand porosity, Operand airPermeability) {
    return formula(mercuryPercent).series(porosity, airPermeability).named("r" + mercuryPercent);
  }

  private static Formula<Length> formula(int mercuryPercent) {
    double[] row = ROWS.get(mercuryPercent);
    if (row == null) {
      throw new IllegalArgumentException(
          "Pittman gives radii at " + ROWS.keySet() + " % mercury, not at " + mercuryPercent);
    }
    Listening.used(CARD);
    return Formula.of(
        CARD,
        Units.um,
        (phi, k) ->
            StrictMath.pow(
                10, row[0] + row[1] * StrictMath.log10(k) - row[2] * StrictMath.log10(phi)));
  }
}
