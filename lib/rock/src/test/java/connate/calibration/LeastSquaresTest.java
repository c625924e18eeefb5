package connate.calibration;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

class LeastSquaresTest {

  /**
   * Published: NIST Statistical Reference Datasets, Norris (linear, lower difficulty): certified
   * intercept -0.262323073774029 (SE 0.232818234301152), slope 1.00211681802045 (SE
   * 0.429796848199937E-03), residual standard deviation 0.884796396144373, R² 0.999993745883712.
   */
  @Test
  void norrisOfNist() {
    double[] x = {
      0.2, 337.4, 118.2, 884.6, 10.1, 226.5, 666.3, 996.3, 448.6, 777.0, 558.2, 0.4, 0.6, 775.5,
      666.9, 338.0, 447.5, 11.6, 556.0, 228.1, 995.8, 887.6, 120.2, 0.3, 0.3, 556.8, 339.1, 887.2,
      999.0, 779.0, 11.1, 118.3, 229.2, 669.1, 448.9, 0.5
    };
    double[] y = {
      0.1, 338.8, 118.1, 888.0, 9.2, 228.1, 668.5, 998.5, 449.1, 778.9, 559.2, 0.3, 0.1, 778.1,
      668.8, 339.3, 448.9, 10.8, 557.7, 228.3, 998.0, 888.8, 119.6, 0.3, 0.6, 557.6, 339.3, 888.0,
      998.5, 778.9, 10.2, 117.6, 228.9, 668.4, 449.2, 0.2
    };
    LeastSquares fit = LeastSquares.fit(List.of("x"), new double[][] {x}, y);
    assertDigits(-0.262323073774029, fit.coefficients()[0], 11);
    assertDigits(1.00211681802045, fit.coefficients()[1], 13);
    assertDigits(0.232818234301152, fit.standardErrors()[0], 12);
    assertDigits(0.429796848199937E-03, fit.standardErrors()[1], 12);
    assertDigits(0.884796396144373, fit.scatter(), 12);
    assertDigits(0.999993745883712, fit.rSquared(), 13);
  }

  /**
   * Published: NIST Statistical Reference Datasets, Longley (multilinear, higher difficulty):
   * certified coefficients and residual standard deviation 304.854073561965.
   */
  @Test
  void longleyOfNist() {
    double[] y = {
      60323, 61122, 60171, 61187, 63221, 63639, 64989, 63761, 66019, 67857, 68169, 66513, 68655,
      69564, 69331, 70551
    };
    double[][] x = {
      {
        83.0, 88.5, 88.2, 89.5, 96.2, 98.1, 99.0, 100.0, 101.2, 104.6, 108.4, 110.8, 112.6, 114.2,
        115.7, 116.9
      },
      {
        234289, 259426, 258054, 284599, 328975, 346999, 365385, 363112, 397469, 419180, 442769,
        444546, 482704, 502601, 518173, 554894
      },
      {
        2356, 2325, 3682, 3351, 2099, 1932, 1870, 3578, 2904, 2822, 2936, 4681, 3813, 3931, 4806,
        4007
      },
      {
        1590, 1456, 1616, 1650, 3099, 3594, 3547, 3350, 3048, 2857, 2798, 2637, 2552, 2514, 2572,
        2827
      },
      {
        107608, 108632, 109773, 110929, 112075, 113270, 115094, 116219, 117388, 118734, 120445,
        121950, 123366, 125368, 127852, 130081
      },
      {
        1947, 1948, 1949, 1950, 1951, 1952, 1953, 1954, 1955, 1956, 1957, 1958, 1959, 1960, 1961,
        1962
      }
    };
    LeastSquares fit = LeastSquares.fit(List.of("a", "b", "c", "d", "e", "f"), x, y);
    double[] certified = {
      -3482258.63459582,
      15.0618722713733,
      -0.358191792925910E-01,
      -2.02022980381683,
      -1.03322686717359,
      -0.511041056535807E-01,
      1829.15146461355
    };
    for (int i = 0; i < certified.length; i++) {
      assertDigits(certified[i], fit.coefficients()[i], 8);
    }
    assertDigits(304.854073561965, fit.scatter(), 10);
    assertDigits(0.995479004577296, fit.rSquared(), 10);
  }

  @Test
  void dependentColumnsAreRefused() {
    double[] x = {1, 2, 3, 4, 5};
    double[] twice = {2, 4, 6, 8, 10};
    var e =
        assertThrows(
            IllegalArgumentException.class,
            () -> LeastSquares.fit(List.of("x", "2x"), new double[][] {x, twice}, x));
    assertTrue(e.getMessage().contains("depend on each other"), e.getMessage());
  }

  @Test
  void tooFewRowsAreRefused() {
    assertThrows(
        IllegalArgumentException.class,
        () -> LeastSquares.fit(List.of("x"), new double[][] {{1, 2}}, new double[] {1, 2}));
  }

  /** By hand: the leave-one-out residual equals the one of a fit without the row. */
  @Test
  void leaveOneOutEqualsTheFitWithoutTheRow() {
    double[] x = {1, 2, 3, 4, 7};
    double[] y = {1.1, 1.9, 3.2, 4.1, 6.5};
    LeastSquares all = LeastSquares.fit(List.of("x"), new double[][] {x}, y);
    LeastSquares without =
        LeastSquares.fit(
            List.of("x"), new double[][] {{1, 2, 3, 4}}, new double[] {1.1, 1.9, 3.2, 4.1});
    assertEquals(6.5 - without.predict(7), all.leaveOneOut()[4], 1e-12);
  }

  private static void assertDigits(double expected, double found, int digits) {
    double matched = -StrictMath.log10(StrictMath.abs((found - expected) / expected) + 1e-17);
    assertTrue(matched >= digits, "matched " + matched + " of " + digits + " digits: " + found);
  }
}
