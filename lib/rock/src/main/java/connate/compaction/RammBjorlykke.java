package connate.compaction;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity of sandstone with depth and clay after Ramm and Bjørlykke, in the mechanical regime.
 *
 * <pre>
 * φ = A exp(−(α + β CI) z)
 * </pre>
 *
 * <p><b>Valid</b> to some 2.5 to 3 km, where chemical compaction takes over. The coefficients
 * belong to a basin and have no default here.
 *
 * <p><b>Source</b>: Ramm and Bjørlykke (1994), Clay Minerals 29, 475–490.
 *
 * <p><b>Checked</b> in {@code RammBjorlykkeTest}.
 */
public final class RammBjorlykke {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("ramm-bjorlykke", "Ramm and Bjørlykke, sandstone with clay")
          .equation("φ = A exp(-(α + β CI) z)")
          .input("A", "porosity at the surface", Units.fraction, Range.above(0).below(1))
          .input("α", "coefficient per km", Units.number, Range.from(0))
          .input("β", "coefficient of clay per km", Units.number, Range.from(0))
          .input("CI", "clay over framework", Units.number, Range.from(0))
          .input("z", "depth", Units.km, Range.from(0))
          .valid(0, 3)
          .result("φ", "porosity", Units.fraction)
          .source("Ramm and Bjørlykke (1994), Clay Minerals 29, 475–490")
          .constants(Constants.EXACT)
          .topics("compaction", "porosity", "depth", "sand", "clay")
          .note("Fit A, α and β to the basin: there is no default.")
          .build();

  private static final Formula<Fraction> FORMULA =
      Formula.ofAny(CARD, Units.fraction, in -> porosity(in[0], in[1], in[2], in[3], in[4]));

  private RammBjorlykke() {}

  /** Returns the porosity of one value of each input. */
  public static Fraction of(Fraction initial, Ratio alpha, Ratio beta, Ratio clay, Length depth) {
    return FORMULA.value(initial, alpha, beta, clay, depth);
  }

  /** Returns the porosity of each row. */
  public static Series of(
      Operand initial, Operand alpha, Operand beta, Operand clay, Operand depth) {
    return FORMULA.series(initial, alpha, beta, clay, depth);
  }

  static double porosity(double initial, double alpha, double beta, double clay, double depth) {
    return initial * StrictMath.exp(-(alpha + beta * clay) * depth);
  }
}
