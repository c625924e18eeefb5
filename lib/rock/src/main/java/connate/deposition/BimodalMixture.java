package connate.deposition;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity of coarse grains with fines between them: fines fill the pores until these are full,
 * then grains float among the fines.
 *
 * <pre>
 * c &lt; nc: n = nc − c y (1 − nf) + (1 − y) c nf,   y = 1 + c (ymin − 1) / nc
 * c ≥ nc: n = nc (1 − y) + c nf,                  y = 1 + (c − 1)(1 − ymin) / (1 − nc)
 * </pre>
 *
 * <p>c is the share of bulk volume that the fines would fill alone, nc and nf the porosities of the
 * coarse and the fine part alone. ymin = 1 is ideal packing with its least porosity nc·nf at c =
 * nc; less than 1 lets the mixture be looser.
 *
 * <p><b>Valid</b> for grains of very different size; it fails where fines are nearly as large as
 * pores. c is a share of bulk volume, not of weight: {@link #bulkShare} converts.
 *
 * <p><b>Source</b>: Clarke (1979), AAPG Bulletin 63, 799–809 (ideal); Koltermann and Gorelick
 * (1995), Water Resources Research 31, 3283–3297 (fractional). From memory.
 *
 * <p><b>Checked</b> in {@code BimodalMixtureTest}.
 */
public final class BimodalMixture {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("bimodal-mixture", "Porosity of a bimodal mixture")
          .equation(
              "c < nc: n = nc - c y (1 - nf) + (1 - y) c nf; c ≥ nc: n = nc (1 - y) + c nf; y from"
                  + " ymin")
          .input("c", "share of fines by bulk volume", Units.fraction, Range.PART)
          .input("nc", "porosity of the coarse part", Units.fraction, Range.above(0).below(1))
          .valid(0.26, 0.48)
          .input("nf", "porosity of the fine part", Units.fraction, Range.above(0).below(1))
          .input("ymin", "least packing", Units.fraction, Range.above(0).to(1))
          .result("n", "porosity", Units.fraction)
          .source(
              "Clarke (1979), AAPG Bulletin 63, 799–809; Koltermann and Gorelick (1995), Water"
                  + " Resources Research 31, 3283–3297")
          .constants(Constants.FROM_MEMORY)
          .topics("porosity", "grain size", "sorting", "clay", "deposition")
          .note("c is a share of bulk volume, not of weight.")
          .note("Fails where the fines are nearly as large as the pores between the grains.")
          .build();

  /** The facts on the size that stands for the mixture. */
  public static final MethodCard SIZE =
      MethodCard.named("bimodal-size", "Effective size of a bimodal mixture")
          .equation("c < nc: d = dc^(1-c) df^c; c ≥ nc: 1/d = (1 - c)/dc + c/df")
          .input("c", "share of fines by bulk volume", Units.fraction, Range.PART)
          .input("nc", "porosity of the coarse part", Units.fraction, Range.above(0).below(1))
          .input("dc", "size of the coarse grains", Units.mm, Range.POSITIVE)
          .input("df", "size of the fines", Units.mm, Range.POSITIVE)
          .result("d", "effective size", Units.mm)
          .source("Koltermann and Gorelick (1995), Water Resources Research 31, 3283–3297")
          .constants(Constants.FROM_MEMORY)
          .topics("grain size", "permeability", "clay", "deposition")
          .note("For the law of Kozeny and Carman; it jumps at c = nc.")
          .build();

  private static final Formula<Fraction> FORMULA =
      Formula.of(CARD, Units.fraction, BimodalMixture::porosity);
  private static final Formula<Length> SIZE_FORMULA =
      Formula.of(SIZE, Units.mm, BimodalMixture::sizeMm);

  private BimodalMixture() {}

  /** Returns the porosity of an ideal mixture. */
  public static Fraction of(Fraction fines, Fraction coarse, Fraction fine) {
    return of(fines, coarse, fine, Units.fraction(1));
  }

  /** Returns the porosity of a mixture with a least packing. */
  public static Fraction of(Fraction fines, Fraction coarse, Fraction fine, Fraction leastPacking) {
    return FORMULA.value(fines, coarse, fine, leastPacking);
  }

  /** Returns the porosity of each row of ideal mixtures. */
  public static Series of(Operand fines, Operand coarse, Operand fine) {
    return of(fines, coarse, fine, Units.fraction(1));
  }

  /** Returns the porosity of each row of mixtures with a least packing. */
  public static Series of(Operand fines, Operand coarse, Operand fine, Operand leastPacking) {
    return FORMULA.series(fines, coarse, fine, leastPacking);
  }

  /** Returns the size that stands for the mixture in the law of Kozeny and Carman. */
  public static Length size(Fraction fines, Fraction coarse, Length coarseSize, Length fineSize) {
    return SIZE_FORMULA.value(fines, coarse, coarseSize, fineSize);
  }

  /** Returns the size that stands for each row's mixture. */
  public static Series size(Operand fines, Operand coarse, Operand coarseSize, Operand fineSize) {
    return SIZE_FORMULA.series(fines, coarse, coarseSize, fineSize);
  }

  /**
   * Returns the share of bulk volume of fines from their share of weight, of which all grains have
   * one density: the solids of the fines over the space that they would fill in the mixture.
   *
   * @param weight the share of weight
   * @param coarse the porosity of the coarse part alone
   * @param fine the porosity of the fine part alone
   */
  public static Fraction bulkShare(Fraction weight, Fraction coarse, Fraction fine) {
    double w = weight.fraction();
    double solidsCoarse = 1 - coarse.fraction();
    double solidsFine = 1 - fine.fraction();
    double filling = w * solidsCoarse / ((1 - w) * solidsFine);
    double floating = (w / solidsFine) / (w / solidsFine + 1 - w);
    return Units.fraction(w < 1 && filling < coarse.fraction() ? filling : floating);
  }

  static double porosity(double c, double nc, double nf, double ymin) {
    if (c < nc) {
      double y = 1 + c * (ymin - 1) / nc;
      return nc - c * y * (1 - nf) + (1 - y) * c * nf;
    }
    double y = 1 + (c - 1) * (1 - ymin) / (1 - nc);
    return nc * (1 - y) + c * nf;
  }

  static double sizeMm(double c, double nc, double dc, double df) {
    if (Double.isNaN(nc)) {
      return Double.NaN;
    }
    return c < nc
        ? StrictMath.exp((1 - c) * StrictMath.log(dc) + c * StrictMath.log(df))
        : 1 / ((1 - c) / dc + c / df);
  }
}
