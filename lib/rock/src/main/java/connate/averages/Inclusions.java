package connate.averages;

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
 * Permeability of a host rock with spherical or cylindrical inclusions, after Maxwell.
 *
 * <pre>
 * 3D  k = km (ki + 2 km + 2 φ (ki − km)) / (ki + 2 km − φ (ki − km))
 * 2D  the same with 1 for 2
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>km, ki</td><td>permeability of host and inclusions</td><td>mD</td></tr>
 * <tr><td>φ</td><td>part of the inclusions</td><td>1</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for inclusions that do not meet, up to a part of 0.2. It equals a
 * Hashin–Shtrikman bound.
 *
 * <p><b>Source</b>: Maxwell (1873), A Treatise on Electricity and Magnetism, art. 314.
 *
 * <p><b>Checked</b> in {@code AveragesTest}.
 */
public final class Inclusions {

  /** The facts on spheres. */
  public static final MethodCard SPHERES =
      MethodCard.named("maxwell-spheres", "Maxwell, spheres")
          .equation("k = km (ki + 2 km + 2 φ (ki - km)) / (ki + 2 km - φ (ki - km))")
          .input("km", "permeability of the host", Units.mD, Range.POSITIVE)
          .input("ki", "permeability of the inclusions", Units.mD, Range.from(0))
          .input("φ", "part of the inclusions", Units.fraction, Range.PART)
          .valid(0, 0.2)
          .result("k", "effective permeability", Units.mD)
          .source("Maxwell (1873), A Treatise on Electricity and Magnetism, art. 314")
          .constants(Constants.EXACT)
          .topics("averages", "inclusions", "shale")
          .note("Inclusions that do not meet.")
          .build();

  /** The facts on cylinders. */
  public static final MethodCard CYLINDERS =
      MethodCard.named("maxwell-cylinders", "Maxwell, cylinders")
          .equation("k = km (ki + km + φ (ki - km)) / (ki + km - φ (ki - km))")
          .input("km", "permeability of the host", Units.mD, Range.POSITIVE)
          .input("ki", "permeability of the inclusions", Units.mD, Range.from(0))
          .input("φ", "part of the inclusions", Units.fraction, Range.PART)
          .valid(0, 0.2)
          .result("k", "effective permeability", Units.mD)
          .source("Maxwell (1873), A Treatise on Electricity and Magnetism, art. 314")
          .constants(Constants.EXACT)
          .topics("averages", "inclusions", "shale")
          .note("Flow across parallel cylinders that do not meet.")
          .build();

  private static final Formula<Permeability> SPHERES_FORMULA =
      Formula.of(
          SPHERES, Units.mD, (host, guest, part) -> Inclusions.spheresNumber(host, guest, part));

  private static final Formula<Permeability> CYLINDERS_FORMULA =
      Formula.of(
          CYLINDERS,
          Units.mD,
          (host, guest, part) -> Inclusions.cylindersNumber(host, guest, part));

  private Inclusions() {}

  /** Returns the effective permeability of one sample by spheres. */
  public static Permeability spheres(
      Permeability permeabilityOfTheHost,
      Permeability permeabilityOfTheInclusions,
      Fraction partOfTheInclusions) {
    return SPHERES_FORMULA.value(
        permeabilityOfTheHost, permeabilityOfTheInclusions, partOfTheInclusions);
  }

  /** Returns the effective permeability of each row by spheres. */
  public static Series spheres(
      Operand permeabilityOfTheHost,
      Operand permeabilityOfTheInclusions,
      Operand partOfTheInclusions) {
    return SPHERES_FORMULA.series(
        permeabilityOfTheHost, permeabilityOfTheInclusions, partOfTheInclusions);
  }

  static double spheresNumber(double host, double guest, double part) {
    return host
        * (guest + 2 * host + 2 * part * (guest - host))
        / (guest + 2 * host - part * (guest - host));
  }

  /** Returns the effective permeability of one sample by cylinders. */
  public static Permeability cylinders(
      Permeability permeabilityOfTheHost,
      Permeability permeabilityOfTheInclusions,
      Fraction partOfTheInclusions) {
    return CYLINDERS_FORMULA.value(
        permeabilityOfTheHost, permeabilityOfTheInclusions, partOfTheInclusions);
  }

  /** Returns the effective permeability of each row by cylinders. */
  public static Series cylinders(
      Operand permeabilityOfTheHost,
      Operand permeabilityOfTheInclusions,
      Operand partOfTheInclusions) {
    return CYLINDERS_FORMULA.series(
        permeabilityOfTheHost, permeabilityOfTheInclusions, partOfTheInclusions);
  }

  static double cylindersNumber(double host, double guest, double part) {
    return host * (guest + host + part * (guest - host)) / (guest + host - part * (guest - host));
  }
}
