package connate.compare;

import connate.quantity.Numbers;
import connate.record.StoredLog;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.function.Function;

/**
 * Two logs side by side: which inputs, assumptions and lines of the workbook changed, and how far
 * each kept result moved, also against the range that the old log stated. It runs nothing.
 *
 * @param changes the differences: inputs, assumptions, workbook, results
 * @param same how many kept results are the same in both
 */
public record Comparison(List<Change> changes, int same) {

  private static final Set<String> FACTORS =
      Set.of("mD", "D", "m²", "µD", "nD", "mD·m", "mD·ft", "m/s", "m/d", "cm/s", "m²/d");

  /** Compares two logs. */
  public static Comparison of(StoredLog old, StoredLog now) {
    List<Change> changes = new ArrayList<>();
    changes.addAll(
        each("input", old.inputs(), now.inputs(), Comparison::inputWords, StoredLog.Input::sha256));
    changes.addAll(
        each(
            "assumption",
            old.assumptions(),
            now.assumptions(),
            (was, is) -> was.text() + " became " + is.text(),
            StoredLog.Stored::text));
    changes.addAll(lines(old, now));
    List<Change> results =
        each("result", old.kept(), now.kept(), Comparison::moved, Comparison::identity);
    changes.addAll(results);
    long changed = results.stream().filter(c -> !c.is().isEmpty()).count();
    return new Comparison(List.copyOf(changes), (int) (now.kept().size() - changed));
  }

  /** Returns whether nothing differs. */
  public boolean isSame() {
    return changes.isEmpty();
  }

  private static String identity(StoredLog.Stored one) {
    return one.value().isEmpty() ? one.text() : one.value() + " " + one.unit();
  }

  private static String inputWords(StoredLog.Input was, StoredLog.Input is) {
    return "changed: " + was.rows() + " rows became " + is.rows();
  }

  /** Says how far a number moved, in its own terms, and whether it left the range stated before. */
  private static String moved(StoredLog.Stored was, StoredLog.Stored is) {
    if (was.value().isEmpty() || is.value().isEmpty() || !was.unit().equals(is.unit())) {
      return was.text() + " became " + is.text();
    }
    double before = Double.parseDouble(was.value());
    double after = Double.parseDouble(is.value());
    String step =
        FACTORS.contains(is.unit()) && before > 0 && after > 0
            ? "× " + Numbers.text(after / before)
            : (after < before ? "- " : "+ ") + Numbers.text(Math.abs(after - before));
    return Numbers.text(before)
        + " became "
        + Numbers.text(after)
        + suffix(is.unit())
        + " ("
        + step
        + ")"
        + range(was, after);
  }

  private static String suffix(String unit) {
    return unit.isEmpty() ? "" : " " + unit;
  }

  private static String range(StoredLog.Stored was, double after) {
    if (was.low().isEmpty() || was.high().isEmpty()) {
      return "";
    }
    double low = Double.parseDouble(was.low());
    double high = Double.parseDouble(was.high());
    return after < low || after > high
        ? ", outside of the old range " + Numbers.text(low) + " to " + Numbers.text(high)
        : ", inside the old range";
  }

  private static <T> List<Change> each(
      String what,
      Map<String, T> old,
      Map<String, T> now,
      java.util.function.BiFunction<T, T, String> words,
      Function<T, String> identity) {
    Set<String> names = new LinkedHashSet<>(old.keySet());
    names.addAll(now.keySet());
    List<Change> out = new ArrayList<>();
    for (String name : names) {
      T was = old.get(name);
      T is = now.get(name);
      if (was == null) {
        out.add(new Change(what, name, "", identity.apply(is), "new"));
      } else if (is == null) {
        out.add(new Change(what, name, identity.apply(was), "", "gone"));
      } else if (!Objects.equals(identity.apply(was), identity.apply(is))) {
        out.add(
            new Change(what, name, identity.apply(was), identity.apply(is), words.apply(was, is)));
      }
    }
    return out;
  }

  private static List<Change> lines(StoredLog old, StoredLog now) {
    String before = new String(old.workbook(), StandardCharsets.UTF_8);
    String after = new String(now.workbook(), StandardCharsets.UTF_8);
    if (before.equals(after)) {
      return List.of();
    }
    List<Change> out = new ArrayList<>();
    for (LineDifference.Edit edit :
        LineDifference.of(before.lines().toList(), after.lines().toList())) {
      out.add(
          new Change(
              "workbook",
              "line " + edit.line(),
              edit.isAdded() ? "" : edit.text(),
              edit.isAdded() ? edit.text() : "",
              (edit.isAdded() ? "+ " : "- ") + edit.text()));
    }
    return out;
  }

  /** Returns the comparison as JSON-ready members, in order. */
  public List<Map<String, String>> members() {
    List<Map<String, String>> out = new ArrayList<>();
    for (Change change : changes) {
      Map<String, String> one = new LinkedHashMap<>();
      one.put("what", change.what());
      one.put("name", change.name());
      one.put("was", change.was());
      one.put("is", change.is());
      one.put("words", change.words());
      out.add(one);
    }
    return out;
  }
}
