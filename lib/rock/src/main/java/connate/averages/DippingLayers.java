package connate.averages;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Angle;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability of layers at an angle to the flow, by rotation of the tensor.
 *
 * <pre>
 * k_xx = ka cos²θ + kh sin²θ
 * k_zz = ka sin²θ + kh cos²θ
 * sealed tube  1/k = cos²θ/ka + sin²θ/kh
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>ka, kh</td><td>arithmetic and harmonic mean of the layers</td><td>mD</td></tr>
 * <tr><td>θ</td><td>dip against the flow</td><td>°</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for layers much thinner than the block. With the gradient fixed k_xx holds, in a
 * long sealed tube the last.
 *
 * <p><b>Source</b>: rotation of a tensor; Bear (1972), Dynamics of Fluids in Porous Media.
 *
 * <p><b>Checked</b> in {@code AveragesTest}.
 */
public final class DippingLayers {

  /** The facts on the rotated tensor. */
  public static final MethodCard ALONG =
      MethodCard.named("dipping-layers", "Layers at an angle, gradient fixed")
          .equation("k_xx = ka cos²θ + kh sin²θ")
          .input("ka", "arithmetic mean", Units.mD, Range.POSITIVE)
          .input("kh", "harmonic mean", Units.mD, Range.POSITIVE)
          .input("θ", "dip", Units.degrees, Range.from(0))
          .result("k", "effective permeability", Units.mD)
          .source("Bear (1972), Dynamics of Fluids in Porous Media")
          .constants(Constants.EXACT)
          .topics("averages", "upscaling", "anisotropy", "dip")
          .note("A solver with two-point fluxes drops the mixed term.")
          .build();

  /** The facts on the sealed tube. */
  public static final MethodCard TUBE =
      MethodCard.named("dipping-layers-tube", "Layers at an angle, flux fixed")
          .equation("1/k = cos²θ/ka + sin²θ/kh")
          .input("ka", "arithmetic mean", Units.mD, Range.POSITIVE)
          .input("kh", "harmonic mean", Units.mD, Range.POSITIVE)
          .input("θ", "dip", Units.degrees, Range.from(0))
          .result("k", "effective permeability", Units.mD)
          .source("Bear (1972), Dynamics of Fluids in Porous Media")
          .constants(Constants.EXACT)
          .topics("averages", "upscaling", "anisotropy", "dip")
          .note("A long sealed tube.")
          .build();

  private static final Formula<Permeability> ALONG_FORMULA =
      Formula.of(ALONG, Units.mD, (ka, kh, dip) -> DippingLayers.alongNumber(ka, kh, dip));

  private static final Formula<Permeability> TUBE_FORMULA =
      Formula.of(TUBE, Units.mD, (ka, kh, dip) -> DippingLayers.inTubeNumber(ka, kh, dip));

  private DippingLayers() {}

  /** Returns the effective permeability of one sample by the rotated tensor. */
  public static Permeability along(
      Permeability arithmeticMean, Permeability harmonicMean, Angle dip) {
    return ALONG_FORMULA.value(arithmeticMean, harmonicMean, dip);
  }

  /** Returns the effective permeability of each row by the rotated tensor. */
  public static Series along(Operand arithmeticMean, Operand harmonicMean, Operand dip) {
    return ALONG_FORMULA.series(arithmeticMean, harmonicMean, dip);
  }

  static double alongNumber(double ka, double kh, double dip) {
    double c = StrictMath.cos(StrictMath.toRadians(dip));
    return ka * c * c + kh * (1 - c * c);
  }

  /** Returns the effective permeability of one sample by the sealed tube. */
  public static Permeability inTube(
      Permeability arithmeticMean, Permeability harmonicMean, Angle dip) {
    return TUBE_FORMULA.value(arithmeticMean, harmonicMean, dip);
  }

  /** Returns the effective permeability of each row by the sealed tube. */
  public static Series inTube(Operand arithmeticMean, Operand harmonicMean, Operand dip) {
    return TUBE_FORMULA.series(arithmeticMean, harmonicMean, dip);
  }

  static double inTubeNumber(double ka, double kh, double dip) {
    double c = StrictMath.cos(StrictMath.toRadians(dip));
    return 1 / (c * c / ka + (1 - c * c) / kh);
  }
}
