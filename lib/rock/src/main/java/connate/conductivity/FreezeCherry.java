package connate.conductivity;

import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.quantity.HydraulicConductivity;
import connate.quantity.Units;
import connate.series.Estimate;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;

/**
 * Which conductivities are usual in which ground, after Freeze and Cherry. The ends were read from
 * bars and are good to half a decade.
 *
 * <p><b>Source</b>: Freeze and Cherry (1979), Groundwater, table 2.2. Ends from memory.
 *
 * <p><b>Checked</b> in {@code FreezeCherryTest}.
 */
public enum FreezeCherry {
  /** Gravel. */
  GRAVEL(1e-3, 1),
  /** Clean sand. */
  CLEAN_SAND(1e-6, 1e-2),
  /** Silty sand. */
  SILTY_SAND(1e-7, 1e-3),
  /** Silt and loess. */
  SILT(1e-9, 1e-5),
  /** Glacial till. */
  TILL(1e-12, 1e-6),
  /** Unweathered marine clay. */
  MARINE_CLAY(1e-12, 1e-9),
  /** Shale. */
  SHALE(1e-13, 1e-9),
  /** Sandstone. */
  SANDSTONE(1e-10, 1e-6),
  /** Limestone and dolomite. */
  LIMESTONE(1e-9, 1e-6),
  /** Karst limestone. */
  KARST(1e-6, 1e-2),
  /** Permeable basalt. */
  PERMEABLE_BASALT(1e-7, 1e-2),
  /** Fractured igneous and metamorphic rock. */
  FRACTURED_CRYSTALLINE(1e-8, 1e-4),
  /** Unfractured igneous and metamorphic rock. */
  UNFRACTURED_CRYSTALLINE(1e-14, 1e-10);

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("freeze-cherry", "Freeze and Cherry, usual conductivities")
          .equation("clean sand 1e-6 to 1e-2 m/s, silt 1e-9 to 1e-5, marine clay 1e-12 to 1e-9, …")
          .source("Freeze and Cherry (1979), Groundwater, table 2.2")
          .constants(Constants.FROM_MEMORY)
          .topics("hydraulic conductivity", "aquifer", "ranges")
          .note("Read from bars: either end is good to half a decade.")
          .build();

  private final double low;
  private final double high;

  FreezeCherry(double low, double high) {
    this.low = low;
    this.high = high;
  }

  /** Returns the usual range about its geometric middle. */
  public Estimate<HydraulicConductivity> range() {
    Listening.used(CARD);
    return new Estimate<>(
        Units.mPerSecond(StrictMath.sqrt(low * high)),
        Units.mPerSecond(low),
        Units.mPerSecond(high),
        "usual");
  }

  /** Returns whether a conductivity is usual in this ground. */
  public boolean holds(HydraulicConductivity conductivity) {
    Listening.used(CARD);
    double k = conductivity.metresPerSecond();
    return k >= low && k <= high;
  }

  /** Returns the kinds of ground in which a conductivity is usual. */
  public static List<FreezeCherry> of(HydraulicConductivity conductivity) {
    return Arrays.stream(values()).filter(ground -> ground.holds(conductivity)).toList();
  }

  @Override
  public String toString() {
    return name().toLowerCase(Locale.ROOT).replace('_', ' ');
  }
}
