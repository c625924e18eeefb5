package connate.well;

import connate.fault.DataException;
import connate.fault.Nearest;
import connate.las.HeaderLine;
import connate.las.LasColumn;
import connate.las.LasFile;
import connate.las.LasOptions;
import connate.las.LasWriter;
import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Length;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.role.Role;
import connate.role.Roles;
import connate.series.Labels;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import connate.table.Table;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;

/**
 * A well: logs over one depth, each a series with its unit, and what the header says.
 *
 * <p>A curve is asked for by its mnemonic ({@code get("RHOB")}) or by its role ({@code get("bulk
 * density")}). Curves that are computed are added with {@link #add}; those of the file do not
 * change.
 */
public final class Well implements Listed {

  private final String name;
  private final String source;
  private final LasFile file;
  private final Series depth;
  private final DepthLine line;
  private final Map<String, WellCurve> curves;

  Well(String name, String source, LasFile file, Series depth, Map<String, WellCurve> curves) {
    this.name = Objects.requireNonNull(name, "name");
    this.source = source;
    this.file = file;
    this.depth = depth.depth().isPresent() ? depth : depth.atDepth(depth);
    this.line = new DepthLine(depth.in(Units.m));
    this.curves = new LinkedHashMap<>(curves);
  }

  /**
   * Reads a LAS file.
   *
   * @param path where it lies
   * @throws DataException if it cannot be read, or leaves a question open
   */
  public static Well read(Path path) {
    return of(LasFile.read(path));
  }

  /**
   * Reads a LAS file with answers to the questions it leaves open.
   *
   * @param path where it lies
   * @param options the answers
   * @throws DataException if it cannot be read, or leaves a question open
   */
  public static Well read(Path path, LasOptions options) {
    return of(LasFile.read(path, options));
  }

  /**
   * Returns the well of a LAS file. What the reader is cautious about is told to who listens.
   *
   * @throws DataException if its index is not a depth, or has no unit
   */
  public static Well of(LasFile file) {
    return WellReader.of(file);
  }

  /**
   * Returns the well of a LAS file whose depths are in a unit that the file does not say.
   *
   * @param file the file
   * @param depthUnit the unit of its index
   */
  public static Well of(LasFile file, Unit<?> depthUnit) {
    return WellReader.of(file, depthUnit);
  }

  /** Returns a well without logs yet, over depths that come from elsewhere. */
  public static Well of(String name, Series depth) {
    return new Well(name, "", null, depth, Map.of());
  }

  /**
   * Returns a well whose logs stand in a table with a column of depth. Columns of words are left
   * out.
   */
  public static Well of(String name, Table table) {
    Well well = of(name, table.get("depth"));
    for (String column : table.names()) {
      if (table.isNumeric(column) && !column.equalsIgnoreCase(well.depth.name())) {
        well.add(column, table.get(column));
      }
    }
    return well;
  }

  static String key(String name) {
    return name.toUpperCase(Locale.ROOT);
  }

  /** Returns the name. */
  public String name() {
    return name;
  }

  /** Returns the same well under another name. */
  public Well named(String other) {
    return new Well(other, source, file, depth, curves);
  }

  /** Returns the depth of each row. */
  public Series depth() {
    return depth;
  }

  /** Returns the number of rows. */
  public int rows() {
    return depth.size();
  }

  /**
   * Returns the least depth.
   *
   * @throws IllegalArgumentException if there is no row
   */
  public Length top() {
    return depthOf(line.shallowest());
  }

  /**
   * Returns the greatest depth.
   *
   * @throws IllegalArgumentException if there is no row
   */
  public Length base() {
    return depthOf(line.deepest());
  }

  /**
   * Returns the usual distance between two rows: the median.
   *
   * @throws IllegalArgumentException if there are no two depths
   */
  public Length step() {
    if (!hasStep()) {
      throw new IllegalArgumentException("well " + name + " has no two depths, so no step");
    }
    return Units.m(line.step()).to(lengthUnit());
  }

  private Length depthOf(int row) {
    if (row < 0) {
      throw new IllegalArgumentException("well " + name + " has no row with a depth");
    }
    return lengthUnit().of(depth.value(row));
  }

  boolean hasStep() {
    return !Double.isNaN(line.step());
  }

  private Unit<Length> lengthUnit() {
    return Length.DIMENSION.find(depth.unit().symbol()).orElse(Units.m);
  }

