package connate.calibration;

import connate.formula.Formula;
import connate.formula.TransformForm;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.quantity.Fraction;
import connate.quantity.Numbers;
import connate.quantity.Permeability;
import connate.quantity.Ratio;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Curve;
import connate.series.Estimate;
import connate.series.Labels;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;

/**
 * A permeability transform that was fitted to plugs: log10 k = a + b g(φ), with what it misses.
 *
 * <p>The line through logarithms gives the median of k at a porosity. The mean is larger; where the
 * residuals are normal with standard deviation s (in decades) it is
 *
 * <pre>E[k] = median · exp((ln 10 · s)² / 2)</pre>
 *
 * <p>Duan's smearing factor, the mean of 10^e over the residuals e, needs no normality: Duan
 * (1983), J. Am. Stat. Assoc. 78, 605–610.
 */
public final class TransformFit implements Curve, Listed {

  private final TransformForm form;
  private final Plugs plugs;
  private final LogLine line;
  private final Formula<Permeability> median;
  private final Formula<Permeability> mean;

  private TransformFit(TransformForm form, Plugs plugs) {
    this.form = form;
    this.plugs = plugs;
    this.line = LogLine.of(form, plugs);
    MethodCard card = calibrated();
    double factor = meanFactor();
    this.median = Formula.of(card, Units.mD, this::medianMd);
    this.mean = Formula.of(card, Units.mD, phi -> factor * medianMd(phi));
  }

  /**
   * Fits a form to plugs by ordinary least squares of log10 k.
   *
   * @throws IllegalArgumentException if fewer than three plugs have both, or the two columns stand
   *     under different stress
   */
  public static TransformFit of(TransformForm form, Series porosity, Series permeability) {
    Plugs plugs = Plugs.of(porosity, permeability, form.function());
    Listening.used(form.card());
    plugs.tellDropped(form.card().id());
    Replicates.warn(permeability);
    return new TransformFit(form, plugs);
  }

  /**
   * Fits a form to plugs of one laboratory method.
   *
   * @param method how each plug was measured, such as air, brine, ambient, in situ
   * @throws IllegalArgumentException if the plugs were not all measured alike: air and brine, or
   *     ambient and in-situ values, make no common fit
   */
  public static TransformFit of(
      TransformForm form, Series porosity, Series permeability, Labels method) {
    if (method.distinct().size() > 1) {
      throw new IllegalArgumentException(
          "«"
              + method.name()
              + "» mixes "
              + String.join(", ", method.distinct())
              + ": plugs that were measured differently make no common fit; take"
              + " table.where(\""
              + method.name()
              + "\", \""
              + method.distinct().get(0)
              + "\")");
    }
    return of(form, porosity, permeability);
  }

  /** Returns the slope b, in decades of permeability per unit of the regressor. */
  public double slope() {
    return line.slope();
  }

  /** Returns the intercept a, log10 of k in mD. */
  public double intercept() {
    return line.intercept();
  }

  /** Returns the standard error of the slope, 0 where the form fixes it. */
  public double slopeError() {
    return line.slopeError();
  }

  /** Returns the standard error of the intercept. */
  public double interceptError() {
    return line.interceptError();
  }

  /** Returns the residual standard deviation in decades of permeability. */
  public Ratio scatter() {
    return Units.decades(line.scatter());
  }

  /** Returns the coefficient of determination of log10 k. */
  public double rSquared() {
    return line.rSquared();
  }

  /** Returns the number of plugs in the fit. */
  public int n() {
    return plugs.size();
  }

  /** Returns the form that was fitted. */
  public TransformForm form() {
    return form;
  }

  /** Returns the root mean square of the errors when each plug in turn is left out of the fit. */
  public Ratio leaveOneOut() {
    return Units.decades(line.leaveOneOut());
  }

  /** Returns the root mean square of the errors when each group in turn is left out of the fit. */
  public Ratio leaveOut(Labels groups) {
    return Units.decades(LeaveOut.of(groups).error(form, plugs));
  }

  /** Returns exp((ln 10 · s)²/2), by which the mean is larger than the median. */
  public double meanFactor() {
    double sigma = StrictMath.log(10) * line.scatter();
    return StrictMath.exp(sigma * sigma / 2);
  }

