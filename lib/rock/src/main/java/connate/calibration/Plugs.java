package connate.calibration;

import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;

/** Porosity and permeability of the same plugs, ready for a fit of log10 k. */
final class Plugs {

  /** Caution: plugs that a fit had to leave out. */
  static final String DROPPED = "C01";

  /** The smallest number of plugs that a line with an error can be drawn through. */
  static final int FEWEST = 3;

  private final int total;
  private final int zeros;
  private final int[] rows;
  private final double[] porosity;
  private final double[] logK;

  private Plugs(int total, int zeros, int[] rows, double[] porosity, double[] logK) {
    this.total = total;
    this.zeros = zeros;
    this.rows = rows;
    this.porosity = porosity;
    this.logK = logK;
  }

  static Plugs of(Series porosity, Series permeability, DoubleUnaryOperator regressor) {
    refuseMixed(porosity, permeability);
    double[] phi = porosity.in(Units.fraction);
    double[] k = permeability.in(Units.mD);
    if (phi.length != k.length) {
      throw new IllegalArgumentException(
          "«"
              + porosity.name()
              + "» has "
              + phi.length
              + " rows, «"
              + permeability.name()
              + "» "
              + k.length
              + ": take both from one table");
    }
    int[] used = new int[phi.length];
    int count = 0;
    int zeros = 0;
    for (int row = 0; row < phi.length; row++) {
      if (k[row] <= 0) {
        zeros++;
      } else if (k[row] > 0 && Double.isFinite(regressor.applyAsDouble(phi[row]))) {
        used[count++] = row;
      }
    }
    return new Plugs(phi.length, zeros, Arrays.copyOf(used, count), phi, k).checked(porosity);
  }

  private Plugs checked(Series porosity) {
    if (rows.length < FEWEST) {
      throw new IllegalArgumentException(
          "a fit needs at least "
              + FEWEST
              + " plugs with porosity and permeability; of "
              + total
              + " rows "
              + rows.length
              + " have both");
    }
    double[] phi = new double[rows.length];
    double[] log = new double[rows.length];
    for (int i = 0; i < rows.length; i++) {
      phi[i] = this.porosity[rows[i]];
      log[i] = StrictMath.log10(logK[rows[i]]);
      if (!(phi[i] >= 0 && phi[i] <= 1)) {
        throw new IllegalArgumentException(
            "«"
                + porosity.name()
                + "» holds the porosity "
                + phi[i]
                + " in row "
                + (rows[i] + 1)
                + ": in percent? name the unit in the header: "
                + porosity.name()
                + " [%]");
      }
    }
    return new Plugs(total, zeros, rows, phi, log);
  }

  /** A porosity under no stress does not belong to a permeability under stress, nor the reverse. */
  private static void refuseMixed(Series porosity, Series permeability) {
    String of = porosity.traits().get(Series.STRESS);
    String and = permeability.traits().get(Series.STRESS);
    if (of != null && and != null && !of.equals(and)) {
      throw new IllegalArgumentException(
          "«"
              + porosity.name()
              + "» is "
              + of
              + ", «"
              + permeability.name()
              + "» "
              + and
              + ": correct both to the same stress before the fit");
    }
  }

  /** Tells how many plugs a fit left out, where it left out any. */
  void tellDropped(String about) {
    if (rows.length < total) {
      Listening.caution(Caution.of(DROPPED, about, "the fit uses " + count()));
    }
  }

  /** Returns how many plugs count, and why the others do not. */
  String count() {
    if (rows.length == total) {
      return "n " + total;
    }
    int blank = total - rows.length - zeros;
    String why = zeros > 0 ? zeros + (zeros == 1 ? " zero" : " zeros") : "";
    why += zeros > 0 && blank > 0 ? ", " : "";
    why += blank > 0 ? blank + (blank == 1 ? " blank" : " blanks") : "";
    return "n " + rows.length + " of " + total + " (" + why + ")";
  }

  int size() {
    return rows.length;
  }

  int total() {
    return total;
  }

  int row(int i) {
    return rows[i];
  }

  double porosity(int i) {
    return porosity[i];
  }

  double logK(int i) {
    return logK[i];
  }

  double[] logK() {
    return logK.clone();
  }

  double smallestPorosity() {
    return Arrays.stream(porosity).min().orElseThrow();
  }

  double largestPorosity() {
    return Arrays.stream(porosity).max().orElseThrow();
  }

  double[] regressor(DoubleUnaryOperator function) {
    return Arrays.stream(porosity).map(function).toArray();
  }

  /** Returns the plugs whose place in this selection is chosen. */
  Plugs some(int... chosen) {
    return new Plugs(
        chosen.length,
        0,
        Arrays.stream(chosen).map(i -> rows[i]).toArray(),
        Arrays.stream(chosen).mapToDouble(i -> porosity[i]).toArray(),
        Arrays.stream(chosen).mapToDouble(i -> logK[i]).toArray());
  }
}
