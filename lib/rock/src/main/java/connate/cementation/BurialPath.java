package connate.cementation;

import connate.chance.Outcome;
import connate.quantity.Fraction;
import connate.quantity.Permeability;
import connate.quantity.Time;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import java.util.ArrayList;
import java.util.List;

/** What a sandstone went through: depth, temperature, porosity, cement and permeability by age. */
public final class BurialPath implements Listed {

  private static final int AGE = 0;
  private static final int DEPTH = 1;
  private static final int TEMPERATURE = 2;
  private static final int STRESS = 3;
  private static final int VOLUME = 4;
  private static final int CEMENT = 5;
  private static final int POROSITY = 6;
  private static final int PERMEABILITY = 7;
  private static final int SHOWN = 12;

  private final List<double[]> rows;

  private BurialPath(List<double[]> rows) {
    this.rows = rows;
  }

  /** Collects the instants of a path. */
  static final class Builder {
    private final List<double[]> rows = new ArrayList<>();

    void add(
        BurialHistory.Point at,
        double volume,
        double cement,
        double porosity,
        double squareMetres) {
      rows.add(
          new double[] {
            at.age(),
            at.depth(),
            at.celsius(),
            at.stress(),
            volume,
            cement,
            porosity,
            Units.squareMetres.convert(squareMetres, Units.mD)
          });
    }

    BurialPath build() {
      return new BurialPath(rows);
    }
  }

  /** Returns the ages, oldest first, in Ma before the present. */
  public Series age() {
    return column("age", Units.Ma, AGE);
  }

  /** Returns the depths. */
  public Series depth() {
    return column("depth", Units.m, DEPTH);
  }

  /** Returns the temperatures. */
  public Series temperature() {
    return column("temperature", Units.degC, TEMPERATURE);
  }

  /** Returns the effective stresses of each instant. */
  public Series stress() {
    return column("effective stress", Units.MPa, STRESS);
  }

  /** Returns the volumes between the grains, open or cemented. */
  public Series intergranularVolume() {
    return column("intergranular volume", Units.fraction, VOLUME).to(Units.percent);
  }

  /** Returns the quartz cement, of the bulk volume of the instant. */
  public Series cement() {
    return column("quartz cement", Units.fraction, CEMENT).to(Units.percent);
  }

  /** Returns the porosities. */
  public Series porosity() {
    return column("porosity", Units.fraction, POROSITY).to(Units.percent);
  }

  /** Returns the permeabilities. */
  public Series permeability() {
    return column("permeability", Units.mD, PERMEABILITY);
  }

  /** Returns the number of instants. */
  public int size() {
    return rows.size();
  }

  /** Returns the porosity at an age. */
  public Fraction porosityAt(Time age) {
    return Units.fraction(at(POROSITY, age.in(Units.Ma)));
  }

  /** Returns the porosity at the end of the history. */
  public Fraction finalPorosity() {
    return Units.fraction(last(POROSITY)).to(Units.percent);
  }

  /** Returns the permeability at the end of the history. */
  public Permeability finalPermeability() {
    return Units.mD(last(PERMEABILITY));
  }

  /** Returns the end of the history for a simulation: porosity, quartz cement, permeability. */
  public Outcome present() {
    return Outcome.of("porosity", finalPorosity())
        .and("quartz cement", Units.fraction(last(CEMENT)).to(Units.percent))
        .and("intergranular volume", Units.fraction(last(VOLUME)).to(Units.percent))
        .and("permeability", finalPermeability());
  }

  private double last(int column) {
    return rows.get(rows.size() - 1)[column];
  }

  private double at(int column, double ma) {
    for (int i = 1; i < rows.size(); i++) {
      double[] a = rows.get(i - 1);
      double[] b = rows.get(i);
      if (ma <= a[AGE] && ma >= b[AGE]) {
        return a[column] + (a[AGE] - ma) / (a[AGE] - b[AGE]) * (b[column] - a[column]);
      }
    }
    throw new IllegalArgumentException(
        "the burial history runs from " + rows.get(0)[AGE] + " to " + last(AGE) + " Ma");
  }

  private Series column(String name, Unit<?> unit, int column) {
    double[] values = new double[rows.size()];
    for (int i = 0; i < values.length; i++) {
      values[i] = rows.get(i)[column];
    }
    return Series.over(name, unit, values, null);
  }

  @Override
  public Listing listing() {
    Listing.Builder table =
        Listing.titled("through time")
            .column("age", Units.Ma)
            .column("depth", Units.m)
            .column("temperature", Units.degC)
            .column("quartz cement", Units.percent)
            .column("porosity", Units.percent)
            .column("permeability", Units.mD);
    int stride = StrictMath.max(1, (rows.size() - 1 + SHOWN - 1) / SHOWN);
    for (int i = rows.size() - 1; i >= 0; i -= stride) {
      double[] r = rows.get(i);
      table.row(
          Units.Ma(r[AGE]),
          Units.m(r[DEPTH]),
          Units.degC(r[TEMPERATURE]),
          Units.fraction(r[CEMENT]),
          Units.fraction(r[POROSITY]),
          Units.mD(r[PERMEABILITY]));
    }
    return table.note("the present first; every " + stride + "th instant").build();
  }

  @Override
  public String toString() {
    return listing().toString();
  }
}