  /** Returns Duan's smearing factor, the mean of 10^e over the residuals e. */
  public double smearingFactor() {
    double sum = 0;
    for (double e : line.residuals()) {
      sum += StrictMath.pow(10, e);
    }
    return sum / plugs.size();
  }

  /** Returns the median permeability at a porosity. */
  public Permeability median(Fraction porosity) {
    return median.value(porosity);
  }

  /** Returns the median permeability of each row. */
  public Series median(Series porosity) {
    return median.series(porosity);
  }

  /** Returns the mean permeability at a porosity, with the lognormal correction. */
  public Permeability expected(Fraction porosity) {
    return mean.value(porosity);
  }

  /** Returns the mean permeability of each row, with the lognormal correction. */
  public Series expected(Series porosity) {
    return mean.series(porosity);
  }

  /** Returns the range in which a new plug lies with the given chance, for a crossplot. */
  public PredictionBand prediction(double level) {
    return new PredictionBand(this, level);
  }

  /** Returns median and range of a new plug at a porosity. */
  public Estimate<Permeability> predict(Fraction porosity, double level) {
    PredictionBand band = prediction(level);
    double phi = porosity.fraction();
    return new Estimate<>(
        median(porosity),
        Permeability.of(band.low(phi), Units.mD),
        Permeability.of(band.high(phi), Units.mD),
        Numbers.text(100 * level) + " %");
  }

  /** Returns log10 of measured over fitted permeability for each row of the input, in decades. */
  public Series residuals() {
    double[] all = new double[plugs.total()];
    java.util.Arrays.fill(all, Double.NaN);
    double[] e = line.residuals();
    for (int i = 0; i < e.length; i++) {
      all[plugs.row(i)] = e[i];
    }
    return Series.of("residual of " + form.name(), Units.decades, all);
  }

  @Override
  public double y(double x) {
    return medianMd(x);
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
    return equation();
  }

  /** Returns the fitted equation, such as {@code log10 k = 16.9 φ - 2.31}. */
  public String equation() {
    String g = form.slopeFree() ? Numbers.text(slope()) + " " : "";
    String sign = intercept() < 0 ? " - " : " + ";
    return "log10 k = " + g + form.regressor() + sign + Numbers.text(Math.abs(intercept()));
  }

  @Override
  public Listing listing() {
    return Listing.titled(form.name())
        .column("")
        .column("value")
        .column("standard error")
        .row("slope", slope(), slopeError())
        .row("intercept (log10 mD)", intercept(), interceptError())
        .note(equation() + "   k in mD, φ as fraction; " + plugs.count())
        .note(scatterLine())
        .note("R² " + Numbers.text(rSquared()) + "; mean over median " + factors())
        .build();
  }

  @Override
  public String toString() {
    return equation() + "   k in mD, φ as fraction; " + plugs.count() + "\n" + scatterLine();
  }

  private String scatterLine() {
    return "scatter "
        + Numbers.text(line.scatter())
        + " decades (÷ and × "
        + Numbers.text(StrictMath.pow(10, line.scatter()))
        + "); leaving one plug out "
        + Numbers.text(leaveOneOut().value());
  }

  private String factors() {
    return Numbers.text(meanFactor())
        + " if lognormal, "
        + Numbers.text(smearingFactor())
        + " by smearing";
  }

  double medianMd(double porosity) {
    return StrictMath.pow(10, line.at(form.function().applyAsDouble(porosity)));
  }

  double halfWidth(double level, double porosity) {
    return line.predictionHalfWidth(level, form.function().applyAsDouble(porosity));
  }

  /** The form's card with the porosities of the plugs as the range in which the fit holds. */
  private MethodCard calibrated() {
    MethodCard card = form.card();
    MethodCard.Builder out =
        MethodCard.named(card.id(), card.title())
            .equation(equation())
            .input("φ", "porosity", Units.fraction, card.inputs().get(0).possible())
            .valid(plugs.smallestPorosity(), plugs.largestPorosity())
            .result("k", "permeability", Units.mD)
            .source(card.source())
            .constants(card.constants());
    card.notes().forEach(out::note);
    return out.build();
  }
}
