package connate.cementation;

import connate.method.MethodCard;
import connate.permeability.KozenyCarman;
import connate.permeability.PandaLake;
import connate.quantity.Units;
import java.util.Locale;

/** How permeability follows from porosity and cement in a {@link BurialModel}. */
public enum PermeabilityRule {

  /** Kozeny and Carman with the present porosity and the size of the grains: the default. */
  KOZENY_CARMAN,

  /** Kozeny and Carman before cement, then the surface stays while the pores close: (φ/φ0)³. */
  SURFACE_KEPT,

  /** Kozeny and Carman before cement, then pores shrink in their own shape: (φ/φ0)^(5/3). */
  PORES_SHRINK,

  /**
   * Panda and Lake with lognormal grain sizes, so that sorting counts: Kozeny and Carman with the
   * size of the mean surface, d exp(−σ²/2), σ of ln d from Trask's sorting.
   */
  PANDA_LAKE,

  /** The fit to the plugs of the Garn sandstones, blind to grain size. */
  GARN;

  private static final double UPPER_QUARTILE = 0.6744897501960817;

  MethodCard card() {
    return switch (this) {
      case KOZENY_CARMAN -> KozenyCarman.CARD;
      case SURFACE_KEPT, PORES_SHRINK -> CementedPermeability.RATIO;
      case PANDA_LAKE -> PandaLake.CARD;
      case GARN -> Garn.CARD;
    };
  }

  /**
   * Returns the permeability in m² of a porosity, an uncemented porosity, a grain size in m,
   * sorting.
   */
  double squareMetres(double porosity, double uncemented, double grain, double sorting) {
    return switch (this) {
      case KOZENY_CARMAN -> kozeny(porosity, grain);
      case SURFACE_KEPT -> kozeny(uncemented, grain) * StrictMath.pow(porosity / uncemented, 3);
      case PORES_SHRINK ->
          kozeny(uncemented, grain) * StrictMath.pow(porosity / uncemented, 5.0 / 3);
      case PANDA_LAKE -> kozeny(porosity, grain * surfaceMean(sorting));
      case GARN -> Units.mD.convert(Garn.milliDarcy(porosity), Units.squareMetres);
    };
  }

  /** The size of the mean surface over the median by weight, of lognormal sizes. */
  private static double surfaceMean(double sorting) {
    double sigma = StrictMath.log(sorting) / UPPER_QUARTILE;
    return StrictMath.exp(-sigma * sigma / 2);
  }

  /** A packing of equal spheres by its surface, with the tortuosity 2.5 that gives 180. */
  private static double kozeny(double porosity, double grain) {
    double surface = 6 * (1 - porosity) / grain;
    return CementedPermeability.squareMetres(porosity, surface, 2.5);
  }

  @Override
  public String toString() {
    return name().toLowerCase(Locale.ROOT).replace('_', ' ');
  }
}
