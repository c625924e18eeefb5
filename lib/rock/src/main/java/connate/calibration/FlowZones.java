package connate.calibration;

import connate.permeability.FlowZoneIndicator;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Arrays;
import java.util.List;

/**
 * Rock types by flow zone indicator: plugs of one pore throat, whatever their porosity, fall
 * together as groups of log10 FZI.
 */
public final class FlowZones {

  private static final int MOST = 6;

  private FlowZones() {}

  /**
   * Sorts plugs into as many groups as the Bayesian criterion finds in log10 FZI, six at most.
   *
   * @throws IllegalArgumentException if too few plugs have porosity and permeability above zero
   */
  public static RockTypes cluster(Series porosity, Series permeability) {
    Series indicator = indicator(porosity, permeability);
    return types(porosity, permeability, indicator, GaussianMixture.choose(logs(indicator), MOST));
  }

  /** Sorts plugs into a given number of groups of log10 FZI. */
  public static RockTypes cluster(Series porosity, Series permeability, int groups) {
    Series indicator = indicator(porosity, permeability);
    return types(porosity, permeability, indicator, GaussianMixture.of(logs(indicator), groups));
  }

  static double permeabilityMd(double porosity, double indicatorMicrometres) {
    return porosity > 0 && porosity < 1
        ? FlowZoneIndicator.permeability(Units.fraction(porosity), Units.um(indicatorMicrometres))
            .in(Units.mD)
        : Double.NaN;
  }

  private static Series indicator(Series porosity, Series permeability) {
    Series positive = permeability.map(k -> k > 0 ? k : Double.NaN);
    return FlowZoneIndicator.of(porosity, positive);
  }

  private static double[] logs(Series indicator) {
    return Arrays.stream(indicator.present()).map(StrictMath::log10).toArray();
  }

  private static RockTypes types(
      Series porosity, Series permeability, Series indicator, GaussianMixture mixture) {
    int[] types = new int[indicator.size()];
    for (int row = 0; row < types.length; row++) {
      double fzi = indicator.value(row);
      types[row] = Double.isNaN(fzi) ? -1 : mixture.groupOf(StrictMath.log10(fzi));
    }
    double[] centres = Arrays.stream(mixture.means()).map(m -> StrictMath.pow(10, m)).toArray();
    String note =
        "groups of log10 FZI by a Gaussian mixture, their number by BIC "
            + connate.quantity.Numbers.text(mixture.bic())
            + "; do they make sense as rock?";
    return new RockTypes(
        "flow zone", indicator, types, centres, porosity, permeability, List.of(note));
  }
}
