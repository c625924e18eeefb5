package connate.cementation;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Temperature;
import connate.quantity.ThermalGradient;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Temperature at a depth with a steady gradient.
 *
 * <pre>
 * T = Ts + G z
 * </pre>
 *
 * <p><b>Valid</b> for conductive heat flow and rock of one conductivity; 20 to 40 °C per km is
 * usual.
 *
 * <p><b>Source</b>: Fourier (1822), Théorie analytique de la chaleur.
 *
 * <p><b>Checked</b> in {@code GeothermTest}.
 */
public final class Geotherm {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("geotherm", "Temperature at depth")
          .equation("T = Ts + G z")
          .input("Ts", "temperature at the surface", Units.degC, Range.of(-20, 60))
          .valid(0, 30)
          .input("G", "gradient", Units.degCPerKm, Range.from(0))
          .valid(10, 60)
          .input("z", "depth", Units.km, Range.from(0))
          .valid(0, 10)
          .result("T", "temperature", Units.degC)
          .source("Fourier (1822), Théorie analytique de la chaleur")
          .constants(Constants.EXACT)
          .topics("temperature", "depth", "burial")
          .build();

  private static final Formula<Temperature> FORMULA =
      Formula.of(CARD, Units.degC, (surface, gradient, depth) -> celsius(surface, gradient, depth));

  private Geotherm() {}

  /** Returns the temperature of one value of each input. */
  public static Temperature of(Temperature surface, ThermalGradient gradient, Length depth) {
    return FORMULA.value(surface, gradient, depth);
  }

  /** Returns the temperature of each row. */
  public static Series of(Operand surface, Operand gradient, Operand depth) {
    return FORMULA.series(surface, gradient, depth);
  }

  static double celsius(double surface, double gradient, double depth) {
    return surface + gradient * depth;
  }
}
