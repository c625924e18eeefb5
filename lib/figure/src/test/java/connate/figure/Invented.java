package connate.figure;

import connate.quantity.Units;
import connate.series.Labels;
import connate.series.Series;
import java.util.SplittableRandom;

/** Invented columns to draw. */
final class Invented {

  private Invented() {}

  static Series uniform(String name, int n, double low, double high, long seed) {
    SplittableRandom random = new SplittableRandom(seed);
    double[] values = new double[n];
    for (int i = 0; i < n; i++) {
      values[i] = low + (high - low) * random.nextDouble();
    }
    return Series.of(name, Units.fraction, values).atDepth(depth(n, 2000, 0.5));
  }

  static Series porosity(int n) {
    return uniform("porosity", n, 0.05, 0.30, 7);
  }

  /** Permeability that rises 15 decades per unit of porosity, with scatter. */
  static Series permeability(int n) {
    double[] phi = porosity(n).values();
    SplittableRandom random = new SplittableRandom(8);
    double[] k = new double[n];
    for (int i = 0; i < n; i++) {
      k[i] = StrictMath.pow(10, 15 * phi[i] - 2 + 0.4 * random.nextGaussian());
    }
    return Series.of("k", Units.mD, k).atDepth(depth(n, 2000, 0.5));
  }

  static Series depth(int n, double top, double step) {
    double[] values = new double[n];
    for (int i = 0; i < n; i++) {
      values[i] = top + i * step;
    }
    return Series.of("depth", Units.m, values);
  }

  static Labels facies(int n, String... names) {
    String[] words = new String[n];
    for (int i = 0; i < n; i++) {
      words[i] = names[i % names.length];
    }
    return Labels.of("facies", words);
  }
}
