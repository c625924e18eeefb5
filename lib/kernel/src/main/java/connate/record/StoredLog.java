package connate.record;

import connate.fault.DataException;
import connate.fault.Fault;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Base64;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * A log that was written before, read from its record. Reading runs nothing and trusts nothing:
 * each digest is checked where its bytes are.
 *
 * @param file the log's file
 * @param page the whole page
 * @param record the record
 * @param pack the packed files, empty where none are
 */
public record StoredLog(
    Path file, String page, Map<String, Object> record, Optional<Map<String, Object>> pack) {

  private static final long LARGEST = 1L << 30;
  private static final String BLOCK = "<script type=\"application/json\" id=\"";

  /**
   * A kept result or an assumption.
   *
   * @param name its name
   * @param value the number as written, empty where it is no number
   * @param unit the unit
   * @param low the low end as written
   * @param high the high end as written
   * @param text the value in words
   * @param line the workbook's line
   */
  public record Stored(
      String name, String value, String unit, String low, String high, String text, String line) {}

  /**
   * An input file.
   *
   * @param path the path as the workbook saw it
   * @param sha256 the digest of its bytes
   * @param bytes its size as written
   * @param rows its rows as written
   */
  public record Input(String path, String sha256, String bytes, String rows) {}

  /**
   * Reads a log.
   *
   * @throws DataException if the file is no log of ours, or its record is damaged
   */
  public static StoredLog read(Path file) {
    String page = text(file);
    String record =
        block(page, "connate-record")
            .orElseThrow(() -> damaged(file, "it carries no record: is it a log of Connate?"));
    try {
      Map<String, Object> object = Json.object(record);
      if (!"connate-record".equals(object.get("schema"))) {
        throw damaged(file, "its record is of another kind");
      }
      return new StoredLog(file, page, object, block(page, "connate-pack").map(Json::object));
    } catch (IllegalArgumentException e) {
      throw damaged(file, "its record is damaged: " + e.getMessage());
    }
  }

  private static String text(Path file) {
    try {
      if (Files.size(file) > LARGEST) {
        throw damaged(file, "it is larger than a log can be");
      }
      return new String(Files.readAllBytes(file), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw damaged(file, "it cannot be read: " + e.getMessage());
    }
  }

  private static DataException damaged(Path file, String message) {
    return new DataException(
        Fault.ofFile(file.toString(), "R01", message, "take the log as replay wrote it"));
  }

  private static Optional<String> block(String page, String id) {
    int start = page.indexOf(BLOCK + id + "\">");
    if (start < 0) {
      return Optional.empty();
    }
    int from = start + BLOCK.length() + id.length() + 2;
    int end = page.indexOf("</script>", from);
    return end < 0 ? Optional.empty() : Optional.of(page.substring(from, end));
  }

  /** Returns the title. */
  public String title() {
    return Json.text(record, "title");
  }

  /** Returns the workbook's file name, without any folder. */
  public String workbookName() {
    return Path.of(Json.text(Json.map(record.get("workbook")), "name")).getFileName().toString();
  }

  /**
   * Returns the workbook's bytes.
   *
   * @throws DataException if they are not those that the record's digest was made of
   */
  public byte[] workbook() {
    Map<String, Object> workbook = Json.map(record.get("workbook"));
    byte[] bytes = Json.text(workbook, "text").getBytes(StandardCharsets.UTF_8);
    if (!Digest.hex(bytes).equals(workbook.get("sha256"))) {
      throw damaged(file, "the workbook in it is not the one that was replayed (SHA-256 differs)");
    }
    return bytes;
  }

  /** Returns the seed. */
  public long seed() {
    return Long.parseLong(Json.written(record, "seed"));
  }

  /** Returns whether the guard was on. */
  public boolean isGuarded() {
    return Boolean.TRUE.equals(record.get("guarded"));
  }

  /** Returns whether the input files are packed in it. */
  public boolean isPacked() {
    return pack.isPresent();
  }

  /** Returns the kept results by name. */
  public Map<String, Stored> kept() {
    return stored("kept");
  }

  /** Returns the assumptions by name. */
  public Map<String, Stored> assumptions() {
    return stored("assumptions");
  }

  /** Returns the assumptions that were given another value, as they must be given again. */
  public Map<String, String> overrides() {
    Map<String, String> out = new LinkedHashMap<>();
    for (Object each : Json.list(record.get("assumptions"))) {
      Map<String, Object> assumption = Json.map(each);
      if (Boolean.TRUE.equals(assumption.get("overridden"))) {
        out.put(Json.text(assumption, "name"), given(assumption));
      }
    }
    return out;
  }

  private static String given(Map<String, Object> assumption) {
    String value = Json.written(assumption, "value");
    return value.isEmpty()
        ? Json.text(assumption, "text")
        : (value + " " + Json.text(assumption, "unit")).strip();
  }

  private Map<String, Stored> stored(String member) {
    Map<String, Stored> out = new LinkedHashMap<>();
    for (Object each : Json.list(record.get(member))) {
      Map<String, Object> one = Json.map(each);
      out.put(
          Json.text(one, "name"),
          new Stored(
              Json.text(one, "name"),
              Json.written(one, "value"),
              Json.text(one, "unit"),
              Json.written(one, "low"),
              Json.written(one, "high"),
              Json.text(one, "text"),
              Json.written(one, "line")));
    }
    return out;
  }

  /** Returns the inputs by path. */
  public Map<String, Input> inputs() {
    Map<String, Input> out = new LinkedHashMap<>();
    for (Object each : Json.list(record.get("inputs"))) {
      Map<String, Object> one = Json.map(each);
      out.put(
          Json.text(one, "path"),
          new Input(
              Json.text(one, "path"),
              Json.text(one, "sha256"),
              Json.written(one, "bytes"),
              Json.written(one, "rows")));
    }
    return out;
  }

  /**
   * Returns the packed files by path.
   *
   * @throws DataException if the bytes of one are not those that were read
   */
  public Map<String, byte[]> files() {
    Map<String, byte[]> out = new LinkedHashMap<>();
    if (pack.isEmpty()) {
      return out;
    }
    for (Object each : Json.list(pack.get().get("files"))) {
      Map<String, Object> one = Json.map(each);
      String path = Json.text(one, "path");
      out.put(path, bytes(one, path));
    }
    return out;
  }

  private byte[] bytes(Map<String, Object> packed, String path) {
    try {
      byte[] data = Base64.getDecoder().decode(Json.text(packed, "data"));
      byte[] bytes =
          Json.text(packed, "encoding").startsWith("deflate")
              ? Deflate.unpack(data, LARGEST)
              : data;
      Input input = inputs().get(path);
      if (input == null || !Digest.hex(bytes).equals(input.sha256())) {
        throw damaged(
            file, "the packed " + path + " is not the file that was read (SHA-256 differs)");
      }
      return bytes;
    } catch (IllegalArgumentException e) {
      throw damaged(file, "the packed " + path + " is damaged: " + e.getMessage());
    }
  }

  /**
   * Writes workbook and packed files into a folder, each where the workbook looks for it.
   *
   * @throws DataException if a path would leave the folder, or bytes are damaged
   * @throws IOException if a file cannot be written
   */
  public void unpack(Path folder) throws IOException {
    Path root = folder.toAbsolutePath().normalize();
    Files.createDirectories(root);
    for (Map.Entry<String, byte[]> one : files().entrySet()) {
      Path target = root.resolve(one.getKey()).normalize();
      if (!target.startsWith(root) || target.equals(root)) {
        throw damaged(file, "the packed path " + one.getKey() + " leads out of the folder");
      }
      Files.createDirectories(target.getParent());
      Files.write(target, one.getValue());
    }
    Files.write(root.resolve(workbookName()), workbook());
  }
}
