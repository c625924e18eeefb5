package connate.run;

import java.nio.file.Path;
import java.util.Map;
import java.util.Objects;
import java.util.TreeMap;

/**
 * With what a workbook is replayed.
 *
 * @param data the folder in which data are looked for before the workbook's own, {@code null} for
 *     none
 * @param assumptions the assumptions that take another value: name and text
 * @param seed the seed of all random numbers
 * @param guarded whether the guard judges the commands before they run
 * @param way how the workbook is compiled
 */
public record ReplaySettings(
    Path data, Map<String, String> assumptions, long seed, boolean guarded, Way way) {

  /** How a workbook is compiled. */
  public enum Way {
    /** At once where it can be, else command by command. */
    AUTO,
    /** At once. */
    WHOLE,
    /** Command by command. */
    SHELL
  }

  /** The settings of a plain replay. */
  public static final ReplaySettings PLAIN = new ReplaySettings(null, Map.of(), 1, true, Way.AUTO);

  /** Checks that nothing is missing. */
  public ReplaySettings {
    assumptions = Map.copyOf(assumptions);
    Objects.requireNonNull(way, "way");
  }

  /** Returns these settings with another data folder. */
  public ReplaySettings withData(Path folder) {
    return new ReplaySettings(folder, assumptions, seed, guarded, way);
  }

  /** Returns these settings with one more assumption that takes another value. */
  public ReplaySettings withAssumption(String name, String value) {
    Map<String, String> more = new TreeMap<>(assumptions);
    more.put(name, value);
    return new ReplaySettings(data, more, seed, guarded, way);
  }

  /** Returns these settings with another seed. */
  public ReplaySettings withSeed(long other) {
    return new ReplaySettings(data, assumptions, other, guarded, way);
  }

  /** Returns these settings without the guard. */
  public ReplaySettings trusted() {
    return new ReplaySettings(data, assumptions, seed, false, way);
  }

  /** Returns these settings with another way to compile. */
  public ReplaySettings compiled(Way other) {
    return new ReplaySettings(data, assumptions, seed, guarded, other);
  }
}
