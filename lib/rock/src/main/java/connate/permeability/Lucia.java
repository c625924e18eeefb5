package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability of carbonate from interparticle porosity by petrophysical class, after Lucia.
 *
 * <pre>
 * class 1  k = 45.35e8 φ^8.537
 * class 2  k = 2.040e6 φ^6.38
 * class 3  k = 2.884e3 φ^4.275
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>mD</td></tr>
 * <tr><td>φ</td><td>interparticle porosity, separate vugs excluded</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for non-touching-vug carbonates. Class 1 grainstone and dolomite crystals above
 * 100 µm; class 2 grain-dominated packstone and 20 to 100 µm; class 3 mud-dominated and below 20
 * µm.
 *
 * <p><b>Source</b>: Lucia (1995), AAPG Bulletin 79, 1275–1300; constants from memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class Lucia {

  /** The facts on petrophysical class 1. */
  public static final MethodCard CLASS_1 =
      MethodCard.named("lucia-class-1", "Lucia class 1")
          .equation("k = 45.35e8 φ^8.537")
          .input("φ", "interparticle porosity", Units.fraction, Range.PART)
          .valid(0.02, 0.4)
          .result("k", "permeability", Units.mD)
          .source("Lucia (1995), AAPG Bulletin 79, 1275–1300")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "porosity", "carbonate", "rock type")
          .note("Grainstone and dolomite crystals above 100 µm.")
          .note("Interparticle porosity only: separate vugs excluded.")
          .build();

  /** The facts on petrophysical class 2. */
  public static final MethodCard CLASS_2 =
      MethodCard.named("lucia-class-2", "Lucia class 2")
          .equation("k = 2.040e6 φ^6.38")
          .input("φ", "interparticle porosity", Units.fraction, Range.PART)
          .valid(0.02, 0.4)
          .result("k", "permeability", Units.mD)
          .source("Lucia (1995), AAPG Bulletin 79, 1275–1300")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "porosity", "carbonate", "rock type")
          .note("Grain-dominated packstone and crystals of 20 to 100 µm.")
          .note("Interparticle porosity only: separate vugs excluded.")
          .build();

  /** The facts on petrophysical class 3. */
  public static final MethodCard CLASS_3 =
      MethodCard.named("lucia-class-3", "Lucia class 3")
          .equation("k = 2.884e3 φ^4.275")
          .input("φ", "interparticle porosity", Units.fraction, Range.PART)
          .valid(0.02, 0.4)
          .result("k", "permeability", Units.mD)
          .source("Lucia (1995), AAPG Bulletin 79, 1275–1300")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "porosity", "carbonate", "rock type")
          .note("Mud-dominated fabrics and crystals below 20 µm.")
          .note("Interparticle porosity only: separate vugs excluded.")
          .build();

  private static final Formula<Permeability> CLASS_1_FORMULA =
      Formula.of(CLASS_1, Units.mD, phi -> Lucia.class1Number(phi));

  private static final Formula<Permeability> CLASS_2_FORMULA =
      Formula.of(CLASS_2, Units.mD, phi -> Lucia.class2Number(phi));

  private static final Formula<Permeability> CLASS_3_FORMULA =
      Formula.of(CLASS_3, Units.mD, phi -> Lucia.class3Number(phi));

  private Lucia() {}

  /** Returns the permeability of one sample by petrophysical class 1. */
  public static Permeability class1(Fraction interparticlePorosity) {
    return CLASS_1_FORMULA.value(interparticlePorosity);
  }

  /** Returns the permeability of each row by petrophysical class 1. */
  public static Series class1(Operand interparticlePorosity) {
    return CLASS_1_FORMULA.series(interparticlePorosity);
  }

  static double class1Number(double phi) {
    return 45.35e8 * StrictMath.pow(phi, 8.537);
  }

  /** Returns the permeability of one sample by petrophysical class 2. */
  public static Permeability class2(Fraction interparticlePorosity) {
    return CLASS_2_FORMULA.value(interparticlePorosity);
  }

  /** Returns the permeability of each row by petrophysical class 2. */
  public static Series class2(Operand interparticlePorosity) {
    return CLASS_2_FORMULA.series(interparticlePorosity);
  }

  static double class2Number(double phi) {
    return 2.040e6 * StrictMath.pow(phi, 6.38);
  }

  /** Returns the permeability of one sample by petrophysical class 3. */
  public static Permeability class3(Fraction interparticlePorosity) {
    return CLASS_3_FORMULA.value(interparticlePorosity);
  }

  /** Returns the permeability of each row by petrophysical class 3. */
  public static Series class3(Operand interparticlePorosity) {
    return CLASS_3_FORMULA.series(interparticlePorosity);
  }

  static double class3Number(double phi) {
    return 2.884e3 * StrictMath.pow(phi, 4.275);
  }
}
