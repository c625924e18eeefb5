package connate.well;

import connate.fault.Nearest;
import connate.las.LasSet;
import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Length;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Labels;
import connate.series.Listed;
import connate.series.Listing;
import connate.series.Series;
import connate.table.Table;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Tops of several wells, and the zones between them. A zone reaches from its top to the next deeper
 * top of the same well, whatever order the table has; the deepest reaches to the end of the log. A
 * depth that is missing, or -999.25, means that the well does not have the top.
 */
public final class Tops implements Listed {

  /** Caution: tops at the same depth. */
  static final String SAME_DEPTH = "W21";

  /** Caution: tops in another order than in the well before. */
  static final String OTHER_ORDER = "W22";

  /** Caution: tops that a well does not have. */
  static final String ABSENT = "W23";

  /** Caution: the same top twice in one well. */
  static final String TWICE = "W24";

  private static final Set<String> ENDS = Set.of("BASE", "TD", "TOTAL DEPTH", "END");
  private static final double[] NONE = {-999.25, -999, -9999};

  /** One top. */
  private record Top(String name, Length depth) {}

  private final Map<String, List<Top>> byWell;
  private final Map<String, String> spelling;

  private Tops(Map<String, List<Top>> byWell, Map<String, String> spelling) {
    this.byWell = byWell;
    this.spelling = spelling;
  }

  /**
   * Returns the tops of a table's columns, one row for each top.
   *
   * @param wells the wells' names
   * @param names the tops' names
   * @param depths their depths
   */
  public static Tops of(Labels wells, Labels names, Series depths) {
    if (wells.size() != names.size() || wells.size() != depths.size()) {
      throw new IllegalArgumentException("wells, names and depths of tops must have the same rows");
    }
    Map<String, List<Top>> byWell = new LinkedHashMap<>();
    Map<String, String> spelling = new LinkedHashMap<>();
    List<String> absent = new ArrayList<>();
    Unit<Length> unit = lengthUnit(depths);
    for (int row = 0; row < depths.size(); row++) {
      String well = wells.label(row);
      String name = names.label(row);
      if (well == null || name == null) {
        throw new IllegalArgumentException("row " + (row + 1) + " of the tops lacks a name");
      }
      spelling.putIfAbsent(Well.key(well), well);
      List<Top> tops = byWell.computeIfAbsent(Well.key(well), w -> new ArrayList<>());
      if (isNone(depths.value(row))) {
        absent.add(name + " in " + well);
      } else {
        tops.add(new Top(name, unit.of(depths.value(row))));
      }
    }
    tellAbsent(absent);
    byWell.forEach((well, tops) -> settle(spelling.get(well), tops));
    tellOrder(byWell, spelling);
    return new Tops(byWell, spelling);
  }

  /**
   * Returns the tops of a table with the columns well, zone and top (or depth), one row for each.
   *
   * @throws IllegalArgumentException if a column is missing
   */
  public static Tops of(Table table) {
    String depth = table.has("top") && table.isNumeric("top") ? "top" : "depth";
    return of(table.labels("well"), table.labels("zone"), table.get(depth));
  }

  /**
   * Returns the tops that a LAS 3.0 file carries beside its log.
   *
   * @throws IllegalArgumentException if it carries none
   */
  public static Tops of(Well well) {
    LasSet set =
        well.file().stream()
            .flatMap(f -> f.sets().stream())
            .filter(s -> s.name().toUpperCase(java.util.Locale.ROOT).startsWith("TOPS"))
            .findFirst()
            .orElseThrow(
                () -> new IllegalArgumentException("well " + well.name() + " carries no tops"));
    List<String> names = set.column("TOPN");
    List<String> depths = set.column("TOPT");
    String[] wells = new String[names.size()];
    double[] values = new double[names.size()];
    for (int row = 0; row < values.length; row++) {
      wells[row] = well.name();
      values[row] = depths.get(row).isEmpty() ? Double.NaN : Double.parseDouble(depths.get(row));
    }
    String unit =
        set.columns().stream().filter(c -> c.isNamed("TOPT")).findFirst().orElseThrow().unit();
    return of(
        Labels.of("well", wells),
        Labels.of("top", names.toArray(String[]::new)),
        Series.of("depth", CurveUnits.depth(unit).orElse(well.depth().unit()), values));
  }

