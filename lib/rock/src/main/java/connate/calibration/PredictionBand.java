package connate.calibration;

import connate.quantity.Numbers;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Band;

/**
 * The range in which a new plug lies with a given chance, around a fitted transform.
 *
 * <pre>log10 k ± t s √(1 + xᵀ (XᵀX)⁻¹ x)</pre>
 */
public final class PredictionBand implements Band {

  private final TransformFit fit;
  private final double level;

  PredictionBand(TransformFit fit, double level) {
    if (!(level > 0 && level < 1)) {
      throw new IllegalArgumentException(
          "a level is between 0 and 1, such as 0.80; found " + level);
    }
    this.fit = fit;
    this.level = level;
  }

  @Override
  public double low(double x) {
    return fit.y(x) / StrictMath.pow(10, fit.halfWidth(level, x));
  }

  @Override
  public double high(double x) {
    return fit.y(x) * StrictMath.pow(10, fit.halfWidth(level, x));
  }

  @Override
  public Unit<?> xUnit() {
    return Units.fraction;
  }

  @Override
  public Unit<?> yUnit() {
    return Units.mD;
  }

  @Override
  public String label() {
    return Numbers.text(100 * level) + " % of new plugs";
  }
}
