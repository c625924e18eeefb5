package connate.deposition;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity of loose sand from its uniformity coefficient after Vuković and Soro.
 *
 * <pre>n = 0.255 (1 + 0.83^Cu)</pre>
 *
 * <p><b>Valid</b> for loose, clean sand and gravel with one mode. Not for clayey or bimodal
 * sediment, nor for buried rock; measured porosities lie up to 0.15 lower.
 *
 * <p><b>Source</b>: Vuković and Soro (1992), Determination of Hydraulic Conductivity of Porous
 * Media from Grain-Size Composition. Constants from memory.
 *
 * <p><b>Checked</b> in {@code VukovicSoroTest}.
 */
public final class VukovicSoro {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("vukovic-soro", "Vuković and Soro, porosity from uniformity")
          .equation("n = 0.255 (1 + 0.83^Cu)")
          .input("Cu", "uniformity coefficient", Units.number, Range.from(1))
          .valid(1, 20)
          .result("n", "porosity", Units.fraction)
          .source(
              "Vuković and Soro (1992), Determination of Hydraulic Conductivity of Porous Media from"
                  + " Grain-Size Composition")
          .constants(Constants.FROM_MEMORY)
          .topics("porosity", "grain size", "sorting", "sand", "hydraulic conductivity")
          .note(
              "Loose, clean, one mode; measured porosities may be 0.15 lower. Not for buried rock.")
          .build();

  private static final Formula<Fraction> FORMULA =
      Formula.of(CARD, Units.fraction, VukovicSoro::porosity);

  private VukovicSoro() {}

  /** Returns the porosity of one sand. */
  public static Fraction of(Ratio uniformity) {
    return FORMULA.value(uniformity);
  }

  /** Returns the porosity of each row. */
  public static Series of(Operand uniformity) {
    return FORMULA.series(uniformity);
  }

  static double porosity(double uniformity) {
    return 0.255 * (1 + StrictMath.pow(0.83, uniformity));
  }
}
