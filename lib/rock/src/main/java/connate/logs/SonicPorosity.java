package connate.logs;

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
 * Porosity from the sonic log, after Wyllie and after Raymer, Hunt and Gardner.
 *
 * <pre>
 * Wyllie   φ = (Δt − Δt_ma) / (Δt_f − Δt_ma) / C
 * Raymer–Hunt–Gardner   V = (1 − φ)² V_ma + φ V_f, solved for φ
 * quick form   φ = 0.67 (Δt − Δt_ma) / Δt
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>Δt</td><td>slowness of the rock, of the grains, of the fluid</td><td>µs/ft</td></tr>
 * <tr><td>C</td><td>compaction factor, slowness of nearby shale over 100 where that is above 1</td><td>1</td></tr>
 * <tr><td>V</td><td>velocity</td><td>ft/s</td></tr>
 * </table>
 *
 * <p><b>Valid</b> below a porosity of 0.37. Texts print 0.625, 0.67 and 0.70 in the quick form;
 * slowness in µs/m must be converted.
 *
 * <p><b>Source</b>: Wyllie, Gregory and Gardner (1956), Geophysics 21, 41–70; Raymer, Hunt and
 * Gardner (1980), SPWLA 21st Annual Logging Symposium, paper P.
 *
 * <p><b>Checked</b> in {@code LogLawsTest}.
 */
public final class SonicPorosity {

  /** The facts on the time average. */
  public static final MethodCard WYLLIE =
      MethodCard.named("wyllie", "Wyllie time average")
          .equation("φ = (Δt - Δt_ma) / (Δt_f - Δt_ma) / C")
          .input("Δt", "slowness", Units.usPerFt, Range.POSITIVE)
          .valid(35, 190)
          .input("Δt_ma", "slowness of the grains", Units.usPerFt, Range.POSITIVE)
          .input("Δt_f", "slowness of the fluid", Units.usPerFt, Range.POSITIVE)
          .input("C", "compaction factor", Units.number, Range.POSITIVE)
          .valid(1, 2)
          .result("φ", "sonic porosity", Units.fraction)
          .source("Wyllie, Gregory and Gardner (1956), Geophysics 21, 41–70")
          .constants(Constants.CHECKED)
          .topics("porosity", "logs", "sonic")
          .note("Compacted rock; C corrects for lack of it.")
          .build();

  /** The facts on the transform of Raymer, Hunt and Gardner. */
  public static final MethodCard RAYMER =
      MethodCard.named("raymer-hunt-gardner", "Raymer–Hunt–Gardner")
          .equation("V = (1 - φ)² V_ma + φ V_f, solved for φ")
          .input("Δt", "slowness", Units.usPerFt, Range.POSITIVE)
          .valid(35, 190)
          .input("Δt_ma", "slowness of the grains", Units.usPerFt, Range.POSITIVE)
          .input("Δt_f", "slowness of the fluid", Units.usPerFt, Range.POSITIVE)
          .result("φ", "sonic porosity", Units.fraction)
          .source("Raymer, Hunt and Gardner (1980), SPWLA 21st Annual Logging Symposium, paper P")
          .constants(Constants.FROM_MEMORY)
          .topics("porosity", "logs", "sonic")
          .note("Below a porosity of 0.37.")
          .build();

  /** The facts on the quick form. */
  public static final MethodCard QUICK =
      MethodCard.named("raymer-quick", "Raymer–Hunt–Gardner, quick form")
          .equation("φ = 0.67 (Δt - Δt_ma) / Δt")
          .input("Δt", "slowness", Units.usPerFt, Range.POSITIVE)
          .valid(35, 190)
          .input("Δt_ma", "slowness of the grains", Units.usPerFt, Range.POSITIVE)
          .result("φ", "sonic porosity", Units.fraction)
          .source("approximation of Raymer, Hunt and Gardner (1980)")
          .constants(Constants.FROM_MEMORY)
          .topics("porosity", "logs", "sonic")
          .note("Texts print 0.625, 0.67 and 0.70 for the factor; 0.67 is taken.")
          .build();

  private static final Formula<Fraction> WYLLIE_FORMULA =
      Formula.of(
          WYLLIE,
          Units.fraction,
          (dt, matrix, fluid, c) -> SonicPorosity.wyllieNumber(dt, matrix, fluid, c));

  private static final Formula<Fraction> RAYMER_FORMULA =
      Formula.of(
          RAYMER,
          Units.fraction,
          (dt, matrix, fluid) -> SonicPorosity.raymerNumber(dt, matrix, fluid));

  private static final Formula<Fraction> QUICK_FORMULA =
      Formula.of(QUICK, Units.fraction, (dt, matrix) -> SonicPorosity.quickNumber(dt, matrix));

  private SonicPorosity() {}

  /** Returns the sonic porosity of one sample by the time average. */
  public static Fraction wyllie(
      Slowness slowness,
      Slowness slownessOfTheGrains,
      Slowness slownessOfTheFluid,
      double compactionFactor) {
    return WYLLIE_FORMULA.value(
        slowness, slownessOfTheGrains, slownessOfTheFluid, Units.number(compactionFactor));
  }

  /** Returns the sonic porosity of each row by the time average. */
  public static Series wyllie(
      Operand slowness,
      Operand slownessOfTheGrains,
      Operand slownessOfTheFluid,
      double compactionFactor) {
    return WYLLIE_FORMULA.series(
        slowness, slownessOfTheGrains, slownessOfTheFluid, Units.number(compactionFactor));
  }

  static double wyllieNumber(double dt, double matrix, double fluid, double c) {
    return (dt - matrix) / (fluid - matrix) / c;
  }

  /** Returns the sonic porosity of one sample by the transform of Raymer, Hunt and Gardner. */
  public static Fraction raymer(
      Slowness slowness, Slowness slownessOfTheGrains, Slowness slownessOfTheFluid) {
    return RAYMER_FORMULA.value(slowness, slownessOfTheGrains, slownessOfTheFluid);
  }

  /** Returns the sonic porosity of each row by the transform of Raymer, Hunt and Gardner. */
  public static Series raymer(
      Operand slowness, Operand slownessOfTheGrains, Operand slownessOfTheFluid) {
    return RAYMER_FORMULA.series(slowness, slownessOfTheGrains, slownessOfTheFluid);
  }

  static double raymerNumber(double dt, double matrix, double fluid) {
    double v = matrix / dt;
    double f = matrix / fluid;
    double half = 1 - f / 2;
    double root = half * half - (1 - v);
    return root < 0 ? Double.NaN : half - StrictMath.sqrt(root);
  }

  /** Returns the sonic porosity of one sample by the quick form. */
  public static Fraction quick(Slowness slowness, Slowness slownessOfTheGrains) {
    return QUICK_FORMULA.value(slowness, slownessOfTheGrains);
  }

  /** Returns the sonic porosity of each row by the quick form. */
  public static Series quick(Operand slowness, Operand slownessOfTheGrains) {
    return QUICK_FORMULA.series(slowness, slownessOfTheGrains);
  }

  static double quickNumber(double dt, double matrix) {
    return 0.67 * (dt - matrix) / dt;
  }
}