  /** Returns the file as it was read, empty for a well that comes from elsewhere. */
  public Optional<LasFile> file() {
    return Optional.ofNullable(file);
  }

  /** Returns what the header says under a mnemonic, empty where it says nothing. */
  public String header(String mnemonic) {
    return file == null ? "" : file.item(mnemonic).map(HeaderLine::value).orElse("");
  }

  /** Returns the names of the curves, without the depth. */
  public List<String> names() {
    return curves.values().stream().map(WellCurve::name).toList();
  }

  /** Returns the curves of numbers by name, without the depth, in their order. */
  public Map<String, Series> curves() {
    Map<String, Series> all = new LinkedHashMap<>();
    for (WellCurve curve : curves.values()) {
      if (!curve.isText()) {
        all.put(curve.name(), curve.series());
      }
    }
    return all;
  }

  /** Returns depth and curves of numbers as a table. */
  public Table table() {
    List<Series> columns = new ArrayList<>();
    columns.add(depth);
    columns.addAll(curves().values());
    return Table.of(name, columns.toArray(Series[]::new));
  }

  /** Returns which curve stands for which role, as {@link #get} would find it. */
  public Map<String, String> roles() {
    Map<String, String> found = new LinkedHashMap<>();
    for (Role role : Roles.all()) {
      ranked(role).stream().findFirst().ifPresent(c -> found.put(role.name(), c.name()));
    }
    return found;
  }

  /** Tells whether there is a curve of this mnemonic or role. */
  public boolean has(String nameOrRole) {
    return isDepth(nameOrRole) || find(nameOrRole).isPresent();
  }

  /**
   * Returns a curve.
   *
   * @param nameOrRole the mnemonic, in capitals or not, or the role in plain words
   * @throws IllegalArgumentException if there is none
   */
  public Series get(String nameOrRole) {
    if (isDepth(nameOrRole)) {
      return depth;
    }
    WellCurve curve = wanted(nameOrRole);
    if (curve.isText()) {
      throw new IllegalArgumentException(
          "well "
              + name
              + ": "
              + curve.name()
              + " holds words: ask with labels(\""
              + curve.name()
              + "\")");
    }
    return curve.series();
  }

