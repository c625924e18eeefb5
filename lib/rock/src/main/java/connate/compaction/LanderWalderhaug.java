package connate.compaction;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Pressure;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Intergranular volume of sandstone under effective stress after Lander and Walderhaug.
 *
 * <pre>
 * IGV = IGVf + (φ0 + m0 − IGVf) exp(−β σ′)
 * </pre>
 *
 * <p><b>Valid</b> for sandstone with rigid grains with IGVf near 28 % and β near 0.06 per MPa;
 * ductile grains lower IGVf to some 10 %. Irreversible: σ′ is the greatest the rock has felt.
 *
 * <p><b>Source</b>: Lander and Walderhaug (1999), AAPG Bulletin 83, 433–449. Constants from memory.
 *
 * <p><b>Checked</b> in {@code LanderWalderhaugTest}.
 */
public final class LanderWalderhaug {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("lander-walderhaug", "Lander and Walderhaug, intergranular volume")
          .equation("IGV = IGVf + (φ0 + m0 - IGVf) exp(-β σ′)")
          .input(
              "IGV0", "porosity and matrix at the surface", Units.fraction, Range.above(0).below(1))
          .valid(0.3, 0.5)
          .input("IGVf", "volume at high stress", Units.fraction, Range.of(0, 0.48))
          .valid(0.1, 0.3)
          .input("β", "coefficient per MPa", Units.number, Range.from(0))
          .valid(0.02, 0.2)
          .input("σ′", "greatest effective stress", Units.MPa, Range.from(0))
          .valid(0, 60)
          .result("IGV", "intergranular volume", Units.fraction)
          .source("Lander and Walderhaug (1999), AAPG Bulletin 83, 433–449")
          .constants(Constants.FROM_MEMORY)
          .topics("compaction", "sandstone", "stress", "intergranular volume")
          .build();

  /** The stable volume of rigid grains. */
  public static final double RIGID = 0.28;

  /** The usual coefficient per MPa. */
  public static final double USUAL_PER_MPA = 0.06;

  private static final Formula<Fraction> FORMULA =
      Formula.of(
          CARD,
          Units.fraction,
          (initial, stable, perMPa, stress) -> volume(initial, stable, perMPa, stress));

  private LanderWalderhaug() {}

  /** Returns the intergranular volume of one value of each input. */
  public static Fraction of(Fraction initial, Fraction stable, Ratio perMPa, Pressure stress) {
    return FORMULA.value(initial, stable, perMPa, stress);
  }

  /** Returns the intergranular volume of each row. */
  public static Series of(Operand initial, Operand stable, Operand perMPa, Operand stress) {
    return FORMULA.series(initial, stable, perMPa, stress);
  }

  static double volume(double initial, double stable, double perMPa, double stress) {
    if (stable > initial) {
      throw new IllegalArgumentException(
          "the stable intergranular volume "
              + stable
              + " is above the first one, "
              + initial
              + ": sand does not swell");
    }
    return stable + (initial - stable) * StrictMath.exp(-perMPa * stress);
  }
}
