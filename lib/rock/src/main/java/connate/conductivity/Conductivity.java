package connate.conductivity;

import connate.deposition.VukovicSoro;
import connate.formula.Formula;
import connate.grains.EffectiveDiameter;
import connate.grains.GrainCurve;
import connate.grains.GrainCurves;
import connate.grains.Uniformity;
import connate.method.Constants;
import connate.method.Listening;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Density;
import connate.quantity.HydraulicConductivity;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Quantity;
import connate.quantity.Temperature;
import connate.quantity.Units;
import connate.quantity.Viscosity;
import connate.series.Series;
import java.util.Arrays;
import java.util.List;

/**
 * Hydraulic conductivity: every grain-size formula side by side, and the way to permeability.
 *
 * <pre>K = k ρ g / μ</pre>
 *
 * <p>The conductivity belongs to rock and water together; it falls by a quarter from 20 to 10 °C.
 *
 * <p><b>Source</b>: Hubbert (1940), J. Geology 48, 785–944. Worked example in Fetter, Applied
 * Hydrogeology.
 *
 * <p><b>Checked</b> in {@code ConductivityTest}.
 */
public final class Conductivity {

  /** The facts on conductivity and permeability. */
  public static final MethodCard CARD =
      MethodCard.named("conductivity-permeability", "Conductivity and permeability")
          .equation("k = K μ/(ρ g)")
          .input("K", "hydraulic conductivity", Units.mPerSecond, Range.from(0))
          .input("μ", "viscosity", Units.PaS, Range.POSITIVE)
          .input("ρ", "density", Units.kgPerM3, Range.POSITIVE)
          .result("k", "permeability", Units.squareMetres)
          .source("Hubbert (1940), J. Geology 48, 785–944")
          .constants(Constants.EXACT)
          .topics("hydraulic conductivity", "permeability", "water")
          .note("With standard gravity. K is in m/s, k in m²: never read the one as the other.")
          .build();

  private static final Formula<Permeability> FORMULA =
      Formula.of(CARD, Units.squareMetres, Conductivity::squareMetres);

  private static final List<Entry> ALL =
      List.of(
          AlyamaniSen.ENTRY,
          Barr.ENTRY,
          Beyer.ENTRY,
          Hazen.ENTRY,
          BearKozenyCarman.ENTRY,
          Kruger.ENTRY,
          Sauerbrei.ENTRY,
          Shepherd.ENTRY,
          Slichter.ENTRY,
          Terzaghi.ENTRY,
          UsbrBialas.ENTRY,
          Zamarin.ENTRY,
          Zunker.ENTRY);

  private Conductivity() {}

  /** Returns the permeability of a rock with a conductivity for fresh water, in mD. */
  public static Permeability permeability(HydraulicConductivity k, Temperature temperature) {
    return permeability(k, FreshWater.viscosity(temperature), FreshWater.density(temperature));
  }

  /** Returns the permeability of a rock with a conductivity for a given water, in mD. */
  public static Permeability permeability(
      HydraulicConductivity k, Viscosity viscosity, Density density) {
    return FORMULA.value(k, viscosity, density).to(Units.mD);
  }

  /** Returns the permeability of each row, in mD. */
  public static Series permeability(Operand k, Operand viscosity, Operand density) {
    return FORMULA.series(k, viscosity, density).to(Units.mD);
  }

  /** Returns the conductivity of a rock for fresh water, in m/d. */
  public static HydraulicConductivity of(Permeability permeability, Temperature temperature) {
    double celsius = temperature.in(Units.degC);
    Listening.used(CARD);
    return Units.mPerSecond(
            permeability.in(Units.squareMetres) * FreshWater.gravityOverViscosity(celsius))
        .to(Units.mPerDay);
  }

  static double squareMetres(double conductivity, double viscosity, double density) {
    return conductivity * viscosity / (density * FreshWater.GRAVITY);
  }

  /** Returns every formula for one curve. */
  public static ConductivityTable all(GrainCurve curve, Operand porosity, Temperature temperature) {
    return all(GrainCurves.of(curve), porosity, temperature);
  }

  /** Returns every formula for each curve, with the porosity from the uniformity coefficient. */
  public static ConductivityTable all(GrainCurves curves, Temperature temperature) {
    return all(curves, VukovicSoro.of(Uniformity.of(curves)), temperature);
  }

  /**
   * Returns every formula for each curve, those outside their range marked. No formula is made for
   * cohesive soil: more than 10 % finer than 2 µm is marked throughout (common practice, no
   * source).
   *
   * @param porosity one porosity, or a column with one for each curve
   */
  public static ConductivityTable all(
      GrainCurves curves, Operand porosity, Temperature temperature) {
    Sand[] sands =
        Listening.quietly(() -> sands(curves, numbers(porosity, curves.size()), temperature));
    double[][] k = new double[ALL.size()][sands.length];
    String[][] outside = new String[ALL.size()][sands.length];
    for (int f = 0; f < k.length; f++) {
      Entry entry = ALL.get(f);
      Listening.used(entry.card());
      for (int row = 0; row < sands.length; row++) {
        k[f][row] = metresPerDay(entry, sands[row]);
        outside[f][row] = entry.outside(sands[row]);
      }
    }
    return new ConductivityTable(ALL.stream().map(Entry::card).toList(), k, outside);
  }

  private static double metresPerDay(Entry entry, Sand sand) {
    return Outside.isPossible(entry.card(), sand)
        ? entry.metresPerSecond().applyAsDouble(sand) * 86400
        : Double.NaN;
  }

  private static double[] numbers(Operand porosity, int size) {
    if (porosity instanceof Series series) {
      if (series.size() != size) {
        throw new IllegalArgumentException(
            size + " curves and " + series.size() + " porosities: one for each, or one for all");
      }
      return series.in(Units.fraction);
    }
    double[] same = new double[size];
    Arrays.fill(same, part(porosity));
    return same;
  }

  private static double part(Operand porosity) {
    if (porosity instanceof Quantity<?> q && q.unit().dimension() == Units.fraction.dimension()) {
      return q.unit().convert(q.number(), Units.fraction);
    }
    throw new IllegalArgumentException(
        "the porosity must be a fraction such as percent(34), found " + porosity);
  }

  private static Sand[] sands(GrainCurves curves, double[] n, Temperature temperature) {
    double[] d10 = curves.d(10).values();
    double[] d17 = curves.d(17).values();
    double[] d20 = curves.d(20).values();
    double[] d50 = curves.d(50).values();
    double[] d60 = curves.d(60).values();
    double[] kruger = EffectiveDiameter.kruger(curves).values();
    double[] zunker = EffectiveDiameter.zunker(curves).values();
    double[] zamarin = EffectiveDiameter.zamarin(curves).values();
    double[] clay = curves.finer(Units.um(2)).values();
    double celsius = temperature.in(Units.degC);
    Sand[] sands = new Sand[curves.size()];
    for (int i = 0; i < sands.length; i++) {
      sands[i] =
          new Sand(
              d10[i],
              d17[i],
              d20[i],
              d50[i],
              d60[i] / d10[i],
              kruger[i],
              zunker[i],
              zamarin[i],
              clay[i],
              n[i],
              celsius);
    }
    return sands;
  }
}
