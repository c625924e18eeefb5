package connate.log;

import java.time.Duration;
import java.time.Instant;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * What differs between two runs of the same calculation: it stands in one marked block of the log
 * and nowhere else.
 *
 * @param when when the replay began
 * @param took how long it took
 * @param way how the workbook was compiled
 */
public record RunFacts(Instant when, Duration took, String way) {

  Map<String, String> lines() {
    Map<String, String> lines = new LinkedHashMap<>();
    lines.put("time", when.toString());
    lines.put("duration", took.toMillis() + " ms");
    lines.put("Java", property("java.runtime.version") + ", " + property("java.vm.name"));
    lines.put("system", property("os.name") + " " + property("os.arch"));
    lines.put("compiled", way);
    return lines;
  }

  private static String property(String name) {
    return System.getProperty(name, "unknown");
  }
}
