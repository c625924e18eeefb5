package connate.cementation;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Temperature;
import connate.quantity.Time;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Quartz cement on a path of temperature after Walderhaug: the rate grows with temperature, the
 * open quartz surface shrinks with the porosity.
 *
 * <pre>
 * r = a 10^(b T),  a = 1.98e-22 mol/(cm² s), b = 0.022 per °C
 * φ = φ1 exp(−M A0 I / (ρ φ0)),  A0 = 6 f (1 − C) / D
 * I = a Δt (10^(b T2) − 10^(b T1)) / (b ln 10 (T2 − T1))
 * </pre>
 *
 * <p><b>Valid</b> for quartz-rich sandstone with silica at hand, from some 70 to 80 °C on. Oil,
 * pressure solution elsewhere and the orientation of crystals are left out; a varies between
 * provinces by a factor of 2 to 5. Temperature is in °C, D is the size of the detrital grain
 * without its overgrowth, C a share of its surface, not a volume. Cooling stops nothing: the rate
 * only falls.
 *
 * <p><b>Source</b>: Walderhaug (1994), J. Sedimentary Research A64, 324–333; Walderhaug (1996), J.
 * Sedimentary Research 66, 731–739. Constants from memory.
 *
 * <p><b>Checked</b> in {@code WalderhaugTest}.
 */
public final class Walderhaug {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("walderhaug", "Walderhaug, quartz cement")
          .equation("φ = φ1 exp(-M A0 I/(ρ φ0)), A0 = 6 f (1 - C)/D, I = ∫ a 10^(b T) dt")
          .input("φ1", "porosity at the start of the step", Units.fraction, Range.PART)
          .input("φ0", "porosity before any cement", Units.fraction, Range.above(0).below(1))
          .input("T1", "temperature at the start", Units.degC, Range.of(-20, 400))
          .valid(70, 200)
          .input("T2", "temperature at the end", Units.degC, Range.of(-20, 400))
          .valid(70, 200)
          .input("Δt", "duration", Units.Ma, Range.from(0))
          .input("D", "size of the quartz grains", Units.cm, Range.POSITIVE)
          .valid(0.005, 0.1)
          .input("f", "detrital quartz of the rock", Units.fraction, Range.above(0).to(1))
          .valid(0.3, 0.8)
          .input("C", "share of the surface coated", Units.fraction, Range.PART)
          .result("φ", "porosity at the end of the step", Units.fraction)
          .source(
              "Walderhaug (1994), J. Sedimentary Research A64, 324–333; Walderhaug (1996), J. Sedimentary Research 66, 731–739")
          .constants(Constants.FROM_MEMORY)
          .topics("cement", "quartz", "sandstone", "porosity", "temperature", "burial")
          .note("No silica-supply or oil effect; a varies between provinces by a factor of 2 to 5.")
          .note("D without overgrowth; the coat is a share of surface, not of volume.")
          .build();

  /** a, in mol/(cm² s). */
  static final double A = 1.98e-22;

  /** b, per °C. */
  static final double B = 0.022;

  /** Molar mass over density of quartz, cm³/mol: 60.09 / 2.65. */
  static final double MOLAR_VOLUME = 60.09 / 2.65;

  private static final double SECONDS_PER_MA = 3.15576e13;
  private static final double LN10 = 2.302585092994046;

  private static final Formula<Fraction> FORMULA =
      Formula.ofAny(
          CARD,
          Units.fraction,
          in -> after(in[0], in[1], in[2], in[3], in[4], in[5], in[6], in[7]));

  private Walderhaug() {}

  /** Returns the porosity at the end of the step of one value of each input. */
  public static Fraction porosity(
      Fraction porosity,
      Fraction initial,
      Temperature start,
      Temperature end,
      Time duration,
      Length grain,
      Fraction quartz,
      Fraction coat) {
    return FORMULA.value(porosity, initial, start, end, duration, grain, quartz, coat);
  }

  /** Returns the porosity at the end of the step of each row. */
  public static Series porosity(
      Operand porosity,
      Operand initial,
      Operand start,
      Operand end,
      Operand duration,
      Operand grain,
      Operand quartz,
      Operand coat) {
    return FORMULA.series(porosity, initial, start, end, duration, grain, quartz, coat);
  }

  /** Returns the rate of precipitation in mol/(cm² s) at a temperature. */
  public static double rateMolPerCm2Second(Temperature temperature) {
    return A * StrictMath.exp(B * LN10 * temperature.in(Units.degC));
  }

  /** Returns what precipitates on an open surface over a straight path of temperature, mol/cm². */
  static double precipitated(double startCelsius, double endCelsius, double ma) {
    double x = B * LN10 * (endCelsius - startCelsius);
    double mean = StrictMath.abs(x) < 1e-12 ? 1 : StrictMath.expm1(x) / x;
    return A * StrictMath.exp(B * LN10 * startCelsius) * mean * ma * SECONDS_PER_MA;
  }

  static double after(
      double porosity,
      double initial,
      double start,
      double end,
      double duration,
      double grain,
      double quartz,
      double coat) {
    double surface = 6 * quartz * (1 - coat) / grain;
    double grown = MOLAR_VOLUME * surface * precipitated(start, end, duration) / initial;
    return porosity * StrictMath.exp(-grown);
  }
}
