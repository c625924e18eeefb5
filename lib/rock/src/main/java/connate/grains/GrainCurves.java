package connate.grains;

import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/**
 * Many grain-size curves: one in each row of a table whose column heads are size classes, such as
 * {@code 63-75 µm}, {@code F0_01-0_1}, {@code 0-2_micron} or {@code <63 µm}.
 */
public final class GrainCurves implements Listed {

  /** Caution: percentiles fall into an open-ended class. */
  static final String OPEN = "M10";

  private static final double SAME = 1e-9;
  private static final int SHOWN = 10;

  private final GrainCurve[] curves;
  private final Series like;

  private GrainCurves(GrainCurve[] curves, Series like) {
    this.curves = curves;
    this.like = like;
  }

  /**
   * Returns the curves of a table's columns; columns whose head is no size class are left aside.
   *
   * @param columns the columns, in any order, whose heads name the unit of size
   * @throws IllegalArgumentException if fewer than two are size classes, a head has no unit, or the
   *     classes leave a gap or overlap
   */
  public static GrainCurves of(Iterable<? extends Series> columns) {
    return of(columns, Optional.empty(), false);
  }

  /** Returns the curves of a table's columns, with the unit of size where a head names none. */
  public static GrainCurves of(Iterable<? extends Series> columns, Unit<Length> unit) {
    return of(columns, Optional.of(unit), false);
  }

  /** Returns the curves of columns that hold masses, which may add up to anything. */
  public static GrainCurves ofMasses(Iterable<? extends Series> columns, Unit<Length> unit) {
    return of(columns, Optional.of(unit), true);
  }

  /** Returns curves of their own as one set. */
  public static GrainCurves of(GrainCurve... curves) {
    if (curves.length == 0) {
      throw new IllegalArgumentException("at least one curve is needed");
    }
    return new GrainCurves(curves.clone(), null);
  }

  /** Returns the number of rows. */
  public int size() {
    return curves.length;
  }

  /**
   * Returns the curve of a row.
   *
   * @throws IllegalArgumentException if the row has none
   */
  public GrainCurve curve(int row) {
    if (curves[row] == null) {
      throw new IllegalArgumentException("row " + (row + 1) + " has no grain-size curve");
    }
    return curves[row];
  }

  /** Returns the number of rows that have a curve. */
  public int count() {
    return (int) Arrays.stream(curves).filter(c -> c != null).count();
  }

  /** Returns the curves with another way between the limits. */
  public GrainCurves with(Between way) {
    return each(c -> c.with(way));
  }

  /** Returns the curves with a stated fine end of their pan. */
  public GrainCurves withFinest(Length finest) {
    return each(c -> c.withFinest(finest));
  }

  /** Returns the curves with a stated coarse end. */
  public GrainCurves withCoarsest(Length coarsest) {
    return each(c -> c.withCoarsest(coarsest));
  }

  /**
   * Returns the size of each row than which the given percentage is finer; missing where it falls
   * into an open-ended class.
   */
  public Series d(double percentFiner) {
    String name = "d" + connate.quantity.Numbers.text(percentFiner);
    return map(name, Units.mm, c -> c.sizeMm(percentFiner));
  }

  /** Returns the phi value of each row than which the given percentage is coarser. */
  public Series phi(double percentCoarser) {
    String name = "phi" + connate.quantity.Numbers.text(percentCoarser);
    return map(name, Units.number, c -> c.phiCoarser(percentCoarser));
  }

  /** Returns the weight finer than a size, of each row. */
  public Series finer(Length size) {
    double mm = size.in(Units.mm);
    return map("finer than " + size, Units.percent, c -> c.y(mm));
  }

  /** Returns a number of each curve as a column; rows for which it is NaN are told of. */
  Series map(String name, Unit<?> unit, ToDoubleFunction<GrainCurve> number) {
    double[] out = new double[curves.length];
    int open = 0;
    for (int row = 0; row < out.length; row++) {
      out[row] = curves[row] == null ? Double.NaN : number.applyAsDouble(curves[row]);
      open += curves[row] != null && Double.isNaN(out[row]) ? 1 : 0;
    }
    if (open > 0) {
      Listening.caution(
          Caution.of(
              OPEN,
              name,
              String.format(
                  Locale.ROOT,
                  "%s of %d of %d curves falls into an open-ended class and is missing; state the"
                      + " end with withFinest or withCoarsest",
                  name,
                  open,
                  count())));
    }
    return Series.over(name, unit, out, like);
  }

