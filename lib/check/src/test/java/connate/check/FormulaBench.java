package connate.check;

import static connate.quantity.Units.percent;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.permeability.Timur;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Locale;
import org.junit.jupiter.api.Test;

/**
 * A closed-form transform over ten million samples, through the adapter and as a plain loop over
 * doubles. Run by name: {@code mvn -o -Dfast -pl lib/check -am test -Dtest=FormulaBench
 * -Dsurefire.failIfNoSpecifiedTests=false}.
 */
class FormulaBench {

  private static final int N = 10_000_000;

  @Test
  void columnAgainstPlainLoop() {
    double[] phi = new double[N];
    for (int i = 0; i < N; i++) {
      phi[i] = 5 + i % 30;
    }
    Series column = Series.over("phi", Units.percent, phi, null);
    double plain = Double.MAX_VALUE;
    double adapter = Double.MAX_VALUE;
    double check = 0;
    for (int round = 0; round < 5; round++) {
      long start = System.nanoTime();
      double[] out = new double[N];
      for (int i = 0; i < N; i++) {
        out[i] = 0.136 * StrictMath.pow(phi[i], 4.4) / (25.0 * 25.0);
      }
      plain = Math.min(plain, (System.nanoTime() - start) / 1e6);
      start = System.nanoTime();
      Series k = Timur.of(column, percent(25));
      adapter = Math.min(adapter, (System.nanoTime() - start) / 1e6);
      check += out[N - 1] - k.value(N - 1);
    }
    String line =
        String.format(
            Locale.ROOT,
            "Timur over %,d samples: plain loop %.0f ms, adapter %.0f ms, speed ratio %.2f (bound 0.33), difference %.1e",
            N,
            plain,
            adapter,
            plain / adapter,
            check);
    assertTrue(plain / adapter >= 1.0 / 3, line);
    org.junit.jupiter.api.Assertions.assertEquals(0, check, 1e-6);
    System.err.println(line);
  }
}
