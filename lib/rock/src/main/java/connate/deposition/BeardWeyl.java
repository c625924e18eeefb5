package connate.deposition;

import connate.method.Caution;
import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Permeability;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Listing;
import connate.series.Series;
import java.util.Locale;
import java.util.function.DoubleBinaryOperator;

/**
 * Porosity and permeability of artificially mixed, wet-packed sand by size and sorting, as Beard
 * and Weyl measured them.
 *
 * <p><b>Valid</b> for clean, loose sand from 0.0625 to 1 mm and Trask sorting from 1.0 to 5.7. The
 * permeabilities of fine and very fine, poorly and very poorly sorted sand are computed, not
 * measured: never calibrate on them. Natural Holocene sands lie within 5 porosity units.
 *
 * <p><b>Source</b>: Beard and Weyl (1973), AAPG Bulletin 57, 349–369. Cells from memory; the row
 * means of the best and the worst sorting agree with the abstract.
 *
 * <p><b>Checked</b> in {@code BeardWeylTest}.
 */
public final class BeardWeyl {

  /** Caution: a cell of the table is not a measurement. */
  static final String NOT_MEASURED = "M20";

  /** Half a size class of Wentworth's. */
  public enum Size {
    /** 0.71 to 1 mm. */
    COARSE_UPPER(0.71),
    /** 0.5 to 0.71 mm. */
    COARSE_LOWER(0.5),
    /** 0.354 to 0.5 mm. */
    MEDIUM_UPPER(0.354),
    /** 0.25 to 0.354 mm. */
    MEDIUM_LOWER(0.25),
    /** 0.177 to 0.25 mm. */
    FINE_UPPER(0.177),
    /** 0.125 to 0.177 mm. */
    FINE_LOWER(0.125),
    /** 0.088 to 0.125 mm. */
    VERY_FINE_UPPER(0.088),
    /** 0.0625 to 0.088 mm. */
    VERY_FINE_LOWER(0.0625);

    private final double lowMm;

    Size(double lowMm) {
      this.lowMm = lowMm;
    }

    @Override
    public String toString() {
      return name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }
  }

  /** A group of sorting by Trask's measure. */
  public enum Sorting {
    /** 1.0 to 1.1. */
    EXTREMELY_WELL(1.1),
    /** 1.1 to 1.2. */
    VERY_WELL(1.2),
    /** 1.2 to 1.4. */
    WELL(1.4),
    /** 1.4 to 2.0. */
    MODERATELY(2),
    /** 2.0 to 2.7. */
    POORLY(2.7),
    /** 2.7 to 5.7. */
    VERY_POORLY(5.7);

    private final double high;

    Sorting(double high) {
      this.high = high;
    }

    @Override
    public String toString() {
      return name().toLowerCase(Locale.ROOT).replace('_', ' ') + " sorted";
    }
  }

  /** What a cell of the permeability table is worth. */
  public enum Worth {
    /** Measured by the authors. */
    MEASURED,
    /** Measured, but the number is remembered with doubt. */
    LOW_CONFIDENCE,
    /** Computed by the authors with the law of Krumbein and Monk. */
    COMPUTED
  }

  /** The facts on the porosity. */
  public static final MethodCard CARD =
      card("beard-weyl-porosity", "Beard and Weyl, porosity of packed sand")
          .result("φ", "porosity", Units.fraction)
          .note("Wet-packed in the laboratory; natural sands lie within 5 porosity units.")
          .build();

  /** The facts on the permeability. */
  public static final MethodCard PERMEABILITY =
      card("beard-weyl-permeability", "Beard and Weyl, permeability of packed sand")
          .result("k", "permeability", Units.darcy)
          .note("Fine and very fine, poorly and very poorly sorted: computed, not measured.")
          .build();

  private static final double COARSEST = 1;

  private static final double[][] POROSITY = {
    {43.1, 42.8, 41.7, 41.3, 41.3, 43.5, 42.3, 43.0},
    {40.8, 41.5, 40.2, 40.2, 39.8, 40.8, 41.2, 41.8},
    {38.0, 38.4, 38.1, 38.8, 39.1, 39.7, 40.2, 39.8},
    {32.4, 33.3, 34.2, 34.9, 33.9, 34.3, 35.6, 33.1},
    {27.1, 29.8, 31.5, 31.3, 30.4, 31.0, 30.5, 34.2},
    {28.6, 25.2, 25.8, 23.4, 28.5, 29.0, 30.1, 32.6}
  };
  private static final double[][] DARCIES = {
    {475, 238, 119, 59, 30, 15, 7.4, 3.7},
    {458, 239, 115, 57, 29, 14, 7.2, 3.6},
    {302, 151, 76, 38, 19, 9.4, 4.7, 2.4},
    {110, 55, 28, 14, 7.0, 3.5, 2.1, 1.1},
    {45, 23, 12, 6.0, 3.7, 1.9, 0.93, 0.46},
    {14, 7.0, 3.5, 1.7, 0.83, 0.42, 0.21, 0.10}
  };

  private BeardWeyl() {}

