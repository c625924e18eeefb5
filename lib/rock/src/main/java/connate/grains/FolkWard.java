package connate.grains;

import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.quantity.Length;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import java.util.function.ToDoubleFunction;

/**
 * Graphic measures of a grain-size curve after Folk and Ward.
 *
 * <pre>
 * mean      Mz = (φ16 + φ50 + φ84) / 3
 * sorting   σI = (φ84 − φ16) / 4 + (φ95 − φ5) / 6.6
 * skewness  SkI = (φ16 + φ84 − 2 φ50) / (2 (φ84 − φ16)) + (φ5 + φ95 − 2 φ50) / (2 (φ95 − φ5))
 * kurtosis  KG = (φ95 − φ5) / (2.44 (φ75 − φ25))
 * </pre>
 *
 * <p>φp is the phi value than which p % of the weight is <em>coarser</em>. Counting the finer part
 * instead turns the sign of the skewness; {@link GrainCurve#phi} counts as the paper does.
 *
 * <p><b>Valid</b> by weight (sieve, laser), not by number (thin section); φ5 and φ95 must lie
 * inside the analysis.
 *
 * <p><b>Source</b>: Folk and Ward (1957), J. Sedimentary Petrology 27, 3–26. Constants from memory.
 *
 * <p><b>Checked</b> in {@code FolkWardTest}.
 */
public final class FolkWard implements Listed {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("folk-ward", "Folk and Ward, graphic measures")
          .equation(
              "Mz = (φ16 + φ50 + φ84)/3; σI = (φ84 - φ16)/4 + (φ95 - φ5)/6.6; SkI = (φ16 + φ84 -"
                  + " 2φ50)/(2(φ84 - φ16)) + (φ5 + φ95 - 2φ50)/(2(φ95 - φ5)); KG = (φ95 -"
                  + " φ5)/(2.44(φ75 - φ25))")
          .input("φp", "phi value with p % coarser", Units.number)
          .source("Folk and Ward (1957), J. Sedimentary Petrology 27, 3–26")
          .constants(Constants.FROM_MEMORY)
          .topics("grain size", "sorting", "skewness", "kurtosis", "grains")
          .note("φp counts the coarser part; the finer part turns the sign of the skewness.")
          .note("By weight; sizes counted in thin section need a correction for the cut first.")
          .build();

  private static final double[] SORTING_LIMITS = {0.35, 0.50, 0.71, 1, 2, 4};
  private static final String[] SORTING_WORDS = {
    "very well sorted",
    "well sorted",
    "moderately well sorted",
    "moderately sorted",
    "poorly sorted",
    "very poorly sorted",
    "extremely poorly sorted"
  };
  private static final double[] SKEW_LIMITS = {-0.3, -0.1, 0.1, 0.3};
  private static final String[] SKEW_WORDS = {
    "strongly coarse skewed",
    "coarse skewed",
    "near symmetrical",
    "fine skewed",
    "strongly fine skewed"
  };
  private static final double[] KURTOSIS_LIMITS = {0.67, 0.90, 1.11, 1.50, 3};
  private static final String[] KURTOSIS_WORDS = {
    "very platykurtic",
    "platykurtic",
    "mesokurtic",
    "leptokurtic",
    "very leptokurtic",
    "extremely leptokurtic"
  };

  private final double mean;
  private final double sorting;
  private final double skewness;
  private final double kurtosis;

  private FolkWard(double mean, double sorting, double skewness, double kurtosis) {
    this.mean = mean;
    this.sorting = sorting;
    this.skewness = skewness;
    this.kurtosis = kurtosis;
  }

  /**
   * Returns the measures of a curve.
   *
   * @throws IllegalArgumentException if φ5 or φ95 falls into an open-ended class
   */
  public static FolkWard of(GrainCurve curve) {
    return of(
        curve.phi(5),
        curve.phi(16),
        curve.phi(25),
        curve.phi(50),
        curve.phi(75),
        curve.phi(84),
        curve.phi(95));
  }

