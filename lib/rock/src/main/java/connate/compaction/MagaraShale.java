package connate.compaction;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Slowness;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity of shale from its sonic transit time after Magara, as Chapman prints it.
 *
 * <pre>
 * φ = (Δt − 55) / 220,  Δt in µs/ft
 * </pre>
 *
 * <p><b>Valid</b> for normally compacted and undercompacted shale of the region for which the line
 * was drawn: 0.5 at 165 µs/ft, 0 at 55 µs/ft.
 *
 * <p><b>Source</b>: Magara; Chapman, Petroleum Geology, pp. 49–50.
 *
 * <p><b>Checked</b> in {@code MagaraShaleTest}.
 */
public final class MagaraShale {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("magara-shale", "Magara, shale porosity from sonic")
          .equation("φ = (Δt - 55)/220")
          .input("Δt", "transit time", Units.usPerFt, Range.from(55))
          .valid(55, 165)
          .result("φ", "porosity", Units.fraction)
          .source("Magara; Chapman, Petroleum Geology, pp. 49–50")
          .constants(Constants.CHECKED)
          .topics("porosity", "shale", "sonic", "compaction")
          .build();

  private static final Formula<Fraction> FORMULA =
      Formula.of(CARD, Units.fraction, transit -> porosity(transit));

  private MagaraShale() {}

  /** Returns the porosity of one value of each input. */
  public static Fraction of(Slowness transit) {
    return FORMULA.value(transit);
  }

  /** Returns the porosity of each row. */
  public static Series of(Operand transit) {
    return FORMULA.series(transit);
  }

  static double porosity(double transit) {
    return (transit - 55) / 220;
  }
}
