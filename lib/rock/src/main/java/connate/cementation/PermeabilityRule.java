package connate.cementation;

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

  /** The fit to the plugs of the Garn sandstones, blind to grain size. */
  GARN;

  /** Returns the permeability in m² of a porosity, an uncemented porosity and a grain size in m. */
  double squareMetres(double porosity, double uncemented, double grain) {
    return switch (this) {
      case KOZENY_CARMAN -> kozeny(porosity, grain);
      case SURFACE_KEPT -> kozeny(uncemented, grain) * StrictMath.pow(porosity / uncemented, 3);
      case PORES_SHRINK ->
          kozeny(uncemented, grain) * StrictMath.pow(porosity / uncemented, 5.0 / 3);
      case GARN -> Units.mD.convert(Garn.milliDarcy(porosity), Units.squareMetres);
    };
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
