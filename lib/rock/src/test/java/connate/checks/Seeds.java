package connate.checks;

import java.util.Random;

/** Seeded randomness for property tests: prints its seed and takes it back with -Dseed. */
public final class Seeds {

  private Seeds() {}

  /** Returns a generator whose seed is printed under the name of a test. */
  public static Random random(String test) {
    long seed = Long.getLong("seed", 20_240_607L);
    System.out.println(test + ": -Dseed=" + seed);
    return new Random(seed);
  }

  /** Returns a number between two ends. */
  public static double between(Random random, double low, double high) {
    return low + random.nextDouble() * (high - low);
  }
}
