package connate.calibration;

import connate.quantity.Numbers;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Curve;
import connate.series.Labels;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * Plugs sorted into rock types: a label for each row, and what each type comes to. Types are
 * numbered by rising quality; a row without porosity or permeability has none.
 */
public final class RockTypes implements Labels, Listed {

  private final String name;
  private final String indicator;
  private final Unit<?> unit;
  private final int[] typeOfRow;
  private final double[] centres;
  private final double[] value;
  private final Series porosity;
  private final Series permeability;
  private final List<String> notes;

  /**
   * Collects the types.
   *
   * @param name the name of the labels
   * @param indicator the quantity by which the plugs were sorted, with a value for each row
   * @param typeOfRow the type of each row from 0, -1 for none
   * @param centres the indicator's typical value in each type, rising
   * @param notes lines for beneath the table
   */
  RockTypes(
      String name,
      Series indicator,
      int[] typeOfRow,
      double[] centres,
      Series porosity,
      Series permeability,
      List<String> notes) {
    this.name = name;
    this.indicator = indicator.name();
    this.unit = indicator.unit();
    this.value = indicator.values();
    this.typeOfRow = typeOfRow;
    this.centres = centres;
    this.porosity = porosity;
    this.permeability = permeability;
    this.notes = notes;
  }

  @Override
  public String name() {
    return name;
  }

  @Override
  public int size() {
    return typeOfRow.length;
  }

  @Override
  public String label(int row) {
    return typeOfRow[row] < 0 ? null : word(typeOfRow[row]);
  }

  /** Returns the number of types. */
  public int count() {
    return centres.length;
  }

  /** Returns the indicator's typical value of each type, rising. */
  public Series centres() {
    return Series.of(indicator, unit, centres);
  }

  /** Returns log10 k against porosity fitted within each type that has three plugs. */
  public List<TransformFit> fits() {
    List<TransformFit> fits = new ArrayList<>();
    for (int type = 0; type < centres.length; type++) {
      int[] rows = rows(word(type));
      if (rows.length >= Plugs.FEWEST) {
        fits.add(LogLinear.fit(porosity.rows(rows), permeability.rows(rows)));
      }
    }
    return fits;
  }

  /** Returns the lines of constant flow zone indicator, k against porosity, for a crossplot. */
  public List<Curve> lines() {
    return IntStream.range(0, centres.length)
        .mapToObj(type -> (Curve) new FlowZoneLine(word(type), centres[type]))
        .toList();
  }

  private static String word(int type) {
    return "type " + (type + 1);
  }

  @Override
  public Listing listing() {
    Listing.Builder table =
        Listing.titled(centres.length + " rock types by " + indicator)
            .column("type")
            .column("plugs")
            .column(indicator, unit)
            .column("from", unit)
            .column("to", unit)
            .column("median porosity", Units.percent)
            .column("median k", Units.mD);
    for (int type = 0; type < centres.length; type++) {
      addRow(table, type);
    }
    notes.forEach(table::note);
    return table.build();
  }

  private void addRow(Listing.Builder table, int type) {
    int[] rows = rows(word(type));
    if (rows.length == 0) {
      table.row(word(type), 0, unit.of(centres[type]), null, null, null, null);
      return;
    }
    double low = IntStream.of(rows).mapToDouble(r -> value[r]).min().orElseThrow();
    double high = IntStream.of(rows).mapToDouble(r -> value[r]).max().orElseThrow();
    table.row(
        word(type),
        rows.length,
        unit.of(centres[type]),
        unit.of(low),
        unit.of(high),
        porosity.rows(rows).median(),
        permeability.rows(rows).median());
  }

  @Override
  public String toString() {
    return listing().toString();
  }

  /** k = 1014 FZI² φ³/(1 − φ)² for one indicator. */
  private record FlowZoneLine(String label, double micrometres) implements Curve {

    @Override
    public double y(double x) {
      return FlowZones.permeabilityMd(x, micrometres);
    }

    @Override
    public Unit<?> xUnit() {
      return Units.fraction;
    }

    @Override
    public Unit<?> yUnit() {
      return Units.mD;
    }

    @Override
    public String label() {
      return label + ", FZI " + Numbers.text(micrometres) + " µm";
    }
  }
}
