package connate.conductivity;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.HydraulicConductivity;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Locale;

/**
 * Conductivity after Shepherd, a power of the median size for each kind of deposit.
 *
 * <pre>K [ft/d] = C d50^j,  d50 in mm</pre>
 *
 * <table>
 * <caption>Deposits</caption>
 * <tr><th>deposit</th><th>C</th><th>j</th></tr>
 * <tr><td>channel</td><td>450</td><td>1.65</td></tr>
 * <tr><td>beach</td><td>1600</td><td>1.75</td></tr>
 * <tr><td>dune</td><td>5000</td><td>1.85</td></tr>
 * <tr><td>glass spheres</td><td>40000</td><td>2</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for loose sediment of the deposit named. Others write the channel factor as 3500
 * gallons a day and square foot, 468 ft/d: 4 % more.
 *
 * <p><b>Source</b>: Shepherd (1989), Ground Water 27, 633–638. Constants from memory.
 *
 * <p><b>Checked</b> in {@code ShepherdTest}.
 */
public final class Shepherd {

  /** The kind of deposit. */
  public enum Deposit {
    /** Rivers: the default. */
    CHANNEL(450, 1.65),
    /** Beaches. */
    BEACH(1600, 1.75),
    /** Dunes. */
    DUNE(5000, 1.85),
    /** Glass spheres. */
    SPHERES(40000, 2);

    private final double factor;
    private final double exponent;

    Deposit(double factor, double exponent) {
      this.factor = factor;
      this.exponent = exponent;
    }

    /** Returns the factor in ft/d. */
    public double factorFeetPerDay() {
      return factor;
    }

    /** Returns the exponent. */
    public double exponent() {
      return exponent;
    }

    @Override
    public String toString() {
      return name().toLowerCase(Locale.ROOT);
    }
  }

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("shepherd", "Shepherd")
          .equation("K = C d50^j")
          .input("d50", "size with 50 % finer", Units.mm, Range.POSITIVE)
          .input("C", "factor", Units.number, Range.POSITIVE)
          .input("j", "exponent", Units.number, Range.of(1, 3))
          .valid(1.5, 2)
          .result("K", "hydraulic conductivity", Units.ftPerDay)
          .source("Shepherd (1989), Ground Water 27, 633–638")
          .constants(Constants.FROM_MEMORY)
          .topics("hydraulic conductivity", "grain size", "aquifer", "sand")
          .note("C and j: channel 450, 1.65 (default); beach 1600, 1.75; dune 5000, 1.85; spheres")
          .note("40000, 2. Others write the channel factor as 468 ft/d, 4 % more.")
          .build();

  private static final double FOOT = 0.3048;

  /** How the table of all formulas asks this one. */
  static final Entry ENTRY =
      new Entry(
          CARD,
          s -> feetPerDay(s.d50(), Deposit.CHANNEL.factor, Deposit.CHANNEL.exponent) * FOOT / 86400,
          s -> "");

  private static final Formula<HydraulicConductivity> FORMULA =
      Formula.of(CARD, Units.ftPerDay, Shepherd::feetPerDay);

  private Shepherd() {}

  /** Returns the conductivity of one channel sand, in m/d. */
  public static HydraulicConductivity of(Length d50) {
    return of(d50, Deposit.CHANNEL);
  }

  /** Returns the conductivity of one sand of a deposit, in m/d. */
  public static HydraulicConductivity of(Length d50, Deposit deposit) {
    return FORMULA
        .value(d50, Units.number(deposit.factor), Units.number(deposit.exponent))
        .to(Units.mPerDay);
  }

  /** Returns the conductivity of each row of channel sand, in m/d. */
  public static Series of(Operand d50) {
    return of(d50, Deposit.CHANNEL);
  }

  /** Returns the conductivity of each row of a deposit, in m/d. */
  public static Series of(Operand d50, Deposit deposit) {
    return of(d50, Units.number(deposit.factor), Units.number(deposit.exponent));
  }

  /** Returns the conductivity of each row with a factor in ft/d and an exponent, in m/d. */
  public static Series of(Operand d50, Ratio factorFeetPerDay, Ratio exponent) {
    return FORMULA.series(d50, factorFeetPerDay, exponent).to(Units.mPerDay);
  }

  static double feetPerDay(double mm, double factor, double exponent) {
    return factor * StrictMath.pow(mm, exponent);
  }
}
