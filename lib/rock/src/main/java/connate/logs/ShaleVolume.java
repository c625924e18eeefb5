package connate.logs;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.GammaRay;
import connate.quantity.Operand;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Shale volume from the gamma ray. The index I runs from clean rock to shale and is cut at 0 and 1;
 * the laws bend it differently, and the choice is the user's to state.
 *
 * <pre>
 * I = (GR − GR_clean) / (GR_shale − GR_clean)
 * linear            V = I
 * Larionov, older   V = 0.33 (2^(2 I) − 1)
 * Larionov, Tertiary V = 0.083 (2^(3.7 I) − 1)
 * Steiber           V = I / (3 − 2 I)
 * Clavier           V = 1.7 − √(3.38 − (I + 0.7)²)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>GR</td><td>gamma ray; of clean rock, of shale</td><td>gAPI</td></tr>
 * <tr><td>V</td><td>shale volume</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> where radioactivity comes from clay: not with feldspar, mica, or uranium in
 * carbonates. At a middling index linear &gt; Larionov, older &gt; Clavier &gt; Steiber &gt;
 * Larionov, Tertiary.
 *
 * <p><b>Source</b>: Larionov (1969); Steiber (1970), SPE 2961; Clavier, Hoyle and Meunier (1971),
 * J. Pet. Technol. 23, 743–754. A later review holds that the Russian original was mistranslated.
 *
 * <p><b>Checked</b> in {@code ShaleVolumeTest}.
 */
public final class ShaleVolume {

  /** The facts on linear shale volume. */
  public static final MethodCard LINEAR =
      card(
          "shale-volume-linear",
          "Linear shale volume",
          "V = I, I = (GR - GR_clean) / (GR_shale - GR_clean)",
          "common practice; the upper bound of all laws",
          Constants.EXACT,
          "Overstates shale between the end points.");

  /** The facts on larionov shale volume, older rocks. */
  public static final MethodCard LARIONOV_OLDER =
      card(
          "shale-volume-larionov-older",
          "Larionov shale volume, older rocks",
          "V = 0.33 (2^(2 I) - 1), I = (GR - GR_clean) / (GR_shale - GR_clean)",
          "Larionov (1969), Borehole Radiometry, Nedra, Moscow",
          Constants.CHECKED,
          "Reaches 0.990 at I = 1. For rocks older than the Tertiary.");

  /** The facts on larionov shale volume, Tertiary rocks. */
  public static final MethodCard LARIONOV_TERTIARY =
      card(
          "shale-volume-larionov-tertiary",
          "Larionov shale volume, Tertiary rocks",
          "V = 0.083 (2^(3.7 I) - 1), I = (GR - GR_clean) / (GR_shale - GR_clean)",
          "Larionov (1969), Borehole Radiometry, Nedra, Moscow",
          Constants.CHECKED,
          "Reaches 0.996 at I = 1. For unconsolidated Tertiary rocks.");

  /** The facts on steiber shale volume. */
  public static final MethodCard STEIBER =
      card(
          "shale-volume-steiber",
          "Steiber shale volume",
          "V = I / (3 - 2 I), I = (GR - GR_clean) / (GR_shale - GR_clean)",
          "Steiber (1970), SPE 2961",
          Constants.CHECKED,
          "Between Clavier and Larionov for Tertiary rocks.");

  /** The facts on clavier shale volume. */
  public static final MethodCard CLAVIER =
      card(
          "shale-volume-clavier",
          "Clavier shale volume",
          "V = 1.7 - √(3.38 - (I + 0.7)²), I = (GR - GR_clean) / (GR_shale - GR_clean)",
          "Clavier, Hoyle and Meunier (1971), J. Pet. Technol. 23, 743–754",
          Constants.CHECKED,
          "Between Larionov for older rocks and Steiber.");

  private static final Formula<Fraction> LINEAR_FORMULA =
      Formula.of(LINEAR, Units.fraction, (gr, clean, shale) -> linear(index(gr, clean, shale)));

  private static final Formula<Fraction> LARIONOV_OLDER_FORMULA =
      Formula.of(
          LARIONOV_OLDER,
          Units.fraction,
          (gr, clean, shale) -> larionovOlder(index(gr, clean, shale)));

  private static final Formula<Fraction> LARIONOV_TERTIARY_FORMULA =
      Formula.of(
          LARIONOV_TERTIARY,
          Units.fraction,
          (gr, clean, shale) -> larionovTertiary(index(gr, clean, shale)));

