package connate.logs;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Porosity from neutron and density together.
 *
 * <pre>
 * liquid  φ = (φN + φD) / 2
 * gas     φ = √((φN² + φD²) / 2)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>φN, φD</td><td>neutron and density porosity in the same matrix</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> both logs must be in units of one matrix; a neutron log in limestone units with a
 * sandstone density is the common slip.
 *
 * <p><b>Source</b>: common practice of log analysis, from memory.
 *
 * <p><b>Checked</b> in {@code LogLawsTest}.
 */
public final class NeutronDensity {

  /** The facts on the mean. */
  public static final MethodCard LIQUID =
      MethodCard.named("neutron-density-liquid", "Neutron-density porosity, liquid")
          .equation("φ = (φN + φD) / 2")
          .input("φN", "neutron porosity", Units.fraction)
          .input("φD", "density porosity", Units.fraction)
          .result("φ", "neutron-density porosity", Units.fraction)
          .source("common practice")
          .constants(Constants.FROM_MEMORY)
          .topics("porosity", "logs", "neutron", "density")
          .note("Both in units of one matrix.")
          .build();

  /** The facts on the root mean square. */
  public static final MethodCard GAS =
      MethodCard.named("neutron-density-gas", "Neutron-density porosity, gas")
          .equation("φ = √((φN² + φD²) / 2)")
          .input("φN", "neutron porosity", Units.fraction)
          .input("φD", "density porosity", Units.fraction)
          .result("φ", "neutron-density porosity", Units.fraction)
          .source("common practice")
          .constants(Constants.FROM_MEMORY)
          .topics("porosity", "logs", "neutron", "density", "gas")
          .note("Both in units of one matrix.")
          .build();

  private static final Formula<Fraction> LIQUID_FORMULA =
      Formula.of(LIQUID, Units.fraction, (n, d) -> NeutronDensity.liquidNumber(n, d));

  private static final Formula<Fraction> GAS_FORMULA =
      Formula.of(GAS, Units.fraction, (n, d) -> NeutronDensity.gasNumber(n, d));

  private NeutronDensity() {}

  /** Returns the neutron-density porosity of one sample by the mean. */
  public static Fraction liquid(Fraction neutronPorosity, Fraction densityPorosity) {
    return LIQUID_FORMULA.value(neutronPorosity, densityPorosity);
  }

  /** Returns the neutron-density porosity of each row by the mean. */
  public static Series liquid(Operand neutronPorosity, Operand densityPorosity) {
    return LIQUID_FORMULA.series(neutronPorosity, densityPorosity);
  }

  static double liquidNumber(double n, double d) {
    return (n + d) / 2;
  }

  /** Returns the neutron-density porosity of one sample by the root mean square. */
  public static Fraction gas(Fraction neutronPorosity, Fraction densityPorosity) {
    return GAS_FORMULA.value(neutronPorosity, densityPorosity);
  }

  /** Returns the neutron-density porosity of each row by the root mean square. */
  public static Series gas(Operand neutronPorosity, Operand densityPorosity) {
    return GAS_FORMULA.series(neutronPorosity, densityPorosity);
  }

  static double gasNumber(double n, double d) {
    return StrictMath.sqrt((n * n + d * d) / 2);
  }
}
