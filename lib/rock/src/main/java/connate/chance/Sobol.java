package connate.chance;

import connate.quantity.Quantity;
import connate.series.Listed;
import connate.series.Listing;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Sobol indices: the part of a result's variance that each input explains alone (first order) and
 * with all its interactions (total), by paired samples.
 *
 * <pre>
 * S_i  = mean(f(B) (f(A with column i of B) − f(A))) / Var
 * ST_i = mean((f(A) − f(A with column i of B))²) / (2 Var)
 * </pre>
 *
 * <p><b>Source</b>: Saltelli and others (2010), Comput. Phys. Commun. 181, 259–270, table 2, rows b
 * and f (the latter after Jansen 1999). Inputs must be independent.
 *
 * @param result the result's name
 * @param runs the number of pairs
 * @param inputs the indices of each input
 */
public record Sobol(String result, int runs, List<Index> inputs) implements Listed {

  /**
   * The indices of one input.
   *
   * @param input the input
   * @param first the part of the variance that it explains alone
   * @param total the part that is lost when everything else is known
   */
  public record Index(String input, double first, double total) {}

  /** Copies the list. */
  public Sobol {
    inputs = List.copyOf(inputs);
  }

  /**
   * Computes the indices of a simulation's inputs for one result.
   *
   * @param runs the simulation, whose calculation is run (inputs + 2) × pairs times
   * @param result the result's name
   * @param pairs the number of paired samples, some thousands for two digits
   * @param seed the seed of the pairs
   */
  public static Sobol of(Runs runs, String result, int pairs, long seed) {
    runs.get(result);
    List<String> names = runs.inputs();
    double[] a = new double[pairs];
    double[] b = new double[pairs];
    double[][] mixed = new double[names.size()][pairs];
    for (int row = 0; row < pairs; row++) {
      Map<String, Double> first = probabilities(names, seed, 2 * row);
      Map<String, Double> second = probabilities(names, seed, 2 * row + 1);
      a[row] = value(runs, result, first);
      b[row] = value(runs, result, second);
      for (int i = 0; i < names.size(); i++) {
        Map<String, Double> swapped = new HashMap<>(first);
        swapped.put(names.get(i), second.get(names.get(i)));
        mixed[i][row] = value(runs, result, swapped);
      }
    }
    return indices(result, names, a, b, mixed);
  }

  private static Sobol indices(
      String result, List<String> names, double[] a, double[] b, double[][] mixed) {
    double variance = variance(a, b);
    if (!(variance > 0)) {
      throw new IllegalArgumentException("«" + result + "» does not vary: no input explains it");
    }
    double mean = mean(a, b);
    Index[] out = new Index[names.size()];
    for (int i = 0; i < out.length; i++) {
      double first = 0;
      double total = 0;
      for (int row = 0; row < a.length; row++) {
        first += (b[row] - mean) * (mixed[i][row] - a[row]);
        total += (a[row] - mixed[i][row]) * (a[row] - mixed[i][row]);
      }
      out[i] =
          new Index(names.get(i), first / a.length / variance, total / (2 * a.length) / variance);
    }
    return new Sobol(result, a.length, List.of(out));
  }

  private static Map<String, Double> probabilities(List<String> names, long seed, int row) {
    Map<String, Double> out = new HashMap<>();
    names.forEach(name -> out.put(name, Probabilities.uniform(seed, row, name)));
    return out;
  }

  private static double value(Runs runs, String result, Map<String, Double> at) {
    Quantity<?> value = runs.at(at).values().get(result);
    return value.si();
  }

  private static double mean(double[] a, double[] b) {
    double sum = 0;
    for (int row = 0; row < a.length; row++) {
      sum += a[row] + b[row];
    }
    return sum / (2 * a.length);
  }

  private static double variance(double[] a, double[] b) {
    double mean = mean(a, b);
    double sum = 0;
    for (int row = 0; row < a.length; row++) {
      sum += (a[row] - mean) * (a[row] - mean) + (b[row] - mean) * (b[row] - mean);
    }
    return sum / (2 * a.length - 1);
  }

  @Override
  public Listing listing() {
    Listing.Builder table =
        Listing.titled(result + ": part of the variance by input, " + runs + " pairs")
            .column("input")
            .column("alone")
            .column("with interactions");
    inputs.forEach(i -> table.row(i.input(), i.first(), i.total()));
    return table.build();
  }

  @Override
  public String toString() {
    return listing().toString();
  }
}
