package connate.chance;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.CholeskyDecomposition;
import org.apache.commons.math3.linear.NonPositiveDefiniteMatrixException;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * Where a realisation's probabilities come from. Each number depends on seed, run and the input's
 * name alone, so neither the order of asking nor the number of threads matters.
 */
final class Probabilities {

  private static final RandomGeneratorFactory<RandomGenerator> GENERATOR =
      RandomGeneratorFactory.of("L64X128MixRandom");
  private static final double ULP = 0x1.0p-53;

  private final Sampling sampling;
  private final int runs;
  private final Map<String, int[]> slices = new ConcurrentHashMap<>();
  private final List<String> joint;
  private final RealMatrix root;

  Probabilities(Sampling sampling, int runs) {
    this.sampling = sampling;
    this.runs = runs;
    Set<String> names = new LinkedHashSet<>();
    sampling.correlations().forEach(c -> names.addAll(List.of(c.first(), c.second())));
    this.joint = new ArrayList<>(names);
    this.root = joint.isEmpty() ? null : root(sampling, joint);
  }

  double of(int run, String name) {
    int row = joint.indexOf(name);
    if (row < 0) {
      return own(run, name);
    }
    double score = 0;
    for (int i = 0; i <= row; i++) {
      score += root.getEntry(row, i) * Distributions.standard(own(run, joint.get(i)));
    }
    return Math.min(1 - ULP, Math.max(ULP, Distributions.cumulative(score)));
  }

  private double own(int run, String name) {
    double u = uniform(sampling.seed(), run, name);
    if (!sampling.latinHypercube()) {
      return u;
    }
    return (slices.computeIfAbsent(name, this::shuffled)[run] + u) / runs;
  }

  /** Returns a number strictly between 0 and 1, by the mixing steps of SplitMix64. */
  static double uniform(long seed, int run, String name) {
    long bits = mix(mix(mix(seed) + run) + hash(name));
    return ((bits >>> 11) + 0.5) * ULP;
  }

  private static long mix(long value) {
    long z = value + 0x9e3779b97f4a7c15L;
    z = (z ^ (z >>> 30)) * 0xbf58476d1ce4e5b9L;
    z = (z ^ (z >>> 27)) * 0x94d049bb133111ebL;
    return z ^ (z >>> 31);
  }

  /** 64 bits of a name; {@code String.hashCode} gives «Aa» and «BB» the same. */
  private static long hash(String name) {
    long hash = 0xcbf29ce484222325L;
    for (int i = 0; i < name.length(); i++) {
      hash = (hash ^ name.charAt(i)) * 0x100000001b3L;
    }
    return hash;
  }

  private int[] shuffled(String name) {
    RandomGenerator random = GENERATOR.create(mix(sampling.seed()) + hash(name));
    int[] order = new int[runs];
    for (int i = 0; i < runs; i++) {
      int at = random.nextInt(i + 1);
      order[i] = order[at];
      order[at] = i;
    }
    return order;
  }

  private static RealMatrix root(Sampling sampling, List<String> names) {
    double[][] matrix = new double[names.size()][names.size()];
    for (int i = 0; i < matrix.length; i++) {
      matrix[i][i] = 1;
    }
    for (Sampling.Correlation c : sampling.correlations()) {
      int i = names.indexOf(c.first());
      int j = names.indexOf(c.second());
      matrix[i][j] = c.rho();
      matrix[j][i] = c.rho();
    }
    try {
      return new CholeskyDecomposition(new Array2DRowRealMatrix(matrix, false)).getL();
    } catch (NonPositiveDefiniteMatrixException e) {
      throw new IllegalArgumentException(
          "these correlations contradict each other: no inputs can go together so", e);
    }
  }
}