  /**
   * Returns the measures of seven phi values, each with the named percentage coarser.
   *
   * @throws IllegalArgumentException if they do not rise: counted from the finer side, perhaps
   */
  public static FolkWard of(
      Ratio phi5, Ratio phi16, Ratio phi25, Ratio phi50, Ratio phi75, Ratio phi84, Ratio phi95) {
    Ratio[] all = {phi5, phi16, phi25, phi50, phi75, phi84, phi95};
    for (int i = 1; i < all.length; i++) {
      if (all[i].isBelow(all[i - 1])) {
        throw new IllegalArgumentException(
            "phi values must rise from 5 % to 95 % coarser; found "
                + all[i]
                + " after "
                + all[i - 1]
                + ": counted from the finer side?");
      }
    }
    Listening.used(CARD);
    double p5 = phi5.value();
    double p16 = phi16.value();
    double p50 = phi50.value();
    double p84 = phi84.value();
    double p95 = phi95.value();
    return new FolkWard(
        mean(p16, p50, p84),
        sorting(p5, p16, p84, p95),
        skewness(p5, p16, p50, p84, p95),
        kurtosis(p5, phi25.value(), phi75.value(), p95));
  }

  /** Returns the graphic mean of each curve, in phi. */
  public static Series means(GrainCurves curves) {
    return column(
        curves, "mean size", c -> mean(c.phiCoarser(16), c.phiCoarser(50), c.phiCoarser(84)));
  }

  /** Returns the inclusive graphic standard deviation of each curve, in phi. */
  public static Series sortings(GrainCurves curves) {
    return column(
        curves,
        "sorting",
        c -> sorting(c.phiCoarser(5), c.phiCoarser(16), c.phiCoarser(84), c.phiCoarser(95)));
  }

  /** Returns the inclusive graphic skewness of each curve. */
  public static Series skewnesses(GrainCurves curves) {
    return column(
        curves,
        "skewness",
        c ->
            skewness(
                c.phiCoarser(5),
                c.phiCoarser(16),
                c.phiCoarser(50),
                c.phiCoarser(84),
                c.phiCoarser(95)));
  }

  /** Returns the graphic kurtosis of each curve. */
  public static Series kurtoses(GrainCurves curves) {
    return column(
        curves,
        "kurtosis",
        c -> kurtosis(c.phiCoarser(5), c.phiCoarser(25), c.phiCoarser(75), c.phiCoarser(95)));
  }

  private static Series column(
      GrainCurves curves, String name, ToDoubleFunction<GrainCurve> number) {
    Listening.used(CARD);
    return curves.map(name, Units.number, number);
  }

  static double mean(double p16, double p50, double p84) {
    return (p16 + p50 + p84) / 3;
  }

  static double sorting(double p5, double p16, double p84, double p95) {
    return (p84 - p16) / 4 + (p95 - p5) / 6.6;
  }

  static double skewness(double p5, double p16, double p50, double p84, double p95) {
    return (p16 + p84 - 2 * p50) / (2 * (p84 - p16)) + (p5 + p95 - 2 * p50) / (2 * (p95 - p5));
  }

  static double kurtosis(double p5, double p25, double p75, double p95) {
    return (p95 - p5) / (2.44 * (p75 - p25));
  }

  /** Returns the graphic mean in phi. */
  public Ratio mean() {
    return Units.number(mean);
  }

  /** Returns the size of the graphic mean. */
  public Length meanSize() {
    return Units.mm(PhiScale.mm(mean));
  }

  /** Returns the inclusive graphic standard deviation in phi. */
  public Ratio sorting() {
    return Units.number(sorting);
  }

  /** Returns the inclusive graphic skewness: above 0 with a tail of fines. */
  public Ratio skewness() {
    return Units.number(skewness);
  }

  /** Returns the graphic kurtosis: 1 for a normal curve. */
  public Ratio kurtosis() {
    return Units.number(kurtosis);
  }

  /** Returns the authors' words, such as {@code well sorted, near symmetrical, mesokurtic}. */
  public String words() {
    return word(sorting, SORTING_LIMITS, SORTING_WORDS)
        + ", "
        + word(skewness, SKEW_LIMITS, SKEW_WORDS)
        + ", "
        + word(kurtosis, KURTOSIS_LIMITS, KURTOSIS_WORDS);
  }

  private static String word(double value, double[] limits, String... words) {
    int i = 0;
    while (i < limits.length && value >= limits[i]) {
      i++;
    }
    return words[i];
  }

  @Override
  public Listing listing() {
    return Listing.titled("Folk and Ward measures, in phi: " + words())
        .column("mean")
        .column("sorting")
        .column("skewness")
        .column("kurtosis")
        .row(mean, sorting, skewness, kurtosis)
        .build();
  }

  @Override
  public String toString() {
    return listing().toString();
  }
}
