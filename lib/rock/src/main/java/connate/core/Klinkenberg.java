package connate.core;

import connate.fault.NoConvergence;
import connate.formula.Formula;
import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Pressure;
import connate.quantity.Units;
import connate.series.Series;

/**
 * The permeability to liquid from one to gas: gas slips along the pore walls, the more the lower
 * its pressure.
 *
 * <pre>k_g = k (1 + b / P)</pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k_g</td><td>gas permeability</td><td>mD</td></tr>
 * <tr><td>k</td><td>liquid permeability</td><td>mD</td></tr>
 * <tr><td>b</td><td>slip factor, from a law such as that of Jones and Owens</td><td>psi</td></tr>
 * <tr><td>P</td><td>mean pressure, absolute</td><td>psi</td></tr>
 * </table>
 *
 * <p><b>Valid</b> above some 0.001 mD; in tighter rock slip is of second order. The slip laws take
 * the liquid permeability, so the equation is solved for it. The pressure is absolute: a gauge
 * pressure overcorrects.
 *
 * <p><b>Source</b>: Klinkenberg (1941), API Drilling and Production Practice, 200–213; example in
 * Ahmed, Reservoir Engineering Handbook.
 *
 * <p><b>Checked</b> in {@code KlinkenbergTest}.
 */
public final class Klinkenberg {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("klinkenberg", "Klinkenberg")
          .equation("k_g = k (1 + b / P), solved for k")
          .input("k_g", "gas permeability", Units.mD, Range.from(0))
          .valid(Range.from(0.001))
          .input("P", "mean pressure", Units.psi, Range.POSITIVE)
          .result("k", "liquid permeability", Units.mD)
          .source("Klinkenberg (1941), API Drilling and Production Practice, 200–213")
          .constants(Constants.EXACT)
          .topics("core", "gas slip", "permeability")
          .note("The mean pressure is absolute, the mean of both ends of the plug.")
          .note("Below some 0.001 mD slip is of second order and the law fails.")
          .build();

  private static final int STEPS = 200;
  private static final double SETTLED = 1e-12;

  private Klinkenberg() {}

  /** Returns the liquid permeability of one plug. */
  public static Permeability liquid(Permeability gas, Pressure meanPressure, SlipLaw law) {
    Listening.used(law.card());
    return formula(law).value(gas, meanPressure);
  }

  /** Returns the liquid permeability of each row; it carries the trait {@code fluid = liquid}. */
  public static Series liquid(Operand gas, Operand meanPressure, SlipLaw law) {
    if (gas instanceof Series k && !k.traits().getOrDefault(Series.FLUID, "air").equals("air")) {
      throw new IllegalArgumentException(
          "«"
              + k.name()
              + "» is "
              + k.traits().get(Series.FLUID)
              + " permeability already: a gas slip correction would be made twice");
    }
    Listening.used(law.card());
    return formula(law).series(gas, meanPressure).with(Series.FLUID, "liquid");
  }

  private static Formula<Permeability> formula(SlipLaw law) {
    return Formula.of(CARD, Units.mD, (gas, pressure) -> solve(gas, pressure, law));
  }

  /** By Newton steps in ln k: k (1 + b(k)/P) rises with k, so there is one root. */
  private static double solve(double gas, double pressure, SlipLaw law) {
    if (!(gas > 0)) {
      return gas;
    }
    double k = gas;
    double step = Double.NaN;
    for (int i = 0; i < STEPS; i++) {
      double f = k * (1 + law.psi().applyAsDouble(k) / pressure);
      double more = k * (1 + 1e-6);
      double slope =
          (StrictMath.log(more * (1 + law.psi().applyAsDouble(more) / pressure))
                  - StrictMath.log(f))
              / StrictMath.log1p(1e-6);
      step = (StrictMath.log(gas) - StrictMath.log(f)) / slope;
      k *= StrictMath.exp(StrictMath.max(-2, StrictMath.min(2, step)));
      if (StrictMath.abs(step) < SETTLED) {
        return k;
      }
    }
    throw new NoConvergence("the slip correction of " + gas + " mD", STEPS, step, k);
  }
}
