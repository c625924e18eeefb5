package connate.calibration;

import connate.formula.TransformForm;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability as a power of porosity, fitted to core.
 *
 * <pre>log10 k = a log10 φ + b</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>fraction</td></tr>
 * <tr><td>a</td><td>exponent, fitted to core</td><td>1</td></tr>
 * <tr><td>b</td><td>log10 of the permeability at φ = 1, fitted</td><td>decades</td></tr>
 * </table>
 *
 * <p><b>Valid</b> inside the porosities of the core it was fitted to, one rock type at a time.
 *
 * <p><b>Source</b>: Bourbié and Zinszner (1985), J. Geophys. Res. 90, 11524–11532, fit two such
 * laws to Fontainebleau sandstone.
 *
 * <p><b>Checked</b> in {@code PowerLawTest}.
 */
public final class PowerLaw {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("power-law", "Power-law transform")
          .equation("log10 k = a log10 φ + b")
          .input("φ", "porosity", Units.fraction, Range.above(0).to(1))
          .result("k", "permeability", Units.mD)
          .source("form as in Bourbié and Zinszner (1985), J. Geophys. Res. 90, 11524–11532")
          .constants(Constants.EXACT)
          .topics("permeability", "transform", "calibration", "core", "regression")
          .note("Fitted to core: valid inside its porosities, one rock type at a time.")
          .build();

  /** The form for a comparison of transforms. */
  public static final TransformForm FORM =
      new TransformForm(CARD, "log10 φ", StrictMath::log10, true);

  private PowerLaw() {}

  /**
   * Fits the transform to plugs by ordinary least squares of log10 k on log10 φ.
   *
   * @throws IllegalArgumentException if fewer than three plugs have both
   */
  public static TransformFit fit(Series porosity, Series permeability) {
    return TransformFit.of(FORM, porosity, permeability);
  }
}
