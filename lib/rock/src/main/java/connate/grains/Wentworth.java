package connate.grains;

import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Length;
import connate.quantity.Units;
import connate.series.Labels;
import connate.series.Series;
import java.util.Locale;

/**
 * The names of grain sizes after Udden and Wentworth. A size on a limit belongs to the coarser
 * class.
 *
 * <p><b>Source</b>: Udden (1914), Bull. Geological Society of America 25, 655–744; Wentworth
 * (1922), J. Geology 30, 377–392. Limits from memory.
 *
 * <p><b>Checked</b> in {@code WentworthTest}.
 */
public enum Wentworth {
  /** Over 256 mm. */
  BOULDER(256, Double.POSITIVE_INFINITY),
  /** 64 to 256 mm. */
  COBBLE(64, 256),
  /** 4 to 64 mm. */
  PEBBLE(4, 64),
  /** 2 to 4 mm. */
  GRANULE(2, 4),
  /** 1 to 2 mm. */
  VERY_COARSE_SAND(1, 2),
  /** 0.5 to 1 mm. */
  COARSE_SAND(0.5, 1),
  /** 0.25 to 0.5 mm. */
  MEDIUM_SAND(0.25, 0.5),
  /** 0.125 to 0.25 mm. */
  FINE_SAND(0.125, 0.25),
  /** 0.0625 to 0.125 mm. */
  VERY_FINE_SAND(0.0625, 0.125),
  /** 1/256 to 0.0625 mm. */
  SILT(1 / 256.0, 0.0625),
  /** Under 1/256 mm. */
  CLAY(0, 1 / 256.0);

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("wentworth", "Udden–Wentworth size classes")
          .equation(
              "clay < 1/256 mm ≤ silt < 1/16 ≤ very fine sand < 1/8 ≤ fine < 1/4 ≤ medium < 1/2 ≤"
                  + " coarse < 1 ≤ very coarse < 2 ≤ granule < 4 ≤ pebble < 64 ≤ cobble < 256 ≤"
                  + " boulder")
          .input("d", "grain size", Units.mm, Range.POSITIVE)
          .source(
              "Udden (1914), Bull. Geol. Soc. America 25, 655–744; Wentworth (1922), J. Geology 30,"
                  + " 377–392")
          .constants(Constants.FROM_MEMORY)
          .topics("grain size", "grains", "sand", "silt", "clay")
          .note("Soil science and engineering draw other limits: silt ends at 63, 60 or 75 µm.")
          .build();

  private final double lowMm;
  private final double highMm;

  Wentworth(double lowMm, double highMm) {
    this.lowMm = lowMm;
    this.highMm = highMm;
  }

  /**
   * Returns the class of a grain size.
   *
   * @throws IllegalArgumentException if the size is not above zero
   */
  public static Wentworth of(Length size) {
    double mm = size.in(Units.mm);
    if (!(mm > 0)) {
      throw new IllegalArgumentException("a grain size is above zero, found " + size);
    }
    Listening.used(CARD);
    return of(mm);
  }

  /** Returns the class name of each row. */
  public static Labels of(Series sizes) {
    double[] mm = sizes.in(Units.mm);
    Listening.used(CARD);
    String[] words = new String[mm.length];
    for (int row = 0; row < mm.length; row++) {
      words[row] = mm[row] > 0 ? of(mm[row]).toString() : null;
    }
    return Labels.of("size class", words);
  }

  private static Wentworth of(double mm) {
    for (Wentworth name : values()) {
      if (mm >= name.lowMm) {
        return name;
      }
    }
    return CLAY;
  }

  /** Returns the fine limit. */
  public Length finest() {
    return Units.mm(lowMm);
  }

  /** Returns the coarse limit, infinite for boulders. */
  public Length coarsest() {
    return Units.mm(highMm);
  }

  /** Returns the name as it is written: {@code very fine sand}. */
  @Override
  public String toString() {
    return name().toLowerCase(Locale.ROOT).replace('_', ' ');
  }
}
