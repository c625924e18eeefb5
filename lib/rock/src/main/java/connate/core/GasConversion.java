package connate.core;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Operand;
import connate.quantity.Pressure;
import connate.quantity.Units;
import connate.quantity.Viscosity;
import connate.series.Series;

/**
 * The slip factor of one gas from that of another.
 *
 * <pre>
 * b2 = b1 (μ2/μ1) √(M1/M2)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>b1, b2</td><td>slip factors</td><td>psi</td></tr>
 * <tr><td>μ</td><td>viscosity</td><td>cP</td></tr>
 * <tr><td>M</td><td>molar mass, g/mol</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> at one temperature.
 *
 * <p><b>Source</b>: kinetic theory, as in Klinkenberg (1941), API Drilling and Production Practice,
 * 200–213.
 *
 * <p><b>Checked</b> in {@code MoreCoreLawsTest}.
 */
public final class GasConversion {

  /** The facts on kinetic theory. */
  public static final MethodCard CARD =
      MethodCard.named("slip-gas-conversion", "Slip factor of another gas")
          .equation("b2 = b1 (μ2/μ1) √(M1/M2)")
          .input("b1", "slip factor", Units.psi, Range.POSITIVE)
          .input("μ1", "viscosity of the first gas", Units.cP, Range.POSITIVE)
          .input("M1", "molar mass of the first gas", Units.number, Range.POSITIVE)
          .input("μ2", "viscosity of the second gas", Units.cP, Range.POSITIVE)
          .input("M2", "molar mass of the second gas", Units.number, Range.POSITIVE)
          .result("b2", "slip factor of the second gas", Units.psi)
          .source(
              "kinetic theory; Klinkenberg (1941), API Drilling and Production Practice, 200–213")
          .constants(Constants.EXACT)
          .topics("core", "gas slip")
          .note("Helium slips more than nitrogen, carbon dioxide less.")
          .build();

  private static final Formula<Pressure> CARD_FORMULA =
      Formula.ofAny(
          CARD, Units.psi, in -> GasConversion.slipNumber(in[0], in[1], in[2], in[3], in[4]));

  private GasConversion() {}

  /** Returns the slip factor of the second gas of one sample by kinetic theory. */
  public static Pressure slip(
      Pressure slipFactor,
      Viscosity viscosityOfTheFirstGas,
      double molarMassOfTheFirstGas,
      Viscosity viscosityOfTheSecondGas,
      double molarMassOfTheSecondGas) {
    return CARD_FORMULA.value(
        slipFactor,
        viscosityOfTheFirstGas,
        Units.number(molarMassOfTheFirstGas),
        viscosityOfTheSecondGas,
        Units.number(molarMassOfTheSecondGas));
  }

  /** Returns the slip factor of the second gas of each row by kinetic theory. */
  public static Series slip(
      Operand slipFactor,
      Operand viscosityOfTheFirstGas,
      Operand molarMassOfTheFirstGas,
      Operand viscosityOfTheSecondGas,
      Operand molarMassOfTheSecondGas) {
    return CARD_FORMULA.series(
        slipFactor,
        viscosityOfTheFirstGas,
        molarMassOfTheFirstGas,
        viscosityOfTheSecondGas,
        molarMassOfTheSecondGas);
  }

  static double slipNumber(double b, double mu1, double m1, double mu2, double m2) {
    return b * mu2 / mu1 * StrictMath.sqrt(m1 / m2);
  }
}
