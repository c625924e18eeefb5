package connate.compaction;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Density;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Pressure;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity falls exponentially with effective stress, the form of exponential compaction that holds
 * under overpressure.
 *
 * <pre>
 * φ = φ0 exp(−b σ′),  σ′ = S − P
 * </pre>
 *
 * <p><b>Valid</b> for mechanical compaction. S is the weight of everything above, P the pressure in
 * the pores; after unloading take the greatest σ′ that the rock has felt.
 *
 * <p><b>Source</b>: Rubey and Hubbert (1959), Geological Society of America Bulletin 70, 167–206.
 *
 * <p><b>Checked</b> in {@code EffectiveStressTest}.
 */
public final class EffectiveStress {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("effective-stress-compaction", "Compaction by effective stress")
          .equation("φ = φ0 exp(-b (S - P))")
          .input("φ0", "porosity at the surface", Units.fraction, Range.above(0).below(1))
          .input("b", "compaction coefficient per MPa", Units.number, Range.from(0))
          .valid(0.005, 0.2)
          .input("S", "overburden stress", Units.MPa, Range.from(0))
          .input("P", "pore pressure", Units.MPa, Range.from(0))
          .result("φ", "porosity", Units.fraction)
          .source("Rubey and Hubbert (1959), Geological Society of America Bulletin 70, 167–206")
          .constants(Constants.EXACT)
          .topics("compaction", "porosity", "depth", "overpressure", "stress")
          .note("After unloading take the greatest effective stress the rock has felt.")
          .build();

  private static final double GRAVITY = 9.80665;

  private static final Formula<Fraction> FORMULA =
      Formula.of(
          CARD,
          Units.fraction,
          (initial, perMPa, overburden, pore) -> porosity(initial, perMPa, overburden, pore));

  private EffectiveStress() {}

  /** Returns the porosity of one value of each input. */
  public static Fraction of(Fraction initial, Ratio perMPa, Pressure overburden, Pressure pore) {
    return FORMULA.value(initial, perMPa, overburden, pore);
  }

  /** Returns the porosity of each row. */
  public static Series of(Operand initial, Operand perMPa, Operand overburden, Operand pore) {
    return FORMULA.series(initial, perMPa, overburden, pore);
  }

  /**
   * Returns the coefficient per MPa that gives the same porosity at normal pressure as a
   * coefficient per km of depth: b = c / ((ρ − ρw) g).
   *
   * @param perKm the coefficient of the law over depth
   * @param bulk the mean bulk density of the overburden
   * @param water the density of the water
   */
  public static Ratio perMPa(Ratio perKm, Density bulk, Density water) {
    double gradient = (bulk.in(Units.kgPerM3) - water.in(Units.kgPerM3)) * GRAVITY * 1e-3;
    if (!(gradient > 0)) {
      throw new IllegalArgumentException(
          "rock of " + bulk + " is not heavier than water of " + water);
    }
    return Units.number(perKm.value() / gradient);
  }

  static double porosity(double initial, double perMPa, double overburden, double pore) {
    if (pore > overburden) {
      throw new IllegalArgumentException(
          "the pore pressure of "
              + pore
              + " MPa is above the overburden of "
              + overburden
              + " MPa: rock breaks before that");
    }
    return initial * StrictMath.exp(-perMPa * (overburden - pore));
  }
}
