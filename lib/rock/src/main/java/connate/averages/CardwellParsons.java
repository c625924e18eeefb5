package connate.averages;

import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Estimate;

/**
 * Bounds of the permeability of a block of equal cells with sealed sides, after Cardwell and
 * Parsons.
 *
 * <pre>
 * low   arithmetic mean, over the tubes along the flow, of their harmonic means
 * high  harmonic mean, along the flow, of the arithmetic means of the slices across it
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability of each cell</td><td>mD</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for a block with sealed sides and constant pressure at both ends; each direction
 * has bounds of its own. They are no bounds of an infinite medium.
 *
 * <p><b>Source</b>: Cardwell and Parsons (1945), Trans. AIME 160, 34–42.
 *
 * <p><b>Checked</b> in {@code MoreAveragesTest}.
 */
public final class CardwellParsons {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("cardwell-parsons", "Cardwell–Parsons bounds")
          .equation("mean over tubes of harmonic means ≤ k ≤ harmonic mean of slice means")
          .input("k", "permeability of the cells", Units.mD, Range.POSITIVE)
          .source("Cardwell and Parsons (1945), Trans. AIME 160, 34–42")
          .constants(Constants.EXACT)
          .topics("averages", "bounds", "upscaling", "grid")
          .note("Sealed sides; each direction has bounds of its own.")
          .build();

  private CardwellParsons() {}

  /**
   * Returns the bounds of a block; the value is their geometric mean.
   *
   * @param cellsMd the cells in mD: a row for each tube along the flow
   * @throws IllegalArgumentException if the rows differ in length or a cell is not above zero
   */
  public static Estimate<Permeability> of(double[][] cellsMd) {
    check(cellsMd);
    Listening.used(CARD);
    int length = cellsMd[0].length;
    double low = 0;
    double[] slices = new double[length];
    for (double[] tube : cellsMd) {
      double resistance = 0;
      for (int i = 0; i < length; i++) {
        resistance += 1 / tube[i];
        slices[i] += tube[i] / cellsMd.length;
      }
      low += length / resistance / cellsMd.length;
    }
    double across = 0;
    for (double slice : slices) {
      across += 1 / slice;
    }
    double high = length / across;
    return new Estimate<>(
        Units.mD(StrictMath.sqrt(low * high)),
        Units.mD(low),
        Units.mD(Math.max(low, high)),
        "Cardwell–Parsons bounds");
  }

  private static void check(double[][] cells) {
    if (cells.length == 0 || cells[0].length == 0) {
      throw new IllegalArgumentException("a block needs at least one cell");
    }
    for (double[] tube : cells) {
      if (tube.length != cells[0].length) {
        throw new IllegalArgumentException("the tubes of a block are equally long");
      }
      for (double k : tube) {
        if (!(k > 0)) {
          throw new IllegalArgumentException(
              "a cell has the permeability " + k + "; above 0 is needed");
        }
      }
    }
  }
}