  private static MethodCard.Builder card(String id, String title) {
    return MethodCard.named(id, title)
        .equation("table of 8 sizes by 6 sortings")
        .input("d", "grain size", Units.mm, Range.of(0.0625, 1))
        .input("So", "Trask sorting", Units.number, Range.of(1, 5.7))
        .source("Beard and Weyl (1973), AAPG Bulletin 57, 349–369")
        .constants(Constants.FROM_MEMORY)
        .topics("porosity", "permeability", "grain size", "sorting", "sand", "deposition");
  }

  /** Returns the porosity of a cell. */
  public static Fraction porosity(Size size, Sorting sorting) {
    Listening.used(CARD);
    return Units.percent(POROSITY[sorting.ordinal()][size.ordinal()]);
  }

  /** Returns the porosity of the cell in which size and Trask sorting fall. */
  public static Fraction porosity(Length grain, Ratio sorting) {
    return porosity(size(grain.in(Units.mm)), sorting(sorting.value()));
  }

  /** Returns the porosity of each row's cell; missing outside the table. */
  public static Series porosity(Series grain, Series sorting) {
    Listening.used(CARD);
    return rows("porosity", grain, sorting, (mm, so) -> cell(POROSITY, mm, so) / 100)
        .as(Units.fraction);
  }

  /** Returns the permeability of a cell; a caution tells where it was not measured. */
  public static Permeability permeability(Size size, Sorting sorting) {
    Listening.used(PERMEABILITY);
    Worth worth = worth(size, sorting);
    if (worth != Worth.MEASURED) {
      Listening.caution(
          Caution.of(
              NOT_MEASURED,
              PERMEABILITY.id(),
              "the permeability of "
                  + size
                  + ", "
                  + sorting
                  + " sand in the table of Beard and Weyl is "
                  + (worth == Worth.COMPUTED
                      ? "computed, not measured"
                      : "remembered with doubt")));
    }
    return Units.darcy(DARCIES[sorting.ordinal()][size.ordinal()]);
  }

  /** Returns the permeability of the cell in which size and Trask sorting fall. */
  public static Permeability permeability(Length grain, Ratio sorting) {
    return permeability(size(grain.in(Units.mm)), sorting(sorting.value()));
  }

  /** Returns what a cell of the permeability table is worth. */
  public static Worth worth(Size size, Sorting sorting) {
    boolean fine = size.compareTo(Size.FINE_UPPER) >= 0;
    if (sorting.compareTo(Sorting.POORLY) >= 0 && fine) {
      return Worth.COMPUTED;
    }
    boolean doubtful =
        sorting == Sorting.MODERATELY && size.compareTo(Size.VERY_FINE_UPPER) >= 0
            || sorting == Sorting.VERY_POORLY && size == Size.MEDIUM_LOWER;
    return doubtful ? Worth.LOW_CONFIDENCE : Worth.MEASURED;
  }

  /** Returns the table with both values of each cell and what they are worth. */
  public static Listing table() {
    Listing.Builder table =
        Listing.titled("packed sand after Beard and Weyl (1973)")
            .column("size")
            .column("sorting")
            .column("porosity", Units.percent)
            .column("permeability", Units.darcy)
            .column("worth");
    for (Sorting sorting : Sorting.values()) {
      for (Size size : Size.values()) {
        table.row(
            size,
            sorting,
            POROSITY[sorting.ordinal()][size.ordinal()],
            DARCIES[sorting.ordinal()][size.ordinal()],
            worth(size, sorting).name().toLowerCase(Locale.ROOT).replace('_', ' '));
      }
    }
    return table.build();
  }

  private static Series rows(String name, Series a, Series b, DoubleBinaryOperator number) {
    double[] mm = a.in(Units.mm);
    double[] so = b.in(Units.number);
    if (mm.length != so.length) {
      throw new IllegalArgumentException(mm.length + " sizes and " + so.length + " sortings");
    }
    double[] out = new double[mm.length];
    for (int row = 0; row < out.length; row++) {
      boolean inside = mm[row] >= 0.0625 && mm[row] <= 1 && so[row] >= 1 && so[row] <= 5.7;
      out[row] = inside ? number.applyAsDouble(mm[row], so[row]) : Double.NaN;
    }
    return Series.over(name, Units.number, out, a);
  }

  private static double cell(double[][] table, double mm, double so) {
    return table[sorting(so).ordinal()][size(mm).ordinal()];
  }

  private static Size size(double mm) {
    for (Size size : Size.values()) {
      if (mm >= size.lowMm && mm <= COARSEST) {
        return size;
      }
    }
    throw new IllegalArgumentException(
        "a grain of " + mm + " mm is outside the table of Beard and Weyl, 0.0625 to 1 mm");
  }

  private static Sorting sorting(double trask) {
    for (Sorting sorting : Sorting.values()) {
      if (trask >= 1 && trask <= sorting.high) {
        return sorting;
      }
    }
    throw new IllegalArgumentException(
        "a Trask sorting of " + trask + " is outside the table of Beard and Weyl, 1 to 5.7");
  }
}
