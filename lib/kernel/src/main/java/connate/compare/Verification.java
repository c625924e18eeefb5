package connate.compare;

import connate.record.StoredLog;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * Whether a log's kept results come out again.
 *
 * @param results what became of each kept result
 * @param isPageSame whether the log comes out byte for byte outside of its run block
 */
public record Verification(List<Result> results, boolean isPageSame) {

  /** What became of a kept result. */
  public enum Verdict {
    EXACT,
    WITHIN,
    DIFFERS,
    MISSING
  }

  /**
   * A kept result and what became of it.
   *
   * @param name the result
   * @param was what the log says
   * @param is what came out, empty where nothing did
   * @param verdict how they stand to each other
   */
  public record Result(String name, String was, String is, Verdict verdict) {}

  /**
   * Sets a log against the one that its replay gave.
   *
   * @param log the log
   * @param again the log of its replay
   * @param tolerance the relative difference that is allowed
   */
  public static Verification of(StoredLog log, StoredLog again, double tolerance) {
    List<Result> results = new ArrayList<>();
    Map<String, StoredLog.Stored> found = again.kept();
    for (StoredLog.Stored was : log.kept().values()) {
      StoredLog.Stored is = found.get(was.name());
      results.add(
          is == null
              ? new Result(was.name(), was.text(), "", Verdict.MISSING)
              : new Result(was.name(), text(was), text(is), verdict(was, is, tolerance)));
    }
    for (StoredLog.Stored is : found.values()) {
      if (!log.kept().containsKey(is.name())) {
        results.add(new Result(is.name(), "", text(is), Verdict.DIFFERS));
      }
    }
    return new Verification(List.copyOf(results), outside(log).equals(outside(again)));
  }

  /** Returns whether every result came out, exactly or within the tolerance. */
  public boolean isReproduced() {
    return results.stream()
        .allMatch(r -> r.verdict() == Verdict.EXACT || r.verdict() == Verdict.WITHIN);
  }

  private static String text(StoredLog.Stored one) {
    return one.value().isEmpty() ? one.text() : (one.value() + " " + one.unit()).strip();
  }

  private static Verdict verdict(StoredLog.Stored was, StoredLog.Stored is, double tolerance) {
    boolean exact =
        text(was).equals(text(is)) && was.low().equals(is.low()) && was.high().equals(is.high());
    if (exact) {
      return Verdict.EXACT;
    }
    boolean within =
        was.unit().equals(is.unit())
            && isNear(was.value(), is.value(), tolerance)
            && isNear(was.low(), is.low(), tolerance)
            && isNear(was.high(), is.high(), tolerance);
    return within ? Verdict.WITHIN : Verdict.DIFFERS;
  }

  private static boolean isNear(String was, String is, double tolerance) {
    if (was.isEmpty() || is.isEmpty()) {
      return was.equals(is);
    }
    double a = Double.parseDouble(was);
    double b = Double.parseDouble(is);
    return Math.abs(a - b) <= tolerance * Math.max(Math.abs(a), Math.abs(b));
  }

  private static String outside(StoredLog log) {
    int from = log.page().indexOf("<!-- run -->");
    int to = log.page().indexOf("<!-- /run -->");
    return from < 0 || to < from
        ? log.page()
        : log.page().substring(0, from) + log.page().substring(to);
  }
}
