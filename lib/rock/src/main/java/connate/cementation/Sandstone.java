package connate.cementation;

import connate.compaction.LanderWalderhaug;
import connate.deposition.SchererInitial;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Ratio;
import connate.quantity.Units;
import java.util.Objects;

/**
 * A sandstone as it was laid down.
 *
 * @param grain the median size of its grains by weight, without overgrowth
 * @param sorting Trask's measure
 * @param quartz the share of quartz of the grains
 * @param coat the share of the quartz surface that a clay coat covers
 * @param initial the porosity at deposition
 * @param stable the intergranular volume that high stress leaves
 */
public record Sandstone(
    Length grain,
    Ratio sorting,
    Fraction quartz,
    Fraction coat,
    Fraction initial,
    Fraction stable) {

  /** Checks the ranges. */
  public Sandstone {
    Objects.requireNonNull(grain, "grain");
    if (!(grain.metres() > 0)) {
      throw new IllegalArgumentException("a grain size is above zero, found " + grain);
    }
    if (!(sorting.value() >= 1)) {
      throw new IllegalArgumentException("a Trask sorting is at least 1, found " + sorting);
    }
    checkPart("quartz", quartz, 1);
    checkPart("coat", coat, 1);
    checkPart("porosity at deposition", initial, 0.7);
    checkPart("stable intergranular volume", stable, initial.fraction());
  }

  private static void checkPart(String name, Fraction part, double most) {
    if (!(part.fraction() >= 0 && part.fraction() <= most)) {
      throw new IllegalArgumentException(name + " must lie from 0 to " + most + ", found " + part);
    }
  }

  /**
   * Returns an uncoated sandstone with rigid grains, whose porosity at deposition follows from its
   * sorting by {@link SchererInitial}.
   *
   * @param grain the size of the grains
   * @param sorting Trask's measure
   * @param quartz the share of quartz of the grains
   */
  public static Sandstone of(Length grain, Ratio sorting, Fraction quartz) {
    return new Sandstone(
        grain,
        sorting,
        quartz,
        Units.fraction(0),
        SchererInitial.of(sorting),
        Units.fraction(LanderWalderhaug.RIGID));
  }

  /** Returns the sandstone with clay coats over a share of the quartz surface. */
  public Sandstone coated(Fraction share) {
    return new Sandstone(grain, sorting, quartz, share, initial, stable);
  }

  /** Returns the sandstone with another porosity at deposition. */
  public Sandstone withInitialPorosity(Fraction porosity) {
    return new Sandstone(grain, sorting, quartz, coat, porosity, stable);
  }

  /** Returns the sandstone with another stable volume: ductile grains lower it to some 10 %. */
  public Sandstone withStableVolume(Fraction volume) {
    return new Sandstone(grain, sorting, quartz, coat, initial, volume);
  }

  @Override
  public String toString() {
    return "sandstone of "
        + grain
        + ", quartz "
        + quartz
        + ", coat "
        + coat
        + ", porosity at deposition "
        + initial;
  }
}
