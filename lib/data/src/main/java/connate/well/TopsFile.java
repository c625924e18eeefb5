package connate.well;

import connate.fault.DataException;
import connate.fault.Fault;
import connate.fault.Nearest;
import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Numbers;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.role.Role;
import connate.role.Roles;
import connate.series.Labels;
import connate.series.Series;
import connate.series.Unstated;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * A text file of one well with tops and logs, as national surveys publish them:
 *
 * <pre>
 * % UNITS: FT
 * % Formations
 * Sussex Upper Top    8170.00
 * % Porosity
 * 8166.00    6.000
 * </pre>
 *
 * <p>Lines {@code % KEY: value} are the header; a line {@code % Name} opens a section. Rows are
 * split by tabs, or by the last blanks. A section whose rows start with words holds tops, one whose
 * rows start with numbers a log. UNITS is the unit of all depths. A depth or value of -999.25 is
 * absent.
 *
 * <p>The unit of a log does not stand in such a file. Where its name has the role of a part of a
 * whole, such as porosity, values above 1 can only be percent; else they are read as a fraction.
 * Either is told in a caution. A part below 0 cannot be and is missing, with a caution.
 */
public final class TopsFile {

  /** Error: the text cannot be read as such a file. */
  static final String BAD = "W41";

  /** Caution: the unit of a log was taken from its values. */
  static final String UNIT_GUESSED = "W42";

  /** Caution: a part of a whole below 0. */
  static final String NEGATIVE = "W43";

  private static final double NONE = -999.25;

  private final String name;
  private final Unit<Length> unit;
  private final Map<String, String> header;
  private final Tops tops;
  private final Map<String, Series> logs;

  private TopsFile(
      String name,
      Unit<Length> unit,
      Map<String, String> header,
      Tops tops,
      Map<String, Series> logs) {
    this.name = name;
    this.unit = unit;
    this.header = header;
    this.tops = tops;
    this.logs = logs;
  }

  /**
   * Reads a file. The well is named as the file, without {@code UWI_} and the extension.
   *
   * @throws DataException if it cannot be read
   */
  public static TopsFile read(Path path) {
    try {
      return parse(path.toString(), Files.readAllBytes(path));
    } catch (IOException e) {
      throw new DataException(
          Fault.ofFile(
              path.toString(), BAD, "cannot be read: " + e.getMessage(), "look at the path"));
    }
  }

  /**
   * Reads the bytes of a file.
   *
   * @param file the name by which messages call it
   * @param content its bytes
   * @throws DataException if it cannot be read
   */
  public static TopsFile parse(String file, byte[] content) {
    return new Parse(file, new String(content, StandardCharsets.UTF_8)).run();
  }

  /** Returns the well's name. */
  public String name() {
    return name;
  }

  /** Returns the unit of all depths. */
  public Unit<Length> unit() {
    return unit;
  }

  /** Returns what the header says under a key, empty where it says nothing. */
  public String header(String key) {
    return header.getOrDefault(Well.key(key), "");
  }

  /** Returns the tops. */
  public Tops tops() {
    return tops;
  }

  /** Returns the logs by the names of their sections, each at its own depths. */
  public Map<String, Series> logs() {
    return logs;
  }

  /**
   * Returns the well with the log of one section.
   *
   * @throws IllegalArgumentException if there is no such section
   */
  public Well well(String section) {
    Series log = logs.get(section);
    if (log == null) {
      throw new IllegalArgumentException(
          "well " + name + " has no section " + Nearest.miss(section, logs.keySet()));
    }
    return Well.of(name, log.depth().orElseThrow()).add(section, log);
  }

  /** Reads one text. */
  private static final class Parse {

    private final String file;
    private final String[] lines;
    private final Map<String, String> header = new LinkedHashMap<>();
    private final Map<String, Series> logs = new LinkedHashMap<>();
    private final List<String> topNames = new ArrayList<>();
    private final List<Double> topDepths = new ArrayList<>();
    private final List<double[]> rows = new ArrayList<>();
    private String section = "";

    Parse(String file, String text) {
      this.file = file;
      this.lines = text.split("\r\n|\r|\n", -1);
    }

