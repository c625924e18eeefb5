package connate.cementation;

import connate.compaction.Athy;
import connate.compaction.EffectiveStress;
import connate.compaction.LanderWalderhaug;
import connate.method.MethodCard;
import java.util.Locale;

/** Which law compacts the sand of a {@link BurialModel}. */
public enum CompactionLaw {

  /**
   * Intergranular volume by effective stress with a floor, the default: mechanical compaction
   * alone, so that cement may come on top. Coefficient per MPa, 0.06.
   */
  LANDER_WALDERHAUG(LanderWalderhaug.CARD, LanderWalderhaug.USUAL_PER_MPA),

  /**
   * Exponential in effective stress without a floor. Curves fitted to deep rock hold its cement
   * already: counted twice together with quartz cement. Coefficient per MPa, 0.022.
   */
  EFFECTIVE_STRESS(EffectiveStress.CARD, 0.022),

  /** Exponential in depth, blind to overpressure. Coefficient per km, 0.27. */
  ATHY(Athy.CARD, 0.27);

  private final MethodCard card;
  private final double usual;

  CompactionLaw(MethodCard card, double usual) {
    this.card = card;
    this.usual = usual;
  }

  MethodCard card() {
    return card;
  }

  /** Returns the coefficient where none is stated: per MPa, or per km for Athy. */
  public double usualCoefficient() {
    return usual;
  }

  /** Returns the intergranular volume at the greatest stress (MPa) and depth (km) felt. */
  double volume(double initial, double stable, double coefficient, double stress, double km) {
    return switch (this) {
      case LANDER_WALDERHAUG -> stable + (initial - stable) * StrictMath.exp(-coefficient * stress);
      case EFFECTIVE_STRESS -> initial * StrictMath.exp(-coefficient * stress);
      case ATHY -> initial * StrictMath.exp(-coefficient * km);
    };
  }

  @Override
  public String toString() {
    return name().toLowerCase(Locale.ROOT).replace('_', ' ');
  }
}