  /** Returns the tops of several files together; a well that comes twice has the tops of both. */
  public static Tops of(List<Tops> several) {
    Map<String, List<Top>> byWell = new LinkedHashMap<>();
    Map<String, String> spelling = new LinkedHashMap<>();
    for (Tops some : several) {
      some.spelling.forEach(spelling::putIfAbsent);
      some.byWell.forEach(
          (well, tops) -> byWell.computeIfAbsent(well, w -> new ArrayList<>()).addAll(tops));
    }
    byWell.forEach((well, tops) -> settle(spelling.get(well), tops));
    tellOrder(byWell, spelling);
    return new Tops(byWell, spelling);
  }

  private static boolean isNone(double value) {
    boolean none = Double.isNaN(value);
    for (double mark : NONE) {
      none |= value == mark;
    }
    return none;
  }

  private static Unit<Length> lengthUnit(Series depths) {
    depths.in(Units.m);
    return Length.DIMENSION.find(depths.unit().symbol()).orElseThrow();
  }

  private static void settle(String well, List<Top> tops) {
    tops.sort((a, b) -> a.depth.compareTo(b.depth));
    Set<String> seen = new LinkedHashSet<>();
    for (Top top : tops) {
      if (!seen.add(Well.key(top.name))) {
        Listening.caution(
            Caution.of(TWICE, well, "well " + well + " has the top " + top.name + " twice"));
      }
    }
  }

  private static void tellAbsent(List<String> absent) {
    if (!absent.isEmpty()) {
      Listening.caution(
          Caution.of(ABSENT, "tops", absent.size() + " tops are absent: " + some(absent)));
    }
  }

  private static String some(List<String> names) {
    int shown = Math.min(6, names.size());
    return String.join(", ", names.subList(0, shown))
        + (names.size() > shown ? " and " + (names.size() - shown) + " more" : "");
  }

  private static void tellOrder(Map<String, List<Top>> byWell, Map<String, String> spelling) {
    Set<String> inverted = new LinkedHashSet<>();
    Map<String, String> above = new LinkedHashMap<>();
    byWell.forEach(
        (well, tops) -> {
          for (int i = 0; i < tops.size(); i++) {
            for (Top lower : tops.subList(i + 1, tops.size())) {
              Top upper = tops.get(i);
              String other = firstWellTheOtherWay(above, well, upper, lower);
              if (!other.isEmpty()) {
                inverted.add(
                    upper.name
                        + " lies above "
                        + lower.name
                        + " in "
                        + spelling.get(well)
                        + ", below it in "
                        + spelling.get(other));
              }
            }
          }
        });
    if (!inverted.isEmpty()) {
      Listening.caution(Caution.of(OTHER_ORDER, "tops", some(List.copyOf(inverted))));
    }
  }

  /** Notes which top lies above which, and returns a well seen before that has them turned. */
  private static String firstWellTheOtherWay(
      Map<String, String> above, String well, Top upper, Top lower) {
    if (!upper.depth.isBelow(lower.depth)) {
      return "";
    }
    above.putIfAbsent(Well.key(upper.name) + "\n" + Well.key(lower.name), well);
    String other = above.get(Well.key(lower.name) + "\n" + Well.key(upper.name));
    return other == null || other.equals(well) ? "" : other;
  }

  /** Returns the names of the wells, in the order of the table. */
  public List<String> wells() {
    return List.copyOf(spelling.values());
  }