  private static final Formula<Fraction> STEIBER_FORMULA =
      Formula.of(STEIBER, Units.fraction, (gr, clean, shale) -> steiber(index(gr, clean, shale)));

  private static final Formula<Fraction> CLAVIER_FORMULA =
      Formula.of(CLAVIER, Units.fraction, (gr, clean, shale) -> clavier(index(gr, clean, shale)));

  private ShaleVolume() {}

  /** Returns the shale volume at one gamma ray reading by this law: V = I. */
  public static Fraction linear(GammaRay reading, GammaRay clean, GammaRay shale) {
    return LINEAR_FORMULA.value(reading, clean, shale);
  }

  /** Returns the shale volume of each row by this law: V = I. */
  public static Series linear(Operand reading, Operand clean, Operand shale) {
    return LINEAR_FORMULA.series(reading, clean, shale);
  }

  static double linear(double i) {
    return i;
  }

  /** Returns the shale volume at one gamma ray reading by this law: V = 0.33 (2^(2 I) - 1). */
  public static Fraction larionovOlder(GammaRay reading, GammaRay clean, GammaRay shale) {
    return LARIONOV_OLDER_FORMULA.value(reading, clean, shale);
  }

  /** Returns the shale volume of each row by this law: V = 0.33 (2^(2 I) - 1). */
  public static Series larionovOlder(Operand reading, Operand clean, Operand shale) {
    return LARIONOV_OLDER_FORMULA.series(reading, clean, shale);
  }

  static double larionovOlder(double i) {
    return 0.33 * (StrictMath.pow(2, 2 * i) - 1);
  }

  /** Returns the shale volume at one gamma ray reading by this law: V = 0.083 (2^(3.7 I) - 1). */
  public static Fraction larionovTertiary(GammaRay reading, GammaRay clean, GammaRay shale) {
    return LARIONOV_TERTIARY_FORMULA.value(reading, clean, shale);
  }

  /** Returns the shale volume of each row by this law: V = 0.083 (2^(3.7 I) - 1). */
  public static Series larionovTertiary(Operand reading, Operand clean, Operand shale) {
    return LARIONOV_TERTIARY_FORMULA.series(reading, clean, shale);
  }

  static double larionovTertiary(double i) {
    return 0.083 * (StrictMath.pow(2, 3.7 * i) - 1);
  }

  /** Returns the shale volume at one gamma ray reading by this law: V = I / (3 - 2 I). */
  public static Fraction steiber(GammaRay reading, GammaRay clean, GammaRay shale) {
    return STEIBER_FORMULA.value(reading, clean, shale);
  }

  /** Returns the shale volume of each row by this law: V = I / (3 - 2 I). */
  public static Series steiber(Operand reading, Operand clean, Operand shale) {
    return STEIBER_FORMULA.series(reading, clean, shale);
  }

  static double steiber(double i) {
    return i / (3 - 2 * i);
  }

  /**
   * Returns the shale volume at one gamma ray reading by this law: V = 1.7 - √(3.38 - (I + 0.7)²).
   */
  public static Fraction clavier(GammaRay reading, GammaRay clean, GammaRay shale) {
    return CLAVIER_FORMULA.value(reading, clean, shale);
  }

  /** Returns the shale volume of each row by this law: V = 1.7 - √(3.38 - (I + 0.7)²). */
  public static Series clavier(Operand reading, Operand clean, Operand shale) {
    return CLAVIER_FORMULA.series(reading, clean, shale);
  }

  static double clavier(double i) {
    return 1.7 - StrictMath.sqrt(3.38 - (i + 0.7) * (i + 0.7));
  }

  static double index(double reading, double clean, double shale) {
    if (clean >= shale) {
      throw new IllegalArgumentException(
          "the gamma ray of clean rock, " + clean + ", is not below that of shale, " + shale);
    }
    return StrictMath.max(0, StrictMath.min(1, (reading - clean) / (shale - clean)));
  }

  private static MethodCard card(
      String id, String title, String equation, String source, Constants state, String note) {
    return MethodCard.named(id, title)
        .equation(equation)
        .input("GR", "gamma ray", Units.gAPI, Range.from(0))
        .input("GR_clean", "gamma ray of clean rock", Units.gAPI, Range.from(0))
        .input("GR_shale", "gamma ray of shale", Units.gAPI, Range.above(0))
        .result("V", "shale volume", Units.fraction)
        .source(source)
        .constants(state)
        .topics("shale volume", "logs", "gamma ray")
        .note("The index is cut at 0 and 1. " + note)
        .build();
  }
}
