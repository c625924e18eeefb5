package connate.cementation;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability of rock that cement fills in patches: a mean of cemented and open rock, never a law
 * at the mean porosity.
 *
 * <pre>
 * k^ω = (1 − f) k_open^ω + f k_cemented^ω,  ω = 0: ln k = (1 − f) ln k_open + f ln k_cemented
 * </pre>
 *
 * <p><b>Valid</b> for patches small against the block. ω is 1 for patches in layers along the flow,
 * −1 for layers across it; 0, the default, for a random mixture in two dimensions.
 *
 * <p><b>Source</b>: power averaging after Korvin (1981), Geoexploration 19, 267–276; the bounds
 * after Wiener (1912).
 *
 * <p><b>Checked</b> in {@code PatchyCementTest}.
 */
public final class PatchyCement {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("patchy-cement", "Patchy cement, permeability")
          .equation("k^ω = (1 - f) k1^ω + f k2^ω")
          .input("f", "share of the rock cemented", Units.fraction, Range.PART)
          .input("k1", "permeability of open rock", Units.mD, Range.POSITIVE)
          .input("k2", "permeability of cemented rock", Units.mD, Range.POSITIVE)
          .input("ω", "exponent", Units.number, Range.of(-1, 1))
          .result("k", "permeability", Units.mD)
          .source(
              "power averaging after Korvin (1981), Geoexploration 19, 267–276; the bounds after Wiener (1912)")
          .constants(Constants.EXACT)
          .topics("permeability", "cement", "calcite", "averages")
          .note("Calcite, dolomite and anhydrite fill in patches: take the observed share.")
          .build();

  private static final double TINY = 1e-9;

  private static final Formula<Permeability> FORMULA =
      Formula.of(
          CARD,
          Units.mD,
          (share, open, cemented, exponent) -> milliDarcy(share, open, cemented, exponent));

  private PatchyCement() {}

  /** Returns the permeability of one value of each input. */
  public static Permeability of(
      Fraction share, Permeability open, Permeability cemented, Ratio exponent) {
    return FORMULA.value(share, open, cemented, exponent);
  }

  /** Returns the permeability of each row. */
  public static Series of(Operand share, Operand open, Operand cemented, Operand exponent) {
    return FORMULA.series(share, open, cemented, exponent);
  }

  /** Returns the permeability of a random mixture. */
  public static Permeability of(Fraction share, Permeability open, Permeability cemented) {
    return of(share, open, cemented, Units.number(0));
  }

  /** Returns the permeability of each row of random mixtures. */
  public static Series of(Operand share, Operand open, Operand cemented) {
    return of(share, open, cemented, Units.number(0));
  }

  static double milliDarcy(double share, double open, double cemented, double exponent) {
    if (StrictMath.abs(exponent) < TINY) {
      return StrictMath.exp((1 - share) * StrictMath.log(open) + share * StrictMath.log(cemented));
    }
    double mean =
        (1 - share) * StrictMath.pow(open, exponent) + share * StrictMath.pow(cemented, exponent);
    return StrictMath.pow(mean, 1 / exponent);
  }
}
