package connate.engine;

import connate.chance.Exceedance;
import connate.chance.Sampling;
import connate.protocol.Event;
import connate.protocol.Item;
import connate.quantity.Quantity;
import connate.series.Estimate;
import connate.table.Table;
import connate.well.Survey;
import connate.well.Tops;
import connate.well.Well;
import connate.well.Wells;
import java.util.Locale;
import java.util.function.Function;

/** The words of a workbook; its commands see them without a prefix. */
public final class Vocabulary {

  private static volatile Session session;

  private Vocabulary() {}

  static void serve(Session current) {
    session = current;
  }

  private static Session session() {
    Session current = session;
    if (current == null) {
      throw new IllegalStateException("these words work in a workbook or the console only");
    }
    return current;
  }

  /** Puts values, tables and figures into the log; several stand together. */
  public static void show(Object... values) {
    Object[] all = values == null ? new Object[] {null} : values;
    Session current = session();
    current.tell(new Event.Shown(Rendering.together(current.nextId(), all)));
  }

  /** Keeps a result: it stands first in the log and is compared between replays. */
  public static void keep(String name, Quantity<?> value) {
    kept(name, value);
  }

  /** Keeps a result with its range. */
  public static void keep(String name, Estimate<?> value) {
    kept(name, value);
  }

  /** Keeps a result with the values that so many percent of the runs exceed. */
  public static void keep(String name, Exceedance value) {
    kept(name, value);
  }

  /** Keeps a pure number. */
  public static void keep(String name, double value) {
    kept(name, value);
  }

  /** Keeps a count. */
  public static void keep(String name, long value) {
    kept(name, value);
  }

  private static void kept(String name, Object value) {
    if (value == null) {
      throw new IllegalArgumentException("there is nothing to keep as «" + name + "»");
    }
    session().keep(name, Measures.find(value).orElseThrow());
  }

  /** States an assumption and returns the value in force, which a replay may set. */
  public static <Q extends Quantity<Q>> Q assume(String name, Q value) {
    return assumed(name, value, text -> value.unit().dimension().parse(text), Measures::of);
  }

  /** States an assumption that is a pure number. */
  public static double assume(String name, double value) {
    return assumed(name, value, Double::valueOf, Vocabulary::measure);
  }

  /** States an assumption that is a whole number. */
  public static int assume(String name, int value) {
    return assumed(name, value, Integer::valueOf, Vocabulary::measure);
  }

  /** States an assumption that is yes or no. */
  public static boolean assume(String name, boolean value) {
    return assumed(name, value, Assumptions::yesOrNo, Measures::word);
  }

  /** States an assumption that is a name or another text. */
  public static String assume(String name, String value) {
    return assumed(name, value, text -> text, Measures::word);
  }

  private static <T> T assumed(
      String name, T value, Function<String, T> parse, Function<T, Item.Measure> measure) {
    return session().assumptions().settle(name, value, parse, measure);
  }

  private static Item.Measure measure(Number number) {
    return Measures.find(number).orElseThrow();
  }

  /** Reads a table from a CSV or XLSX file. */
  public static Table table(String file) {
    return table(file, "");
  }

  /** Reads a table from a sheet of an XLSX file. */
  public static Table table(String file, String sheet) {
    return Reading.table(session().inputs().read(file), sheet, session().teller());
  }

  /** Reads the tops of zones from a table with a column each for well, zone and top. */
  public static Tops tops(String file) {
    return Tops.of(table(file));
  }

  /** Reads a well's path from a table of measured depth, inclination and azimuth, or from LAS. */
  public static Survey survey(String file) {
    boolean las = file.toLowerCase(Locale.ROOT).endsWith(".las");
    return las ? Survey.of(well(file)) : Survey.of(table(file));
  }

  /** Reads a well from a LAS file. */
  public static Well well(String file) {
    return Reading.well(session().inputs().read(file), session().teller());
  }

  /** Reads the wells whose LAS files a pattern names, such as {@code wells/*.las}. */
  public static Wells wells(String pattern) {
    return Wells.of(
        session().inputs().matching(pattern).stream()
            .map(input -> Reading.well(input, session().teller()))
            .toList());
  }

  /** Returns draws from the seed of this replay. */
  public static Sampling seed() {
    return Sampling.seed(session().seed());
  }

  /** Returns draws from a seed of the workbook's own. */
  public static Sampling seed(long number) {
    return Sampling.seed(number);
  }
}
