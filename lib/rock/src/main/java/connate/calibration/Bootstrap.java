package connate.calibration;

import connate.chance.Quantiles;
import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.quantity.Units;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import java.util.function.ToDoubleFunction;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import org.apache.commons.math3.distribution.NormalDistribution;

/**
 * The bootstrap: how far a statistic would move if the samples had been drawn again.
 *
 * <pre>
 * percentile:  quantiles α and 1 − α of the replicates
 * BCa:         quantiles Φ(z0 + (z0 + z) / (1 − a (z0 + z))) at z = Φ⁻¹(α), Φ⁻¹(1 − α)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>z0</td><td>bias: normal score of the part of replicates below the estimate</td><td>1</td></tr>
 * <tr><td>a</td><td>acceleration, from the values with each sample left out</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for independent samples. Plugs of one core are not: draw whole cores with {@link
 * #ofGroups}.
 *
 * <p><b>Source</b>: Efron (1987), J. Am. Stat. Assoc. 82, 171–185; Efron and Tibshirani (1993), An
 * Introduction to the Bootstrap, chapter 14.
 *
 * <p><b>Checked</b> in {@code BootstrapTest}.
 */
public final class Bootstrap {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("bootstrap", "Bootstrap interval")
          .equation("BCa: quantiles Φ(z0 + (z0 + z) / (1 - a (z0 + z))) of the replicates")
          .input("B", "number of replicates", Units.number)
          .source(
              "Efron (1987), J. Am. Stat. Assoc. 82, 171–185; Efron and Tibshirani (1993), ch. 14")
          .constants(Constants.EXACT)
          .topics("uncertainty", "calibration", "interval")
          .note("For independent samples; draw whole cores where plugs share one.")
          .build();

  private static final NormalDistribution STANDARD = new NormalDistribution(null, 0, 1);
  private static final RandomGeneratorFactory<RandomGenerator> GENERATOR =
      RandomGeneratorFactory.of("L64X128MixRandom");

  private final double estimate;
  private final double[] replicates;
  private final double acceleration;

  private Bootstrap(double estimate, double[] replicates, double acceleration) {
    this.estimate = estimate;
    this.replicates = replicates;
    this.acceleration = acceleration;
  }

  /**
   * Draws samples again, one by one.
   *
   * @param values the samples
   * @param statistic what is computed of them
   * @param replicates the number of draws, some thousands
   * @param seed the seed
   */
  public static Bootstrap of(
      double[] values, ToDoubleFunction<double[]> statistic, int replicates, long seed) {
    List<double[]> groups = Arrays.stream(values).mapToObj(v -> new double[] {v}).toList();
    return ofGroups(groups, statistic, replicates, seed);
  }

  /** Draws whole groups again, such as the plugs of a core. */
  public static Bootstrap ofGroups(
      List<double[]> groups, ToDoubleFunction<double[]> statistic, int replicates, long seed) {
    Objects.requireNonNull(statistic, "statistic");
    if (groups.size() < 2 || replicates < 100) {
      throw new IllegalArgumentException(
          "a bootstrap needs at least two samples and 100 replicates, found "
              + groups.size()
              + " and "
              + replicates);
    }
    Listening.used(CARD);
    RandomGenerator random = GENERATOR.create(seed);
    double[] out = new double[replicates];
    double[][] drawn = new double[groups.size()][];
    for (int i = 0; i < replicates; i++) {
      for (int g = 0; g < drawn.length; g++) {
        drawn[g] = groups.get(random.nextInt(drawn.length));
      }
      out[i] = statistic.applyAsDouble(joined(drawn));
    }
    Arrays.sort(out);
    double[][] all = groups.toArray(new double[0][]);
    return new Bootstrap(statistic.applyAsDouble(joined(all)), out, acceleration(all, statistic));
  }

  /** Returns the statistic of the samples as they are. */
  public double estimate() {
    return estimate;
  }

  /** Returns the standard deviation of the replicates. */
  public double standardError() {
    double mean = Arrays.stream(replicates).average().orElseThrow();
    double sum = Arrays.stream(replicates).map(v -> (v - mean) * (v - mean)).sum();
    return StrictMath.sqrt(sum / (replicates.length - 1));
  }

  /** Returns the normal score of the part of the replicates below the estimate, ties halved. */
  public double bias() {
    double below = 0;
    for (double v : replicates) {
      below += v < estimate ? 1 : v == estimate ? 0.5 : 0;
    }
    return STANDARD.inverseCumulativeProbability(below / replicates.length);
  }

  /** Returns the acceleration. */
  public double acceleration() {
    return acceleration;
  }

  /** Returns the percentile interval that holds the given part. */
  public Interval percentile(double level) {
    return interval(level, tail(level), 1 - tail(level));
  }

  /** Returns the bias-corrected and accelerated interval that holds the given part. */
  public Interval bca(double level) {
    double alpha = tail(level);
    return interval(level, corrected(alpha), corrected(1 - alpha));
  }

  /**
   * Two ends.
   *
   * @param low the low end
   * @param high the high end
   * @param level the part that the interval is meant to hold
   */
  public record Interval(double low, double high, double level) {}

  private Interval interval(double level, double low, double high) {
    return new Interval(Quantiles.of(replicates, low), Quantiles.of(replicates, high), level);
  }

  private double corrected(double alpha) {
    double z0 = bias();
    double z = z0 + STANDARD.inverseCumulativeProbability(alpha);
    return STANDARD.cumulativeProbability(z0 + z / (1 - acceleration * z));
  }

  private static double tail(double level) {
    if (!(level > 0 && level < 1)) {
      throw new IllegalArgumentException("a level is between 0 and 1, found " + level);
    }
    return (1 - level) / 2;
  }

  /** Σ (mean − θ(i))³ / (6 (Σ (mean − θ(i))²)^1.5) over the values with sample i left out. */
  private static double acceleration(double[][] groups, ToDoubleFunction<double[]> statistic) {
    double[] without = new double[groups.length];
    double mean = 0;
    for (int i = 0; i < groups.length; i++) {
      double[][] rest = new double[groups.length - 1][];
      System.arraycopy(groups, 0, rest, 0, i);
      System.arraycopy(groups, i + 1, rest, i, groups.length - 1 - i);
      without[i] = statistic.applyAsDouble(joined(rest));
      mean += without[i] / groups.length;
    }
    double squares = 0;
    double cubes = 0;
    for (double value : without) {
      double d = mean - value;
      squares += d * d;
      cubes += d * d * d;
    }
    return squares == 0 ? 0 : cubes / (6 * StrictMath.pow(squares, 1.5));
  }

  private static double[] joined(double[][] parts) {
    int length = 0;
    for (double[] part : parts) {
      length += part.length;
    }
    double[] out = new double[length];
    int at = 0;
    for (double[] part : parts) {
      System.arraycopy(part, 0, out, at, part.length);
      at += part.length;
    }
    return out;
  }
}
