package connate.compaction;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * The thickness that a bed had at another depth: its grains are conserved, its pores are not.
 *
 * <pre>
 * h_s = (z2 − z1) − (φ0/c) (exp(−c z1) − exp(−c z2))
 * </pre>
 *
 * <p><b>Valid</b> for a bed whose pores follow exponential compaction at both depths; no cement, no
 * dissolution.
 *
 * <p><b>Source</b>: Sclater and Christie (1980), J. Geophysical Research 85, 3711–3739; Steckler
 * and Watts (1978), Earth and Planetary Science Letters 41, 1–13.
 *
 * <p><b>Checked</b> in {@code DecompactionTest}.
 */
public final class Decompaction {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("solid-thickness", "Thickness of the solids of a bed")
          .equation("h_s = (z2 - z1) - (φ0/c)(exp(-c z1) - exp(-c z2))")
          .input("φ0", "porosity at the surface", Units.fraction, Range.above(0).below(1))
          .input("c", "compaction coefficient per km", Units.number, Range.POSITIVE)
          .valid(0.1, 1.5)
          .input("z1", "top", Units.km, Range.from(0))
          .input("z2", "base", Units.km, Range.from(0))
          .result("h_s", "thickness of the solids", Units.km)
          .source(
              "Sclater and Christie (1980), J. Geophysical Research 85, 3711–3739; Steckler and Watts (1978), Earth and Planetary Science Letters 41, 1–13")
          .constants(Constants.EXACT)
          .topics("compaction", "decompaction", "burial", "thickness")
          .build();

  /** The facts on the bed at another depth. */
  public static final MethodCard BASE =
      MethodCard.named("decompaction", "Decompaction of a bed")
          .equation("h_s(z1′, z2′) = h_s(z1, z2), solved for z2′")
          .input("φ0", "porosity at the surface", Units.fraction, Range.above(0).below(1))
          .input("c", "compaction coefficient per km", Units.number, Range.POSITIVE)
          .valid(0.1, 1.5)
          .input("h_s", "thickness of the solids", Units.km, Range.from(0))
          .input("z1′", "top at the other depth", Units.km, Range.from(0))
          .result("z2′", "base at the other depth", Units.km)
          .source(
              "Sclater and Christie (1980), J. Geophysical Research 85, 3711–3739; Steckler and Watts (1978), Earth and Planetary Science Letters 41, 1–13")
          .constants(Constants.EXACT)
          .topics("compaction", "decompaction", "burial", "thickness")
          .build();

  private static final int STEPS = 200;

  /** In km, a tenth of a millimetre. */
  private static final double PRECISION = 1e-10;

  private static final Formula<Length> CARD_FORMULA =
      Formula.of(CARD, Units.km, (initial, perKm, top, base) -> solidKm(initial, perKm, top, base));
  private static final Formula<Length> BASE_FORMULA =
      Formula.of(
          BASE, Units.km, (initial, perKm, solid, top) -> baseKm(initial, perKm, solid, top));

  private Decompaction() {}

  /** Returns the thickness of the solids of one value of each input. */
  public static Length solid(Fraction initial, Ratio perKm, Length top, Length base) {
    return CARD_FORMULA.value(initial, perKm, top, base);
  }

  /** Returns the thickness of the solids of each row. */
  public static Series solid(Operand initial, Operand perKm, Operand top, Operand base) {
    return CARD_FORMULA.series(initial, perKm, top, base);
  }

  /** Returns the base of the bed at another depth of one value of each input. */
  public static Length base(Fraction initial, Ratio perKm, Length solid, Length top) {
    return BASE_FORMULA.value(initial, perKm, solid, top);
  }

  /** Returns the base of the bed at another depth of each row. */
  public static Series base(Operand initial, Operand perKm, Operand solid, Operand top) {
    return BASE_FORMULA.series(initial, perKm, solid, top);
  }

  /** Returns the thickness that a bed between two depths had when its top was at another depth. */
  public static Length thickness(
      Fraction initial, Ratio perKm, Length top, Length base, Length topThen) {
    return base(initial, perKm, solid(initial, perKm, top, base), topThen)
        .to(Units.m)
        .less(topThen);
  }

  static double solidKm(double initial, double perKm, double top, double base) {
    if (base < top) {
      throw new IllegalArgumentException(
          "the base at " + base + " km lies above the top at " + top + " km");
    }
    return base
        - top
        - initial / perKm * (StrictMath.exp(-perKm * top) - StrictMath.exp(-perKm * base));
  }

  static double baseKm(double initial, double perKm, double solid, double top) {
    if (Double.isNaN(perKm)) {
      return Double.NaN;
    }
    double low = top + solid;
    double high = top + solid / (1 - initial);
    for (int i = 0; i < STEPS && high - low > PRECISION; i++) {
      double middle = (low + high) / 2;
      if (solidKm(initial, perKm, top, middle) < solid) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return (low + high) / 2;
  }
}
