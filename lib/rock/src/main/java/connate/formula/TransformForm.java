package connate.formula;

import connate.method.MethodCard;
import java.util.function.DoubleUnaryOperator;

/**
 * The shape of a permeability transform that is calibrated to core: log10 k = a + b g(φ).
 *
 * @param card what the method states of itself
 * @param regressor g as text, such as {@code φ} or {@code log10 φ}
 * @param function g of the porosity as a fraction; not finite where the form has no value
 * @param slopeFree whether b is fitted; else it is 1 and only a is
 */
public record TransformForm(
    MethodCard card, String regressor, DoubleUnaryOperator function, boolean slopeFree) {

  /** Returns the name of the form. */
  public String name() {
    return card.title();
  }
}
