package connate.grains;

import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Length;
import connate.quantity.Units;
import connate.series.Series;

/**
 * The effective diameter of a grain-size analysis: the size of equal grains with the same surface
 * for their volume, a harmonic mean by weight. The laws differ in the mean of a class.
 *
 * <pre>
 * 1/de = Σ w / d_class
 * Krüger   d_class = (d1 + d2) / 2
 * Zunker   1/d_class = (d2 − d1) / (d1 d2 ln(d2/d1))   weight even over ln d
 * Zamarin  1/d_class = ln(d2/d1) / (d2 − d1)           weight even over d
 * </pre>
 *
 * <p>For Zunker and Zamarin a finest class that begins at 0 counts with 1/d_class = 1.5/d2.
 *
 * <p><b>Source</b>: Krüger (1919), Internationale Mitteilungen für Bodenkunde 8, 105; Zunker
 * (1930), in Blanck, Handbuch der Bodenlehre 6; Zamarin (1928), as told by Vuković and Soro (1992),
 * Determination of Hydraulic Conductivity of Porous Media from Grain-Size Composition. From memory.
 *
 * <p><b>Checked</b> in {@code EffectiveDiameterTest}.
 */
public final class EffectiveDiameter {

  /** The facts on Krüger's mean. */
  public static final MethodCard KRUGER =
      card(
          "effective-diameter-kruger",
          "Effective diameter, Krüger",
          "1/de = Σ 2w/(d1 + d2)",
          "Krüger (1919), Internationale Mitteilungen für Bodenkunde 8, 105");

  /** The facts on Zunker's mean. */
  public static final MethodCard ZUNKER =
      card(
          "effective-diameter-zunker",
          "Effective diameter, Zunker",
          "1/de = 1.5 w₁/d₁ + Σ w (d2 - d1)/(d1 d2 ln(d2/d1))",
          "Zunker (1930), in Blanck, Handbuch der Bodenlehre 6");

  /** The facts on Zamarin's mean. */
  public static final MethodCard ZAMARIN =
      card(
          "effective-diameter-zamarin",
          "Effective diameter, Zamarin",
          "1/de = 1.5 w₁/d₁ + Σ w ln(d2/d1)/(d2 - d1)",
          "Zamarin (1928), as told by Vuković and Soro (1992)");

  private static final double FINEST = 1.5;

  private EffectiveDiameter() {}

  private static MethodCard card(String id, String title, String equation, String source) {
    return MethodCard.named(id, title)
        .equation(equation)
        .input("d1, d2", "limits of a class", Units.mm, Range.from(0))
        .result("de", "effective diameter", Units.mm)
        .source(source)
        .constants(Constants.FROM_MEMORY)
        .topics("grain size", "hydraulic conductivity", "grains")
        .note("A harmonic mean: fines weigh most, so the width of the finest class matters.")
        .build();
  }

  /** The weighted sum of 1/d over a class. */
  private interface Inverse {
    double of(double lowMm, double highMm);
  }

  /**
   * Returns Krüger's mean.
   *
   * @throws IllegalArgumentException if the open coarse class holds weight
   */
  public static Length kruger(GrainCurve curve) {
    return one(KRUGER, curve, krugerMm(curve));
  }

  /** Returns Krüger's mean of each curve. */
  public static Series kruger(GrainCurves curves) {
    return all(KRUGER, curves, EffectiveDiameter::krugerMm);
  }

  /** Returns Zunker's mean. */
  public static Length zunker(GrainCurve curve) {
    return one(ZUNKER, curve, zunkerMm(curve));
  }

  /** Returns Zunker's mean of each curve. */
  public static Series zunker(GrainCurves curves) {
    return all(ZUNKER, curves, EffectiveDiameter::zunkerMm);
  }

  /** Returns Zamarin's mean. */
  public static Length zamarin(GrainCurve curve) {
    return one(ZAMARIN, curve, zamarinMm(curve));
  }

  /** Returns Zamarin's mean of each curve. */
  public static Series zamarin(GrainCurves curves) {
    return all(ZAMARIN, curves, EffectiveDiameter::zamarinMm);
  }

  static double krugerMm(GrainCurve curve) {
    return harmonic(curve, (a, b) -> 2 / (a + b));
  }

  static double zunkerMm(GrainCurve curve) {
    return harmonic(
        curve, (a, b) -> a == 0 ? FINEST / b : (b - a) / (a * b * StrictMath.log(b / a)));
  }

  static double zamarinMm(GrainCurve curve) {
    return harmonic(curve, (a, b) -> a == 0 ? FINEST / b : StrictMath.log(b / a) / (b - a));
  }

  private static double harmonic(GrainCurve curve, Inverse inverse) {
    double sum = 0;
    for (int i = 0; i < curve.classes(); i++) {
      double weight = curve.percent(i) / 100;
      if (weight > 0) {
        double high = curve.highMm(i);
        sum += Double.isInfinite(high) ? Double.NaN : weight * inverse.of(curve.lowMm(i), high);
      }
    }
    return 1 / sum;
  }

  private static Length one(MethodCard card, GrainCurve curve, double mm) {
    Listening.used(card);
    if (Double.isNaN(mm)) {
      throw new IllegalArgumentException(curve.openEnd());
    }
    return Units.mm(mm);
  }

  private static Series all(
      MethodCard card,
      GrainCurves curves,
      java.util.function.ToDoubleFunction<GrainCurve> diameter) {
    Listening.used(card);
    return curves.map("effective diameter", Units.mm, diameter);
  }
}
