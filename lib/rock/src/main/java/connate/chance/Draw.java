package connate.chance;

import connate.quantity.Quantity;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.ToDoubleFunction;

/**
 * One realisation: hands out a value for each uncertain input by its name. The same name gives the
 * same probability however often and in whichever order it is asked.
 */
public final class Draw {

  private final int run;
  private final ToDoubleFunction<String> probability;
  private final Map<String, Double> drawn = new LinkedHashMap<>();
  private final Map<String, Distribution> laws = new LinkedHashMap<>();

  Draw(int run, ToDoubleFunction<String> probability) {
    this.run = run;
    this.probability = probability;
  }

  /** Returns the number of this realisation, from 0. */
  public int run() {
    return run;
  }

  /** Returns this realisation's number for an input. */
  public double of(String name, Distribution law) {
    laws.put(name, law);
    return drawn.computeIfAbsent(name, n -> law.quantile(probability.applyAsDouble(n)));
  }

  /** Returns this realisation's quantity for an input. */
  public <Q extends Quantity<Q>> Q of(String name, Uncertain<Q> uncertain) {
    return uncertain.unit().of(of(name, uncertain.law()));
  }

  /** Returns a standard normal score, such as for the scatter about a transform. */
  public double score(String name) {
    return of(name, SCORE);
  }

  Map<String, Double> drawn() {
    return drawn;
  }

  Map<String, Distribution> laws() {
    return laws;
  }

  private static final Distribution SCORE =
      new Distribution() {
        @Override
        public double quantile(double p) {
          return Distributions.standard(p);
        }

        @Override
        public double mean() {
          return 0;
        }

        @Override
        public String words() {
          return "standard normal";
        }
      };
}