  private GrainCurves each(java.util.function.UnaryOperator<GrainCurve> change) {
    GrainCurve[] changed = new GrainCurve[curves.length];
    for (int row = 0; row < changed.length; row++) {
      changed[row] = curves[row] == null ? null : change.apply(curves[row]);
    }
    return new GrainCurves(changed, like);
  }

  private record Column(SizeClass size, Series series, double[] weights) {}

  private static GrainCurves of(
      Iterable<? extends Series> all, Optional<Unit<Length>> unit, boolean masses) {
    List<Column> columns = new ArrayList<>();
    for (Series series : all) {
      if (SizeClass.isHeader(series.name())) {
        columns.add(column(series, unit));
      }
    }
    if (columns.size() < 2) {
      throw new IllegalArgumentException(
          "found "
              + columns.size()
              + " columns with a size class as head, expected two or more such as «63-75 µm»");
    }
    columns.sort(Comparator.comparingDouble(c -> c.size().lowMm()));
    double[] limits = limits(columns);
    Series first = columns.get(0).series();
    return new GrainCurves(curves(columns, limits, masses), first);
  }

  private static Column column(Series series, Optional<Unit<Length>> unit) {
    if (series.unit().dimension() == Length.DIMENSION) {
      @SuppressWarnings("unchecked")
      Unit<Length> stated = (Unit<Length>) series.unit();
      return new Column(
          SizeClass.parse(series.name(), Optional.of(stated)), series, series.values());
    }
    boolean parts = series.unit().dimension() == Fraction.DIMENSION;
    double[] weights = parts ? series.in(Units.percent) : series.values();
    return new Column(SizeClass.parse(series.name(), unit), series, weights);
  }

  private static double[] limits(List<Column> columns) {
    double[] limits = new double[columns.size() + 1];
    limits[0] = columns.get(0).size().lowMm();
    for (int i = 0; i < columns.size(); i++) {
      SizeClass size = columns.get(i).size();
      if (Math.abs(size.lowMm() - limits[i]) > SAME * size.highMm() + SAME * limits[i]) {
        throw new IllegalArgumentException(
            String.format(
                Locale.ROOT,
                "the size classes %s: «%s» ends where «%s» does not begin",
                size.lowMm() > limits[i] ? "leave a gap" : "overlap",
                columns.get(i - 1).series().name(),
                columns.get(i).series().name()));
      }
      limits[i + 1] = size.highMm();
    }
    return limits;
  }

  private static GrainCurve[] curves(List<Column> columns, double[] limits, boolean masses) {
    int rows = columns.get(0).weights().length;
    GrainCurve[] curves = new GrainCurve[rows];
    int off = 0;
    int firstOff = -1;
    for (int row = 0; row < rows; row++) {
      double[] weights = new double[columns.size()];
      double sum = 0;
      for (int i = 0; i < weights.length; i++) {
        weights[i] = columns.get(i).weights()[row];
        sum = weights[i] < 0 ? Double.NaN : sum + weights[i];
      }
      if (sum > 0 && (masses || Math.abs(sum - 100) <= Weights.SLACK)) {
        curves[row] = curve(row, limits, weights, sum);
      } else if (sum != 0) {
        firstOff = off++ == 0 ? row : firstOff;
      }
    }
    tellOff(off, firstOff, rows);
    return curves;
  }

  private static GrainCurve curve(int row, double[] limits, double[] weights, double sum) {
    for (int i = 0; i < weights.length; i++) {
      weights[i] *= 100 / sum;
    }
    return new GrainCurve(
        "row " + (row + 1), limits, Weights.cumulate(weights), Between.LOGARITHMIC, false, false);
  }

  private static void tellOff(int off, int firstOff, int rows) {
    if (off == rows) {
      throw new IllegalArgumentException(
          "no row has weights that are complete and add up to 100 %; for masses use ofMasses");
    }
    if (off > 0) {
      Listening.caution(
          Caution.of(
              Weights.SUM,
              "grain-size curves",
              String.format(
                  Locale.ROOT,
                  "%d of %d rows have weights that are missing, negative or do not add up to 100 %%"
                      + " and give no curve; the first is row %d",
                  off,
                  rows,
                  firstOff + 1)));
    }
  }

  @Override
  public Listing listing() {
    Listing.Builder table =
        Listing.titled(count() + " grain-size curves")
            .column("curve")
            .column("d10", Units.mm)
            .column("d50", Units.mm)
            .column("d60", Units.mm);
    int shown = 0;
    for (GrainCurve curve : curves) {
      if (curve != null && shown++ < SHOWN) {
        table.row(curve.name(), curve.sizeMm(10), curve.sizeMm(50), curve.sizeMm(60));
      }
    }
    return table.build(count());
  }

  @Override
  public String toString() {
    return listing().toString();
  }
}
