package connate.averages;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability of a block of two by two cells, after King.
 *
 * <pre>
 * k = 4 (k1 + k3)(k2 + k4) A / (A (k1 + k2 + k3 + k4) + 3 (k1 + k2)(k3 + k4)(k1 + k3)(k2 + k4))
 * A = k2 k4 (k1 + k3) + k1 k3 (k2 + k4)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k1 … k4</td><td>cells: k1 k2 in the upper row, k3 k4 in the lower, flow from left to right</td><td>mD</td></tr>
 * </table>
 *
 * <p><b>Valid</b> repeated over a grid it errs low where contrasts are high: the block has sealed
 * sides.
 *
 * <p><b>Source</b>: King (1989), Transp. Porous Media 4, 37–58.
 *
 * <p><b>Checked</b> in {@code AveragesTest}.
 */
public final class Renormalisation {

  /** The facts on the block of King. */
  public static final MethodCard CARD =
      MethodCard.named("renormalisation", "Renormalisation")
          .equation(
              "k = 4 (k1 + k3)(k2 + k4) A / (A Σk + 3 (k1 + k2)(k3 + k4)(k1 + k3)(k2 + k4)), A = k2 k4 (k1 + k3) + k1 k3 (k2 + k4)")
          .input("k1", "upper left", Units.mD, Range.POSITIVE)
          .input("k2", "upper right", Units.mD, Range.POSITIVE)
          .input("k3", "lower left", Units.mD, Range.POSITIVE)
          .input("k4", "lower right", Units.mD, Range.POSITIVE)
          .result("k", "effective permeability", Units.mD)
          .source("King (1989), Transp. Porous Media 4, 37–58")
          .constants(Constants.EXACT)
          .topics("averages", "upscaling", "grid")
          .note("Sealed sides; errs low at high contrast.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(CARD, Units.mD, (k1, k2, k3, k4) -> Renormalisation.ofNumber(k1, k2, k3, k4));

  private Renormalisation() {}

  /** Returns the effective permeability of one sample by the block of King. */
  public static Permeability of(
      Permeability upperLeft,
      Permeability upperRight,
      Permeability lowerLeft,
      Permeability lowerRight) {
    return CARD_FORMULA.value(upperLeft, upperRight, lowerLeft, lowerRight);
  }

  /** Returns the effective permeability of each row by the block of King. */
  public static Series of(
      Operand upperLeft, Operand upperRight, Operand lowerLeft, Operand lowerRight) {
    return CARD_FORMULA.series(upperLeft, upperRight, lowerLeft, lowerRight);
  }

  static double ofNumber(double k1, double k2, double k3, double k4) {
    double a = k2 * k4 * (k1 + k3) + k1 * k3 * (k2 + k4);
    double columns = (k1 + k3) * (k2 + k4);
    double rows = (k1 + k2) * (k3 + k4);
    return 4 * columns * a / (a * (k1 + k2 + k3 + k4) + 3 * rows * columns);
  }
}
