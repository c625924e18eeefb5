package connate.calibration;

import connate.formula.TransformForm;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Units;
import connate.series.Labels;
import connate.series.Series;

/**
 * Permeability that rises exponentially with porosity, the transform of most core reports.
 *
 * <pre>log10 k = a φ + b</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>fraction</td></tr>
 * <tr><td>a, b</td><td>slope and intercept, fitted to core</td><td>decades</td></tr>
 * </table>
 *
 * <p><b>Valid</b> inside the porosities of the core it was fitted to, one rock type at a time.
 *
 * <p><b>Source</b>: common form of core analysis; Wangen (2010), Physical Principles of Sedimentary
 * Basin Analysis, Cambridge University Press, p. 18, with two published pairs of constants.
 *
 * <p><b>Checked</b> in {@code LogLinearTest}.
 */
public final class LogLinear {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("log-linear", "Log-linear transform")
          .equation("log10 k = a φ + b")
          .input("φ", "porosity", Units.fraction, Range.PART)
          .result("k", "permeability", Units.mD)
          .source(
              "common form; Wangen (2010), Physical Principles of Sedimentary Basin Analysis, p. 18")
          .constants(Constants.EXACT)
          .topics("permeability", "transform", "calibration", "core", "regression")
          .note("Fitted to core: valid inside its porosities, one rock type at a time.")
          .note("The fit gives the median; the mean is larger, see expected(…).")
          .build();

  /** The form for a comparison of transforms. */
  public static final TransformForm FORM = new TransformForm(CARD, "φ", phi -> phi, true);

  private LogLinear() {}

  /**
   * Fits the transform to plugs by ordinary least squares of log10 k on φ.
   *
   * @param porosity the porosity of each plug
   * @param permeability the permeability of each plug; zeros are counted and left out
   * @throws IllegalArgumentException if fewer than three plugs have both
   */
  public static TransformFit fit(Series porosity, Series permeability) {
    return TransformFit.of(FORM, porosity, permeability);
  }

  /**
   * Fits the transform to plugs of one laboratory method; refuses to pool air with brine.
   *
   * @throws IllegalArgumentException if the plugs were not all measured alike
   */
  public static TransformFit fit(Series porosity, Series permeability, Labels method) {
    return TransformFit.of(FORM, porosity, permeability, method);
  }
}
