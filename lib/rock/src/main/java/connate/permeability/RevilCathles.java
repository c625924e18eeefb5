package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability of clean sand from grain size and the formation factor, after Revil and Cathles, and
 * after Glover and others.
 *
 * <pre>
 * full    k = d² / (8 m² F (F − 1)²),  F = φ^(−m)
 * short   k = d² φ^(3m) / 24
 * RGPZ    k = d² φ^(3m) / (4 a m²),  a = 8/3
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>m²</td></tr>
 * <tr><td>d</td><td>grain diameter</td><td>m</td></tr>
 * <tr><td>m</td><td>cementation exponent</td><td>1</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for clean sand; in shaly sand k is least where the shale content equals the
 * porosity of the sand.
 *
 * <p><b>Source</b>: Revil and Cathles (1999), Water Resour. Res. 35, 651–662; Glover, Zadjali and
 * Frew (2006), Geophysics 71, F49–F60; constants from memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class RevilCathles {

  /** The facts on the full law of Revil and Cathles. */
  public static final MethodCard FULL =
      MethodCard.named("revil-cathles", "Revil–Cathles")
          .equation("k = d² / (8 m² F (F - 1)²), F = φ^-m")
          .input("φ", "porosity", Units.fraction, Range.above(0).below(1))
          .input("d", "grain diameter", Units.m, Range.POSITIVE)
          .input("m", "cementation exponent", Units.number, Range.POSITIVE)
          .valid(1.3, 2.2)
          .result("k", "permeability", Units.squareMetres)
          .source("Revil and Cathles (1999), Water Resour. Res. 35, 651–662")
          .constants(Constants.CHECKED)
          .topics("permeability", "porosity", "grain size", "resistivity", "sand")
          .note("Clean sand.")
          .build();

  /** The facts on the short form. */
  public static final MethodCard SHORT =
      MethodCard.named("revil-cathles-short", "Revil–Cathles, short form")
          .equation("k = d² φ^(3m) / 24")
          .input("φ", "porosity", Units.fraction, Range.above(0).below(1))
          .input("d", "grain diameter", Units.m, Range.POSITIVE)
          .input("m", "cementation exponent", Units.number, Range.POSITIVE)
          .valid(1.3, 2.2)
          .result("k", "permeability", Units.squareMetres)
          .source("Revil and Cathles (1999), Water Resour. Res. 35, 651–662")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "porosity", "grain size", "sand")
          .note("For F far above 1 and m near 1.7.")
          .build();

  /** The facts on the law of Glover and others. */
  public static final MethodCard RGPZ =
      MethodCard.named("rgpz", "RGPZ")
          .equation("k = d² φ^(3m) / (4 a m²), a = 8/3")
          .input("φ", "porosity", Units.fraction, Range.above(0).below(1))
          .input("d", "grain diameter", Units.m, Range.POSITIVE)
          .input("m", "cementation exponent", Units.number, Range.POSITIVE)
          .valid(1.3, 2.5)
          .result("k", "permeability", Units.squareMetres)
          .source("Glover, Zadjali and Frew (2006), Geophysics 71, F49–F60")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "porosity", "grain size", "resistivity")
          .note("d is the geometric mean grain size.")
          .build();

  private static final Formula<Permeability> FULL_FORMULA =
      Formula.of(FULL, Units.squareMetres, (phi, d, m) -> RevilCathles.ofNumber(phi, d, m));

  private static final Formula<Permeability> SHORT_FORMULA =
      Formula.of(SHORT, Units.squareMetres, (phi, d, m) -> RevilCathles.shortFormNumber(phi, d, m));

  private static final Formula<Permeability> RGPZ_FORMULA =
      Formula.of(RGPZ, Units.squareMetres, (phi, d, m) -> RevilCathles.rgpzNumber(phi, d, m));

  private RevilCathles() {}

  /** Returns the permeability of one sample by the full law of Revil and Cathles. */
  public static Permeability of(
      Fraction porosity, Length grainDiameter, double cementationExponent) {
    return FULL_FORMULA.value(porosity, grainDiameter, Units.number(cementationExponent));
  }

  /** Returns the permeability of each row by the full law of Revil and Cathles. */
  public static Series of(Operand porosity, Operand grainDiameter, double cementationExponent) {
    return FULL_FORMULA.series(porosity, grainDiameter, Units.number(cementationExponent));
  }

  static double ofNumber(double phi, double d, double m) {
    double f = StrictMath.pow(phi, -m);
    return d * d / (8 * m * m * f * (f - 1) * (f - 1));
  }

  /** Returns the permeability of one sample by the short form. */
  public static Permeability shortForm(
      Fraction porosity, Length grainDiameter, double cementationExponent) {
    return SHORT_FORMULA.value(porosity, grainDiameter, Units.number(cementationExponent));
  }

  /** Returns the permeability of each row by the short form. */
  public static Series shortForm(
      Operand porosity, Operand grainDiameter, double cementationExponent) {
    return SHORT_FORMULA.series(porosity, grainDiameter, Units.number(cementationExponent));
  }

  static double shortFormNumber(double phi, double d, double m) {
    return d * d * StrictMath.pow(phi, 3 * m) / 24;
  }

  /** Returns the permeability of one sample by the law of Glover and others. */
  public static Permeability rgpz(
      Fraction porosity, Length grainDiameter, double cementationExponent) {
    return RGPZ_FORMULA.value(porosity, grainDiameter, Units.number(cementationExponent));
  }

  /** Returns the permeability of each row by the law of Glover and others. */
  public static Series rgpz(Operand porosity, Operand grainDiameter, double cementationExponent) {
    return RGPZ_FORMULA.series(porosity, grainDiameter, Units.number(cementationExponent));
  }

  static double rgpzNumber(double phi, double d, double m) {
    return d * d * StrictMath.pow(phi, 3 * m) / (4 * (8.0 / 3) * m * m);
  }
}