    TopsFile run() {
      for (int i = 0; i < lines.length; i++) {
        String line = lines[i].strip();
        if (line.startsWith("%")) {
          title(i + 1, line.substring(1).strip());
        } else if (!line.isEmpty()) {
          row(i + 1, line);
        }
      }
      close();
      Unit<Length> unit = unit();
      String name = wellName(file);
      String[] wells = new String[topNames.size()];
      java.util.Arrays.fill(wells, name);
      double[] depths = topDepths.stream().mapToDouble(Double::doubleValue).toArray();
      Tops tops =
          Tops.of(
              Labels.of("well", wells),
              Labels.of("top", topNames.toArray(String[]::new)),
              Series.of("depth", unit, depths));
      return new TopsFile(name, unit, Map.copyOf(header), tops, logs);
    }

    private void title(int number, String words) {
      int colon = words.indexOf(':');
      if (colon > 0 && section.isEmpty()) {
        header.put(Well.key(words.substring(0, colon).strip()), words.substring(colon + 1).strip());
        return;
      }
      close();
      section = words;
      if (section.isEmpty()) {
        throw refused(number, "a section without a name", "write % Name");
      }
    }

    private void row(int number, String line) {
      int split = Math.max(line.lastIndexOf('\t'), line.lastIndexOf(' '));
      if (section.isEmpty() || split < 0) {
        throw refused(number, "expected «% KEY: value» or a row of two values", "see help");
      }
      String left = line.substring(0, split).strip();
      double value = number(number, line.substring(split + 1));
      double first = parsed(left);
      if (Double.isNaN(first)) {
        topNames.add(left);
        topDepths.add(value);
      } else {
        rows.add(new double[] {first, value == NONE ? Double.NaN : value});
      }
    }

    private double number(int number, String text) {
      double value = parsed(text);
      if (Double.isNaN(value)) {
        throw refused(number, "«" + text + "» is not a number", "correct the row");
      }
      return value;
    }

    private static double parsed(String text) {
      return text.matches("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d+)?")
          ? Double.parseDouble(text)
          : Double.NaN;
    }

    private void close() {
      if (rows.isEmpty()) {
        return;
      }
      double[] depths = rows.stream().mapToDouble(r -> r[0]).toArray();
      double[] values = rows.stream().mapToDouble(r -> r[1]).toArray();
      Series depth = Series.of("depth", unit(), depths);
      Unit<?> valueUnit = valueUnit(values);
      if (valueUnit.dimension() == Fraction.DIMENSION) {
        leaveOutNegative(depths, values);
      }
      logs.put(section, Series.of(section, valueUnit, values).atDepth(depth));
      rows.clear();
    }

    private void leaveOutNegative(double[] depths, double[] values) {
      for (int row = 0; row < values.length; row++) {
        if (values[row] < 0) {
          Listening.caution(
              Caution.of(
                  NEGATIVE,
                  file,
                  file
                      + ": "
                      + section
                      + " is "
                      + Numbers.record(values[row])
                      + " at "
                      + Numbers.record(depths[row])
                      + ", which cannot be: read as missing"));
          values[row] = Double.NaN;
        }
      }
    }

    private Unit<Length> unit() {
      String symbol = header.getOrDefault("UNITS", "");
      return Length.DIMENSION
          .find(symbol)
          .orElseThrow(
              () ->
                  refused(
                      1,
                      symbol.isEmpty()
                          ? "no UNITS in the header"
                          : "«" + symbol + "» is no unit of depth",
                      "write % UNITS: FT or % UNITS: M"));
    }

    private Unit<?> valueUnit(double[] values) {
      Unit<?> wanted = Roles.find(section, "").map(Role::unit).orElse(null);
      if (wanted == null || wanted.dimension() != Fraction.DIMENSION) {
        return Unstated.UNIT;
      }
      boolean isPercent = false;
      for (double value : values) {
        isPercent |= value > 1;
      }
      Listening.caution(
          Caution.of(
              UNIT_GUESSED,
              file,
              file
                  + ": "
                  + section
                  + " has no unit; read as "
                  + (isPercent
                      ? "percent, because values are above 1"
                      : "a fraction, because no value is above 1")));
      return isPercent ? Units.percent : Units.fraction;
    }

    private static String wellName(String file) {
      String last = file.substring(Math.max(file.lastIndexOf('/'), file.lastIndexOf('\\')) + 1);
      int dot = last.lastIndexOf('.');
      String bare = dot > 0 ? last.substring(0, dot) : last;
      return bare.toUpperCase(Locale.ROOT).startsWith("UWI_") ? bare.substring(4) : bare;
    }

    private DataException refused(int number, String message, String help) {
      String line = lines[number - 1];
      return new DataException(new Fault(file, number, 1, 1, BAD, message, line, help));
    }
  }
}
