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
 * Permeability of carbonate from interparticle porosity and rock-fabric number, after Jennings and
 * Lucia.
 *
 * <pre>
 * log10 k = (9.7982 − 12.0838 log10 r) + (8.6711 − 8.2965 log10 r) log10 φ
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>r</td><td>rock-fabric number, 0.5 to 4; class bounds 0.5, 1.5, 2.5, 4</td><td>1</td></tr>
 * <tr><td>φ</td><td>interparticle porosity</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for non-touching-vug carbonates. One online text prints 27.56 where 9.7982 ln 10
 * is 22.56.
 *
 * <p><b>Source</b>: Jennings and Lucia (2003), SPE Reservoir Evaluation and Engineering 6, 215–225;
 * constants from memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class JenningsLucia {

  /** The facts on the law of Jennings and Lucia. */
  public static final MethodCard CARD =
      MethodCard.named("jennings-lucia", "Jennings–Lucia")
          .equation("log10 k = (9.7982 - 12.0838 log10 r) + (8.6711 - 8.2965 log10 r) log10 φ")
          .input("φ", "interparticle porosity", Units.fraction, Range.above(0).to(1))
          .valid(0.02, 0.4)
          .input("r", "rock-fabric number", Units.number, Range.POSITIVE)
          .valid(0.5, 4)
          .result("k", "permeability", Units.mD)
          .source("Jennings and Lucia (2003), SPE Reservoir Evaluation and Engineering 6, 215–225")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "porosity", "carbonate", "rock type")
          .note("Interparticle porosity only: separate vugs excluded.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(CARD, Units.mD, (phi, r) -> JenningsLucia.ofNumber(phi, r));

  private JenningsLucia() {}

  /** Returns the permeability of one sample by the law of Jennings and Lucia. */
  public static Permeability of(Fraction interparticlePorosity, double rockFabricNumber) {
    return CARD_FORMULA.value(interparticlePorosity, Units.number(rockFabricNumber));
  }

  /** Returns the permeability of each row by the law of Jennings and Lucia. */
  public static Series of(Operand interparticlePorosity, Operand rockFabricNumber) {
    return CARD_FORMULA.series(interparticlePorosity, rockFabricNumber);
  }

  static double ofNumber(double phi, double r) {
    double lr = StrictMath.log10(r);
    return StrictMath.pow(
        10, 9.7982 - 12.0838 * lr + (8.6711 - 8.2965 * lr) * StrictMath.log10(phi));
  }
}