  /** Returns the names of all tops, in the order of depth of the well that has most of them. */
  public List<String> names() {
    Set<String> names = new LinkedHashSet<>();
    byWell.values().stream()
        .sorted((a, b) -> Integer.compare(b.size(), a.size()))
        .forEach(tops -> tops.forEach(t -> names.add(t.name)));
    return List.copyOf(names);
  }

  /**
   * Returns the depth of a top.
   *
   * @throws IllegalArgumentException if the well is not known, or does not have the top
   */
  public Length depth(String well, String top) {
    return tops(well).stream()
        .filter(t -> t.name.equalsIgnoreCase(top))
        .findFirst()
        .map(Top::depth)
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "well "
                        + well
                        + " has no top "
                        + Nearest.miss(top, tops(well).stream().map(Top::name).toList())));
  }

  private List<Top> tops(String well) {
    List<Top> tops = byWell.get(Well.key(well));
    if (tops == null) {
      throw new IllegalArgumentException("the tops know no well " + Nearest.miss(well, wells()));
    }
    return tops;
  }

  /** Tells whether there are tops of a well. */
  public boolean has(String well) {
    return byWell.containsKey(Well.key(well));
  }

  /**
   * Returns the zones of a well from top to bottom. A zone without thickness is left out, with a
   * caution; the deepest top opens a zone only where the log reaches below it, and none where it is
   * named base, end or TD.
   */
  public List<Zone> zones(Well well) {
    List<Zone> zones = new ArrayList<>(zones(well.name()));
    List<Top> tops = tops(well.name());
    if (!tops.isEmpty()) {
      Top last = tops.get(tops.size() - 1);
      boolean isOpen = !ENDS.contains(Well.key(last.name));
      if (isOpen && well.rows() > 0 && last.depth.isBelow(well.base())) {
        zones.add(new Zone(well.name(), last.name, last.depth, well.base()));
      }
    }
    return List.copyOf(zones);
  }

  /** Returns the zones of a well between its tops, without the one below the deepest. */
  public List<Zone> zones(String well) {
    List<Top> tops = tops(well);
    List<Zone> zones = new ArrayList<>();
    for (int i = 0; i + 1 < tops.size(); i++) {
      Top top = tops.get(i);
      if (top.depth.isBelow(tops.get(i + 1).depth)) {
        zones.add(
            new Zone(spelling.get(Well.key(well)), top.name, top.depth, tops.get(i + 1).depth));
      } else {
        Listening.caution(
            Caution.of(
                SAME_DEPTH,
                well,
                "well "
                    + well
                    + ": "
                    + top.name
                    + " and "
                    + tops.get(i + 1).name
                    + " stand at the same depth, "
                    + top.depth
                    + "; "
                    + top.name
                    + " has no thickness and is left out"));
      }
    }
    return zones;
  }

  /**
   * Returns one zone of a well.
   *
   * @throws IllegalArgumentException if the well does not have it
   */
  public Zone zone(Well well, String name) {
    List<Zone> zones = zones(well);
    return zones.stream()
        .filter(z -> z.name().equalsIgnoreCase(name))
        .findFirst()
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "well "
                        + well.name()
                        + " has no zone "
                        + Nearest.miss(name, zones.stream().map(Zone::name).toList())));
  }

  @Override
  public Listing listing() {
    Listing.Builder table = Listing.titled("tops of " + byWell.size() + " wells").column("top");
    spelling.values().forEach(table::column);
    for (String name : names()) {
      Object[] cells = new Object[byWell.size() + 1];
      cells[0] = name;
      int i = 1;
      for (List<Top> tops : byWell.values()) {
        cells[i++] =
            tops.stream()
                .filter(t -> t.name.equalsIgnoreCase(name))
                .findFirst()
                .map(Top::depth)
                .orElse(null);
      }
      table.row(cells);
    }
    return table.build();
  }

  @Override
  public String toString() {
    return listing().toString();
  }
}
