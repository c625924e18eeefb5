package connate.compaction;

import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Density;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Locale;

/**
 * Exponential compaction of the rocks of the North Sea after Sclater and Christie.
 *
 * <pre>φ = φ0 exp(−c z)</pre>
 *
 * <table>
 * <caption>Rocks</caption>
 * <tr><th>rock</th><th>φ0</th><th>c per km</th><th>grain density kg/m³</th></tr>
 * <tr><td>shale</td><td>0.63</td><td>0.51</td><td>2720</td></tr>
 * <tr><td>sand</td><td>0.49</td><td>0.27</td><td>2650</td></tr>
 * <tr><td>chalk</td><td>0.70</td><td>0.71</td><td>2710</td></tr>
 * <tr><td>shaly sand</td><td>0.56</td><td>0.39</td><td>2680</td></tr>
 * </table>
 *
 * <p><b>Valid</b> at normal pressure. Chalk has a second segment in the paper, which is not here.
 * For shaly sand a textbook prints 1/c as 2464 m where 0.39 per km is 2564 m: a slip of a digit.
 *
 * <p><b>Source</b>: Sclater and Christie (1980), J. Geophysical Research 85, 3711–3739; φ0 and 1/c
 * read in Wangen (2010), table 2.1; densities from memory.
 *
 * <p><b>Checked</b> in {@code SclaterChristieTest}.
 */
public enum SclaterChristie {
  /** Shale. */
  SHALE(0.63, 0.51, 2720),
  /** Sand. */
  SAND(0.49, 0.27, 2650),
  /** Chalk. */
  CHALK(0.70, 0.71, 2710),
  /** Shaly sand. */
  SHALY_SAND(0.56, 0.39, 2680);

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("sclater-christie", "Sclater and Christie, compaction of four rocks")
          .equation(
              "φ = φ0 exp(-c z); shale 0.63, 0.51; sand 0.49, 0.27; chalk 0.70, 0.71; shaly"
                  + " sand 0.56, 0.39 per km")
          .input("z", "depth below the sea floor", Units.km, Range.from(0))
          .result("φ", "porosity", Units.fraction)
          .source("Sclater and Christie (1980), J. Geophysical Research 85, 3711–3739")
          .constants(Constants.CHECKED)
          .topics("compaction", "porosity", "depth", "shale", "sand", "chalk")
          .note("Greatest depth below the sea floor; at normal pressure only.")
          .note("For shaly sand a textbook prints 2464 m for 1/c; 0.39 per km is 2564 m.")
          .build();

  private final double initial;
  private final double perKm;
  private final double grainKgPerM3;

  SclaterChristie(double initial, double perKm, double grainKgPerM3) {
    this.initial = initial;
    this.perKm = perKm;
    this.grainKgPerM3 = grainKgPerM3;
  }

  /** Returns the porosity at a depth below the sea floor. */
  public Fraction at(Length depth) {
    Listening.used(CARD);
    return Athy.of(initial(), perKm(), depth);
  }

  /** Returns the porosity of each row of depths. */
  public Series at(Series depth) {
    Listening.used(CARD);
    return Athy.of(initial(), perKm(), depth);
  }

  /** Returns the porosity at the surface. */
  public Fraction initial() {
    return Units.fraction(initial);
  }

  /** Returns the compaction coefficient per km. */
  public Ratio perKm() {
    return Units.number(perKm);
  }

  /** Returns the density of the grains. */
  public Density grainDensity() {
    return Units.kgPerM3(grainKgPerM3);
  }

  @Override
  public String toString() {
    return name().toLowerCase(Locale.ROOT).replace('_', ' ');
  }
}
