package connate.las;

import java.util.ArrayList;
import java.util.List;

/** Collects the quirks of one file. */
final class Quirks {

  private final List<Quirk> found = new ArrayList<>();

  /** Adds a matter of form. */
  void note(String code, int line, String message) {
    found.add(new Quirk(code, Quirk.Weight.NOTE, line, message));
  }

  /** Adds a matter of meaning. */
  void caution(String code, int line, String message) {
    found.add(new Quirk(code, Quirk.Weight.CAUTION, line, message));
  }

  /** Returns all, cautions first, in the order of their lines. */
  List<Quirk> sorted() {
    List<Quirk> all = new ArrayList<>(found);
    all.sort(
        (a, b) ->
            a.weight() == b.weight()
                ? Integer.compare(a.line(), b.line())
                : b.weight().compareTo(a.weight()));
    return List.copyOf(all);
  }
}
