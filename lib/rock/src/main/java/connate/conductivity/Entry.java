package connate.conductivity;

import connate.method.MethodCard;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

/**
 * A formula as the table of all asks it.
 *
 * @param card the card
 * @param metresPerSecond the conductivity of a sand
 * @param beyond what is outside the formula's range besides its own inputs, empty where nothing is
 */
record Entry(
    MethodCard card, ToDoubleFunction<Sand> metresPerSecond, Function<Sand, String> beyond) {

  /** Returns what is outside the formula's range, empty where nothing is. */
  String outside(Sand sand) {
    String range = Outside.both(Outside.inputs(card, sand), beyond.apply(sand));
    return Outside.both(range, Outside.clay(sand));
  }
}
