package connate.cementation;

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
 * Permeability of the Garn sandstones from porosity, a fit to the form of Kozeny and Carman.
 *
 * <pre>
 * ln k[mD] = 10.08803 + 0.71222 ln(φ³ / (1 − φ)²)
 * </pre>
 *
 * <p><b>Valid</b> for cemented sandstones like those of the Garn Formation; 215 plugs, R² 0.8185,
 * s(ln k) 1.261. The exponent is below 1, partly because small porosities are uncertain: do not
 * extrapolate.
 *
 * <p><b>Source</b>: Ehrenberg (1990), AAPG Bulletin 74, 1538–1558, data.
 *
 * <p><b>Checked</b> in {@code GarnTest}.
 */
public final class Garn {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("garn", "Garn sandstone, permeability")
          .equation("ln k = 10.08803 + 0.71222 ln(φ³/(1 - φ)²)")
          .input("φ", "porosity", Units.fraction, Range.above(0).below(1))
          .valid(0.05, 0.3)
          .result("k", "permeability", Units.mD)
          .source("Ehrenberg (1990), AAPG Bulletin 74, 1538–1558, data")
          .constants(Constants.CHECKED)
          .topics("permeability", "cement", "sandstone", "porosity")
          .note("215 plugs, R² 0.8185, scatter a factor of 3.5 (s of ln k 1.261).")
          .build();

  private static final Formula<Permeability> FORMULA =
      Formula.of(CARD, Units.mD, porosity -> milliDarcy(porosity));

  private Garn() {}

  /** Returns the permeability of one value of each input. */
  public static Permeability of(Fraction porosity) {
    return FORMULA.value(porosity);
  }

  /** Returns the permeability of each row. */
  public static Series of(Operand porosity) {
    return FORMULA.series(porosity);
  }

  static double milliDarcy(double porosity) {
    double solid = 1 - porosity;
    double shape = porosity * porosity * porosity / (solid * solid);
    return StrictMath.exp(10.08803 + 0.71222 * StrictMath.log(shape));
  }
}
