package connate.chance;

import connate.quantity.Quantity;
import connate.series.Listed;
import connate.series.Listing;
import java.util.Comparator;
import java.util.List;
import java.util.Map;

/**
 * How far each input alone moves a result: the input at the values that 90 % and 10 % exceed, all
 * others at their medians. Longest bar first.
 *
 * @param result the result's name
 * @param base the result with every input at its median
 * @param bars the inputs
 */
public record Tornado(String result, Quantity<?> base, List<Bar> bars) implements Listed {

  /**
   * One input's effect.
   *
   * @param input the input
   * @param atLow the result with the input at the value that 90 % exceed
   * @param atHigh the result with the input at the value that 10 % exceed
   */
  public record Bar(String input, Quantity<?> atLow, Quantity<?> atHigh) {

    double length() {
      return StrictMath.abs(atHigh.si() - atLow.si());
    }
  }

  /** Copies the list. */
  public Tornado {
    bars = List.copyOf(bars);
  }

  /** Moves each input of a simulation in turn and reads one result. */
  public static Tornado of(Runs runs, String result) {
    runs.get(result);
    Quantity<?> base = runs.at(Map.of()).values().get(result);
    List<Bar> bars =
        runs.inputs().stream()
            .map(
                input ->
                    new Bar(
                        input,
                        runs.at(Map.of(input, 0.1)).values().get(result),
                        runs.at(Map.of(input, 0.9)).values().get(result)))
            .sorted(Comparator.comparingDouble(Bar::length).reversed())
            .toList();
    return new Tornado(result, base, bars);
  }

  @Override
  public Listing listing() {
    Listing.Builder table =
        Listing.titled(result + ": one input at a time, " + base + " with all at their medians")
            .column("input")
            .column("at the value 90 % exceed", base.unit())
            .column("at the value 10 % exceed", base.unit());
    bars.forEach(bar -> table.row(bar.input(), bar.atLow(), bar.atHigh()));
    return table.build();
  }

  @Override
  public String toString() {
    return listing().toString();
  }
}
