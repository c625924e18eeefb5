package connate.cementation;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Ratio;
import connate.quantity.SpecificSurface;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability while cement closes the pores.
 *
 * <pre>
 * k = φ³ / (2 τ S²)
 * S = S0 (φ/φ0)^q:  k / k0 = (φ/φ0)^(3 − 2q)
 * </pre>
 *
 * <p><b>Valid</b> for uniform cement. S is the surface of the pores in a volume of rock, τ the
 * tortuosity. q is 0 where the surface stays, 2/3 where pores shrink in their own shape, 1 where
 * surface goes with porosity. Cement that lines pores or bridges them adds surface: {@link
 * #withCementSurface}.
 *
 * <p><b>Source</b>: Kozeny (1927) and Carman (1937) in the form of Panda and Lake (1995), AAPG
 * Bulletin 79, 431–443.
 *
 * <p><b>Checked</b> in {@code CementedPermeabilityTest}.
 */
public final class CementedPermeability {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("surface-permeability", "Permeability from pore surface")
          .equation("k = φ³/(2 τ S²)")
          .input("φ", "porosity", Units.fraction, Range.PART)
          .input("S", "pore surface in a volume of rock", Units.perM, Range.POSITIVE)
          .input("τ", "tortuosity", Units.number, Range.from(1))
          .valid(1, 6)
          .result("k", "permeability", Units.squareMetres)
          .source(
              "Kozeny (1927) and Carman (1937) in the form of Panda and Lake (1995), AAPG Bulletin 79, 431–443")
          .constants(Constants.EXACT)
          .topics("permeability", "cement", "specific surface")
          .build();

  /** The facts on what is left after cementing. */
  public static final MethodCard RATIO =
      MethodCard.named("cementing-permeability", "Permeability left by cementing")
          .equation("k = k0 (φ/φ0)^(3 - 2q)")
          .input("k0", "permeability before", Units.mD, Range.from(0))
          .input("φ0", "porosity before", Units.fraction, Range.above(0).below(1))
          .input("φ", "porosity after", Units.fraction, Range.PART)
          .input("q", "exponent of the surface", Units.number, Range.of(-2, 1.5))
          .valid(0, 1)
          .result("k", "permeability after", Units.mD)
          .source(
              "Kozeny (1927) and Carman (1937) in the form of Panda and Lake (1995), AAPG Bulletin 79, 431–443")
          .constants(Constants.EXACT)
          .topics("permeability", "cement", "porosity")
          .note("Both porosities of the same bulk volume.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(
          CARD,
          Units.squareMetres,
          (porosity, surface, tortuosity) -> squareMetres(porosity, surface, tortuosity));
  private static final Formula<Permeability> RATIO_FORMULA =
      Formula.of(
          RATIO,
          Units.mD,
          (before, initial, porosity, exponent) -> afterwards(before, initial, porosity, exponent));

  private CementedPermeability() {}

  /** Returns the permeability of one value of each input. */
  public static Permeability of(Fraction porosity, SpecificSurface surface, Ratio tortuosity) {
    return CARD_FORMULA.value(porosity, surface, tortuosity).to(Units.mD);
  }

  /** Returns the permeability of each row. */
  public static Series of(Operand porosity, Operand surface, Operand tortuosity) {
    return CARD_FORMULA.series(porosity, surface, tortuosity).to(Units.mD);
  }

  /** Returns the permeability after cementing of one value of each input. */
  public static Permeability after(
      Permeability before, Fraction initial, Fraction porosity, Ratio exponent) {
    return RATIO_FORMULA.value(before, initial, porosity, exponent);
  }

  /** Returns the permeability after cementing of each row. */
  public static Series after(Operand before, Operand initial, Operand porosity, Operand exponent) {
    return RATIO_FORMULA.series(before, initial, porosity, exponent);
  }

  /**
   * Returns the pore surface with that of a cement added.
   *
   * @param grains the surface of the grains in a volume of rock
   * @param cement the volume of cement in the rock
   * @param cementSurface the surface of the cement in its own volume: small for overgrowths, large
   *     for fibrous illite
   */
  public static SpecificSurface withCementSurface(
      SpecificSurface grains, Fraction cement, SpecificSurface cementSurface) {
    return grains.plus(cementSurface.times(cement.fraction()));
  }

  /** Returns the surface of equal spheres in a volume of rock: 6 (1 − φ) / d. */
  public static SpecificSurface ofSpheres(Fraction porosity, Length diameter) {
    return Units.perM(6 * porosity.rest().fraction() / diameter.metres());
  }

  static double squareMetres(double porosity, double surface, double tortuosity) {
    return porosity * porosity * porosity / (2 * tortuosity * surface * surface);
  }

  static double afterwards(double before, double initial, double porosity, double exponent) {
    if (porosity > initial) {
      throw new IllegalArgumentException(
          "the porosity after cementing, " + porosity + ", is above that before, " + initial);
    }
    return before * StrictMath.pow(porosity / initial, 3 - 2 * exponent);
  }
}
