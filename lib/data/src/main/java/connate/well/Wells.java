package connate.well;

import connate.fault.DataException;
import connate.fault.Fault;
import connate.fault.Nearest;
import connate.method.Caution;
import connate.method.Listening;
import connate.series.Listed;
import connate.series.Listing;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.FileVisitOption;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.PathMatcher;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;

/** Several wells, in the order of their files. */
public final class Wells implements Iterable<Well>, Listed {

  private final List<Well> wells;

  private Wells(List<Well> wells) {
    this.wells = List.copyOf(wells);
    tellDoubles();
  }

  /** Returns the given wells. */
  public static Wells of(List<Well> wells) {
    return new Wells(wells);
  }

  /** Returns the given wells. */
  public static Wells of(Well... wells) {
    return new Wells(List.of(wells));
  }

  /**
   * Reads the LAS files that a pattern names, in the order of their names.
   *
   * @param folder the folder from which the pattern starts
   * @param pattern a path with {@code *} for any letters and {@code **} for any folders, such as
   *     {@code wells/*.las}; capitals do not matter in the extension
   * @throws DataException if no file fits, or one cannot be read
   */
  public static Wells read(Path folder, String pattern) {
    List<Path> files = files(folder, pattern);
    if (files.isEmpty()) {
      throw new DataException(
          Fault.ofFile(
              pattern,
              "W02",
              "no file fits this pattern",
              "paths are relative to the workbook's folder; * stands for any letters"));
    }
    return new Wells(files.stream().map(Well::read).toList());
  }

  /** Returns the files that a pattern names, sorted by their path with slashes. */
  public static List<Path> files(Path folder, String pattern) {
    String glob = pattern.replaceFirst("(?i)\\.las$", ".[lL][aA][sS]");
    PathMatcher matcher = folder.getFileSystem().getPathMatcher("glob:" + glob);
    int depth = pattern.contains("**") ? Integer.MAX_VALUE : pattern.split("/").length;
    try (Stream<Path> all = Files.walk(folder, depth, FileVisitOption.FOLLOW_LINKS)) {
      return all.filter(p -> matcher.matches(folder.relativize(p)))
          .filter(Files::isRegularFile)
          .sorted((a, b) -> slashed(folder, a).compareTo(slashed(folder, b)))
          .toList();
    } catch (IOException e) {
      throw new UncheckedIOException("cannot list " + folder + ": " + e.getMessage(), e);
    }
  }

  private static String slashed(Path folder, Path file) {
    return folder.relativize(file).toString().replace('\\', '/');
  }

  private void tellDoubles() {
    Set<String> seen = new LinkedHashSet<>();
    for (Well well : wells) {
      if (!seen.add(Well.key(well.name()))) {
        Listening.caution(
            Caution.of(
                "W03",
                well.name(),
                "two wells have the name " + well.name() + ": named(…) gives the first"));
      }
    }
  }

  /**
   * Returns a well by its name, in capitals or not.
   *
   * @throws IllegalArgumentException if there is none
   */
  public Well named(String name) {
    for (Well well : wells) {
      if (well.name().equalsIgnoreCase(name)) {
        return well;
      }
    }
    throw new IllegalArgumentException("no well " + Nearest.miss(name, names()));
  }

  /** Tells whether there is a well of this name. */
  public boolean has(String name) {
    return wells.stream().anyMatch(w -> w.name().equalsIgnoreCase(name));
  }

  /** Returns the names in order. */
  public List<String> names() {
    return wells.stream().map(Well::name).toList();
  }

  /** Returns the number of wells. */
  public int size() {
    return wells.size();
  }

  /** Returns the wells as a list. */
  public List<Well> list() {
    return wells;
  }

  @Override
  public Iterator<Well> iterator() {
    return new ArrayList<>(wells).iterator();
  }

  @Override
  public Listing listing() {
    Listing.Builder table =
        Listing.titled(wells.size() + " wells")
            .column("well")
            .column("rows")
            .column("top")
            .column("base")
            .column("unit")
            .column("curves")
            .column("cautions");
    for (Well well : wells) {
      long cautions =
          well.file().map(f -> f.quirks().stream().filter(q -> q.isCaution()).count()).orElse(0L);
      boolean isEmpty = well.rows() == 0;
      table.row(
          well.name(),
          well.rows(),
          isEmpty ? null : well.top().number(),
          isEmpty ? null : well.base().number(),
          well.depth().unit().symbol(),
          String.join(" ", well.names()),
          cautions == 0 ? "" : Long.toString(cautions));
    }
    return table.build();
  }

  @Override
  public String toString() {
    return listing().toString();
  }
}