  /**
   * Returns a curve of words.
   *
   * @throws IllegalArgumentException if there is none, or if it holds numbers
   */
  public Labels labels(String nameOrRole) {
    return wanted(nameOrRole)
        .labels()
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "well " + name + ": " + nameOrRole + " holds numbers, no words"));
  }

  private WellCurve wanted(String nameOrRole) {
    return find(nameOrRole)
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "well " + name + " has no curve " + Nearest.miss(nameOrRole, names())));
  }

  private boolean isDepth(String nameOrRole) {
    return key(nameOrRole).equals(key(depth.name()))
        || nameOrRole.equalsIgnoreCase("depth") && !curves.containsKey("DEPTH");
  }

  private Optional<WellCurve> find(String nameOrRole) {
    WellCurve exact = curves.get(key(nameOrRole));
    if (exact != null) {
      return Optional.of(exact);
    }
    return Roles.named(nameOrRole).flatMap(this::byRole);
  }

  /** Returns the curves of a role, the most wanted first. */
  private List<WellCurve> ranked(Role role) {
    List<WellCurve> all = new ArrayList<>();
    for (WellCurve curve : curves.values()) {
      if (curve.role().filter(r -> r.name().equals(role.name())).isPresent()) {
        all.add(curve);
      }
    }
    all.sort((a, b) -> Integer.compare(role.rank(a.mnemonic()), role.rank(b.mnemonic())));
    return all;
  }

  private Optional<WellCurve> byRole(Role role) {
    List<WellCurve> all = ranked(role);
    if (all.size() > 1) {
      Listening.caution(
          Caution.of(
              "W01",
              name,
              "well "
                  + name
                  + ": "
                  + all.get(0).name()
                  + " was taken for "
                  + role.name()
                  + "; there are also "
                  + String.join(", ", all.stream().skip(1).map(WellCurve::name).toList())));
    }
    return all.stream().findFirst();
  }

  /**
   * Adds a curve, or replaces one that was added before.
   *
   * @param curveName its name
   * @param series its values, one for each row of this well
   * @throws IllegalArgumentException if it has another number of rows or stands at other depths, or
   *     if the file has a curve of this name
   */
  public Well add(String curveName, Series series) {
    if (series.size() != rows()) {
      throw new IllegalArgumentException(
          "well "
              + name
              + " has "
              + rows()
              + " rows, "
              + series.name()
              + " "
              + series.size()
              + ": sample one at the depths of the other with at(…)");
    }
    series.depth().ifPresent(d -> checkDepth(series, d));
    WellCurve old = curves.get(key(curveName));
    if (isDepth(curveName) || old != null && !old.isAdded()) {
      throw new IllegalArgumentException(
          "well " + name + " has a curve " + curveName + " from its file: choose another name");
    }
    Series own = series.named(curveName).atDepth(depth);
    curves.put(key(curveName), WellCurve.added(curveName, own));
    return this;
  }

  private void checkDepth(Series series, Series other) {
    double[] own = depth.in(Units.m);
    double[] theirs = other.in(Units.m);
    for (int row = 0; row < own.length; row++) {
      if (Math.abs(own[row] - theirs[row]) > 1e-6) {
        throw new IllegalArgumentException(
            "well "
                + name
                + ": "
                + series.name()
                + " stands at other depths, first in row "
                + (row + 1)
                + "; sample it with at(…)");
      }
    }
  }

  /** Returns the part between two depths, both included. */
  public Well between(Length from, Length to) {
    return chosen(line.rows(from.metres(), to.metres(), true));
  }

  /** Returns the part in a zone: its top included, its base not, so that no row is in two zones. */
  public Well in(Zone zone) {
    if (!zone.well().equalsIgnoreCase(name)) {
      throw new IllegalArgumentException(zone + " is of well " + zone.well() + ", not " + name);
    }
    return chosen(line.rows(zone.top().metres(), zone.base().metres(), false));
  }

  private Well chosen(int... rows) {
    Series part = Series.over(depth.name(), depth.unit(), depth.rows(rows).values(), null);
    Well well = new Well(name, source, file, part, Map.of());
    curves.forEach((k, curve) -> well.curves.put(k, curve.rows(rows, well.depth)));
    return well;
  }

  /**
   * Returns the logs at other depths, such as those of plugs: linear between neighbours, missing
   * across gaps of more than two steps. Curves of words are left out.
   *
   * @param depths the depths, or a series that stands at depths
   */
  public Well at(Series depths) {
    Series wanted = depths.depth().orElse(depths);
    double[] metres = wanted.in(Units.m);
    Series own = Series.over(depth.name(), wanted.unit(), wanted.values(), null);
    Well well = new Well(name, source, file, own, Map.of());
    curves.forEach(
        (k, curve) -> {
          if (!curve.isText()) {
            double[] values = line.sample(curve.series().values(), metres);
            well.curves.put(k, curve.sampled(values, well.depth));
          }
        });
    return well;
  }

  /**
   * Returns the logs at an even step from the first whole multiple of it on.
   *
   * @param step the step
   */
  public Well resample(Length step) {
    double metres = step.metres();
    if (!(metres > 0)) {
      throw new IllegalArgumentException("the step is " + step + ", where it must be above 0");
    }
    Unit<Length> unit = lengthUnit();
    double size = step.in(unit);
    double first = Math.ceil(top().in(unit) / size - 1e-9);
    double last = Math.floor(base().in(unit) / size + 1e-9);
    double[] depths = new double[(int) Math.max(0, last - first + 1)];
    for (int i = 0; i < depths.length; i++) {
      depths[i] = (first + i) * size;
    }
    return at(Series.of(depth.name(), unit, depths));
  }

  /** Returns vertical depths below the same datum, added as TVD. */
  public Well add(Survey survey) {
    return add("TVD", survey.vertical(depth));
  }

  /**
   * Writes the logs as LAS 2.0, with the header lines of the file it came from.
   *
   * @param path where it goes; an old file is replaced whole
   */
  public void writeLas(Path path) {
    List<LasColumn> columns = new ArrayList<>();
    columns.add(WellCurve.column(depth, file == null ? null : file.index()));
    curves.values().forEach(c -> columns.add(c.column()));
    if (file == null) {
      LasWriter.write(path, List.of(HeaderLine.of("WELL", "", name, "WELL")), columns);
    } else {
      LasWriter.write(path, file, columns);
    }
  }

  @Override
  public Listing listing() {
    return WellListing.of(this, file, source, List.copyOf(curves.values()));
  }

  @Override
  public String toString() {
    return listing().toString();
  }
}
