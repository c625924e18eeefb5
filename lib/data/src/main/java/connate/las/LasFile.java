package connate.las;

import connate.fault.DataException;
import connate.fault.Fault;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Optional;

/**
 * The content of a LAS file: header lines as they stand, curves as columns, quirks.
 *
 * <p>Values equal to the declared null are NaN; the index, which {@link #index()} gives, has none.
 * Curves keep the order of the curve section.
 */
public final class LasFile {

  private static final long MOST_BYTES = 1L << 30;

  private final String name;
  private final long bytes;
  private final LasHead head;
  private final List<LasCurve> curves;
  private final int index;
  private final List<LasSet> sets;
  private final List<Quirk> quirks;

  LasFile(
      String name,
      long bytes,
      LasHead head,
      List<LasCurve> curves,
      int index,
      List<LasSet> sets,
      List<Quirk> quirks) {
    this.name = name;
    this.bytes = bytes;
    this.head = head;
    this.curves = List.copyOf(curves);
    this.index = index;
    this.sets = List.copyOf(sets);
    this.quirks = List.copyOf(quirks);
  }

  /**
   * Reads a file.
   *
   * @param path where it lies
   * @throws DataException if it cannot be read, or leaves a question open
   */
  public static LasFile read(Path path) {
    return read(path, LasOptions.STRICT);
  }

  /**
   * Reads a file with answers to the questions it leaves open.
   *
   * @param path where it lies
   * @param options the answers
   * @throws DataException if it cannot be read, or leaves a question open
   */
  public static LasFile read(Path path, LasOptions options) {
    return parse(path.toString(), content(path), options);
  }

  /**
   * Reads the bytes of a file.
   *
   * @param name the name by which messages call it
   * @param content its bytes, which are not kept
   * @throws DataException if it leaves a question open
   */
  public static LasFile parse(String name, byte[] content) {
    return parse(name, content, LasOptions.STRICT);
  }

  /**
   * Reads the bytes of a file with answers to the questions it leaves open.
   *
   * @param name the name by which messages call it
   * @param content its bytes, which are not kept
   * @param options the answers
   * @throws DataException if it leaves a question open
   */
  public static LasFile parse(String name, byte[] content, LasOptions options) {
    Objects.requireNonNull(name, "name");
    return new LasReader(name, content, options).read();
  }

  private static byte[] content(Path path) {
    String name = path.toString();
    try {
      if (Files.isDirectory(path)) {
        throw refusal(name, "is a folder, where a LAS file was expected", "name a file in it");
      }
      if (Files.size(path) > MOST_BYTES) {
        throw refusal(name, "is larger than 1 GiB", "split the file");
      }
      return Files.readAllBytes(path);
    } catch (NoSuchFileException e) {
      throw refusal(name, "there is no such file", "paths are relative to the workbook's folder");
    } catch (IOException e) {
      throw refusal(name, "cannot be read: " + e.getMessage(), "check the file's permissions");
    }
  }

  private static DataException refusal(String name, String message, String help) {
    return new DataException(Fault.ofFile(name, "L01", message, help));
  }

  /** Returns the name by which the file was opened. */
  public String name() {
    return name;
  }

  /** Returns the number of bytes. */
  public long bytes() {
    return bytes;
  }

  /** Returns the version of the format. */
  public LasVersion version() {
    return head.version();
  }

  /** Returns the sections in the order of the file. */
  public List<LasSection> sections() {
    return head.sections();
  }

  /** Returns the header lines of a kind of section, none where there is no such section. */
  public List<HeaderLine> items(LasSection.Kind kind) {
    return head.items(kind);
  }

  /** Returns the first header line of a name: of the well section, else of the parameters. */
  public Optional<HeaderLine> item(String mnemonic) {
    return head.item(mnemonic);
  }

  /** Returns the declared null value, NaN where there is none. */
  public double nullValue() {
    return head.nullValue();
  }

  /** Returns the curves, the index among them, in the order of the curve section. */
  public List<LasCurve> curves() {
    return curves;
  }

  /** Returns a curve by its name or mnemonic, in capitals or not. */
  public Optional<LasCurve> curve(String named) {
    String wanted = named.toUpperCase(Locale.ROOT);
    return curves.stream()
        .filter(c -> c.name().toUpperCase(Locale.ROOT).equals(wanted))
        .findFirst();
  }

  /** Returns the index curve. */
  public LasCurve index() {
    return curves.get(index);
  }

  /** Returns the number of rows. */
  public int rows() {
    return index().size();
  }

  /** Returns the data sets beside the log, in a file of version 3.0. */
  public List<LasSet> sets() {
    return sets;
  }

  /** Returns what is unusual in the file, cautions first. */
  public List<Quirk> quirks() {
    return quirks;
  }

  @Override
  public String toString() {
    return name + ": LAS " + version() + ", " + curves.size() + " curves, " + rows() + " rows";
  }
}
