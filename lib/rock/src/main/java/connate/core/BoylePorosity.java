package connate.core;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Pressure;
import connate.quantity.Units;
import connate.quantity.Volume;
import connate.series.Series;

/**
 * Grain volume and porosity of a plug by expansion of gas, after Boyle.
 *
 * <pre>
 * Vg = Vc − Vr (P1/P2 − 1)
 * φ = (Vb − Vg) / Vb
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>Vg</td><td>volume of the grains</td><td>cm³</td></tr>
 * <tr><td>Vc, Vr</td><td>volumes of the plug chamber and of the reference chamber</td><td>cm³</td></tr>
 * <tr><td>P1, P2</td><td>pressure before and after, absolute</td><td>atm</td></tr>
 * <tr><td>Vb</td><td>bulk volume</td><td>cm³</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for helium at one temperature; pressures are absolute.
 *
 * <p><b>Source</b>: Boyle's law; American Petroleum Institute (1998), Recommended Practice 40.
 *
 * <p><b>Checked</b> in {@code CoreLawsTest}.
 */
public final class BoylePorosity {

  /** The facts on gas expansion. */
  public static final MethodCard GRAIN_VOLUME =
      MethodCard.named("boyle-grain-volume", "Grain volume by gas expansion")
          .equation("Vg = Vc - Vr (P1/P2 - 1)")
          .input("Vc", "plug chamber", Units.cm3, Range.POSITIVE)
          .input("Vr", "reference chamber", Units.cm3, Range.POSITIVE)
          .input("P1", "pressure before", Units.atm, Range.POSITIVE)
          .input("P2", "pressure after", Units.atm, Range.POSITIVE)
          .result("Vg", "grain volume", Units.cm3)
          .source("Boyle; API (1998), Recommended Practice 40")
          .constants(Constants.EXACT)
          .topics("core", "porosity", "plug")
          .note("Absolute pressures, one temperature.")
          .build();

  /** The facts on volume balance. */
  public static final MethodCard POROSITY =
      MethodCard.named("boyle-porosity", "Porosity from grain and bulk volume")
          .equation("φ = (Vb - Vg) / Vb")
          .input("Vb", "bulk volume", Units.cm3, Range.POSITIVE)
          .input("Vg", "grain volume", Units.cm3, Range.POSITIVE)
          .result("φ", "porosity", Units.fraction)
          .source("API (1998), Recommended Practice 40")
          .constants(Constants.EXACT)
          .topics("core", "porosity", "plug")
          .note("The grains cannot be more than the bulk.")
          .build();

  private static final Formula<Volume> GRAIN_VOLUME_FORMULA =
      Formula.of(
          GRAIN_VOLUME,
          Units.cm3,
          (vc, vr, p1, p2) -> BoylePorosity.grainVolumeNumber(vc, vr, p1, p2));

  private static final Formula<Fraction> POROSITY_FORMULA =
      Formula.of(POROSITY, Units.fraction, (vb, vg) -> BoylePorosity.porosityNumber(vb, vg));

  private BoylePorosity() {}

  /** Returns the grain volume of one sample by gas expansion. */
  public static Volume grainVolume(
      Volume plugChamber,
      Volume referenceChamber,
      Pressure pressureBefore,
      Pressure pressureAfter) {
    return GRAIN_VOLUME_FORMULA.value(plugChamber, referenceChamber, pressureBefore, pressureAfter);
  }

  /** Returns the grain volume of each row by gas expansion. */
  public static Series grainVolume(
      Operand plugChamber,
      Operand referenceChamber,
      Operand pressureBefore,
      Operand pressureAfter) {
    return GRAIN_VOLUME_FORMULA.series(
        plugChamber, referenceChamber, pressureBefore, pressureAfter);
  }

  static double grainVolumeNumber(double vc, double vr, double p1, double p2) {
    return vc - vr * (p1 / p2 - 1);
  }

  /** Returns the porosity of one sample by volume balance. */
  public static Fraction porosity(Volume bulkVolume, Volume grainVolume) {
    return POROSITY_FORMULA.value(bulkVolume, grainVolume);
  }

  /** Returns the porosity of each row by volume balance. */
  public static Series porosity(Operand bulkVolume, Operand grainVolume) {
    return POROSITY_FORMULA.series(bulkVolume, grainVolume);
  }

  static double porosityNumber(double vb, double vg) {
    if (vg > vb) {
      throw new IllegalArgumentException(
          "grain volume " + vg + " cm³ is more than the bulk volume " + vb);
    }
    return (vb - vg) / vb;
  }
}
