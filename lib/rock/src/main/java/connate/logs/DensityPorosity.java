package connate.logs;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Density;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity from the bulk density log: a mixture of grains and pore fluid by volume.
 *
 * <pre>φ = (ρ_ma − ρ_b) / (ρ_ma − ρ_f)</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>φ</td><td>total porosity</td><td>1</td></tr>
 * <tr><td>ρ_b</td><td>bulk density</td><td>g/cm³</td></tr>
 * <tr><td>ρ_ma</td><td>density of the grains</td><td>g/cm³</td></tr>
 * <tr><td>ρ_f</td><td>density of the fluid near the hole</td><td>g/cm³</td></tr>
 * </table>
 *
 * <p><b>Valid</b> where the hole is in gauge and grain density is known; gas and washed-out hole
 * read too porous. The result may fall below zero where the rock is denser than assumed.
 *
 * <p><b>Source</b>: volume balance; common practice of log analysis.
 *
 * <p><b>Checked</b> in {@code DensityPorosityTest}.
 */
public final class DensityPorosity {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("density-porosity", "Density porosity")
          .equation("φ = (ρ_ma - ρ_b) / (ρ_ma - ρ_f)")
          .input("ρ_b", "bulk density", Units.gPerCm3, Range.above(0.5).below(6))
          .valid(1.5, 3.1)
          .input("ρ_ma", "matrix density", Units.gPerCm3, Range.above(1.5).below(6))
          .input("ρ_f", "fluid density", Units.gPerCm3, Range.above(0).below(1.5))
          .result("φ", "density porosity", Units.fraction)
          .source("volume balance of grains and fluid; common practice")
          .constants(Constants.EXACT)
          .topics("porosity", "logs", "density")
          .note("Total porosity. Gas and washed-out hole read too porous.")
          .build();

  private static final Formula<Fraction> FORMULA =
      Formula.of(CARD, Units.fraction, (bulk, matrix, fluid) -> (matrix - bulk) / (matrix - fluid));

  private DensityPorosity() {}

  /** Returns the porosity at one bulk density. */
  public static Fraction of(Density bulk, Density matrix, Density fluid) {
    return FORMULA.value(bulk, matrix, fluid);
  }

  /** Returns the porosity of each row. */
  public static Series of(Operand bulk, Operand matrix, Operand fluid) {
    return FORMULA.series(bulk, matrix, fluid);
  }
}
