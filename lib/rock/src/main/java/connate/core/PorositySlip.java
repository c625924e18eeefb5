package connate.core;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Pressure;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Slip factors that depend on permeability and porosity.
 *
 * <pre>
 * Sampath–Keighin  b = 13.851 (k/φ)^−0.53
 * Florence         b = 43.345 (k/φ)^−0.5
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>b</td><td>slip factor</td><td>psi</td></tr>
 * <tr><td>k</td><td>liquid permeability</td><td>mD</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for nitrogen in tight gas sands.
 *
 * <p><b>Source</b>: Sampath and Keighin (1982), J. Pet. Technol. 34, 2715–2720; Florence and others
 * (2007), SPE 107954; constants from memory.
 *
 * <p><b>Checked</b> in {@code MoreCoreLawsTest}.
 */
public final class PorositySlip {

  /** The facts on Sampath and Keighin. */
  public static final MethodCard SAMPATH =
      MethodCard.named("sampath-keighin", "Sampath–Keighin slip factor")
          .equation("b = 13.851 (k/φ)^-0.53")
          .input("k", "liquid permeability", Units.mD, Range.POSITIVE)
          .input("φ", "porosity", Units.fraction, Range.above(0).to(1))
          .result("b", "slip factor", Units.psi)
          .source("Sampath and Keighin (1982), J. Pet. Technol. 34, 2715–2720")
          .constants(Constants.FROM_MEMORY)
          .topics("core", "gas slip")
          .note("Nitrogen, tight gas sands.")
          .build();

  /** The facts on Florence and others. */
  public static final MethodCard FLORENCE =
      MethodCard.named("florence", "Florence slip factor")
          .equation("b = 43.345 (k/φ)^-0.5")
          .input("k", "liquid permeability", Units.mD, Range.POSITIVE)
          .input("φ", "porosity", Units.fraction, Range.above(0).to(1))
          .result("b", "slip factor", Units.psi)
          .source("Florence and others (2007), SPE 107954")
          .constants(Constants.FROM_MEMORY)
          .topics("core", "gas slip")
          .note("Nitrogen.")
          .build();

  private static final Formula<Pressure> SAMPATH_FORMULA =
      Formula.of(SAMPATH, Units.psi, (k, phi) -> PorositySlip.sampathNumber(k, phi));

  private static final Formula<Pressure> FLORENCE_FORMULA =
      Formula.of(FLORENCE, Units.psi, (k, phi) -> PorositySlip.florenceNumber(k, phi));

  private PorositySlip() {}

  /** Returns the slip factor of one sample by Sampath and Keighin. */
  public static Pressure sampath(Permeability liquidPermeability, Fraction porosity) {
    return SAMPATH_FORMULA.value(liquidPermeability, porosity);
  }

  /** Returns the slip factor of each row by Sampath and Keighin. */
  public static Series sampath(Operand liquidPermeability, Operand porosity) {
    return SAMPATH_FORMULA.series(liquidPermeability, porosity);
  }

  static double sampathNumber(double k, double phi) {
    return 13.851 * StrictMath.pow(k / phi, -0.53);
  }

  /** Returns the slip factor of one sample by Florence and others. */
  public static Pressure florence(Permeability liquidPermeability, Fraction porosity) {
    return FLORENCE_FORMULA.value(liquidPermeability, porosity);
  }

  /** Returns the slip factor of each row by Florence and others. */
  public static Series florence(Operand liquidPermeability, Operand porosity) {
    return FLORENCE_FORMULA.series(liquidPermeability, porosity);
  }

  static double florenceNumber(double k, double phi) {
    return 43.345 * StrictMath.pow(k / phi, -0.5);
  }

  /** Returns the law of Sampath and Keighin for rock of one porosity, for a slip correction. */
  public static SlipLaw sampathLaw(Fraction porosity) {
    double phi = porosity.fraction();
    return new SlipLaw(SAMPATH, k -> sampathNumber(k, phi));
  }

  /** Returns the law of Florence and others for rock of one porosity, for a slip correction. */
  public static SlipLaw florenceLaw(Fraction porosity) {
    double phi = porosity.fraction();
    return new SlipLaw(FLORENCE, k -> florenceNumber(k, phi));
  }
}
