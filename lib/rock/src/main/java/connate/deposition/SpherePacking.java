package connate.deposition;

import connate.method.Caution;
import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.quantity.Fraction;
import connate.quantity.Units;
import java.util.Locale;

/**
 * The porosity of regular packings of equal spheres: what loose sand of one size may have.
 *
 * <pre>
 * cubic                    1 − π/6       = 0.4764
 * orthorhombic             1 − π/(3√3)   = 0.3954
 * body-centred cubic       1 − π√3/8     = 0.3198
 * tetragonal-sphenoidal    1 − 2π/9      = 0.3019
 * rhombohedral             1 − π/(3√2)   = 0.2595
 * </pre>
 *
 * <p>Poured and shaken spheres reach 0.36 to 0.37 (random close), poured ones 0.40 to 0.45 (random
 * loose; from memory).
 *
 * <p><b>Source</b>: Graton and Fraser (1935), J. Geology 43, 785–909.
 *
 * <p><b>Checked</b> in {@code SpherePackingTest}.
 */
public enum SpherePacking {
  /** Six neighbours. */
  CUBIC(1 - Math.PI / 6),
  /** Eight neighbours, rows shifted one way. */
  ORTHORHOMBIC(1 - Math.PI / (3 * StrictMath.sqrt(3))),
  /** Eight neighbours about a centre. */
  BODY_CENTRED(1 - Math.PI * StrictMath.sqrt(3) / 8),
  /** Ten neighbours. */
  TETRAGONAL_SPHENOIDAL(1 - 2 * Math.PI / 9),
  /** Twelve neighbours, the densest. */
  RHOMBOHEDRAL(1 - Math.PI / (3 * StrictMath.sqrt(2)));

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("sphere-packing", "Packings of equal spheres")
          .equation("cubic 1 - π/6; orthorhombic 1 - π/(3√3); rhombohedral 1 - π/(3√2); …")
          .result("φ", "porosity", Units.fraction)
          .source("Graton and Fraser (1935), J. Geology 43, 785–909")
          .constants(Constants.EXACT)
          .topics("porosity", "sand", "deposition", "packing")
          .note("Uncemented sand of one size above 0.476 or below 0.26 is suspicious.")
          .build();

  /** Caution: a porosity that packed grains of one size can hardly have. */
  static final String SUSPICIOUS = "M21";

  private final double porosity;

  SpherePacking(double porosity) {
    this.porosity = porosity;
  }

  /** Returns the porosity. */
  public Fraction porosity() {
    Listening.used(CARD);
    return Units.fraction(porosity);
  }

  /**
   * Returns whether clean, uncemented sand of one size may have a porosity; a caution tells where
   * it is outside what packed spheres have.
   */
  public static boolean allows(Fraction porosity) {
    Listening.used(CARD);
    double phi = porosity.fraction();
    boolean allowed = phi >= RHOMBOHEDRAL.porosity && phi <= CUBIC.porosity;
    if (!allowed) {
      Listening.caution(
          Caution.of(
              SUSPICIOUS,
              CARD.id(),
              "a porosity of "
                  + porosity
                  + " is outside what equal spheres pack to, 0.2595 to 0.4764: for clean,"
                  + " uncemented sand of one size it is suspicious"));
    }
    return allowed;
  }

  @Override
  public String toString() {
    return name().toLowerCase(Locale.ROOT).replace('_', ' ');
  }
}
