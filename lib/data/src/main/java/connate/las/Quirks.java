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
    List<Quirk> all = new ArrayList<>();
    for (Quirk.Weight weight : new Quirk.Weight[] {Quirk.Weight.CAUTION, Quirk.Weight.NOTE}) {
      for (Quirk quirk : found) {
        if (quirk.weight() == weight) {
          insert(all, quirk);
        }
      }
    }
    return List.copyOf(all);
  }

  /** Puts a quirk behind those of its weight whose line is not larger. */
  private static void insert(List<Quirk> all, Quirk quirk) {
    int at = all.size();
    while (at > 0
        && all.get(at - 1).weight() == quirk.weight()
        && all.get(at - 1).line() > quirk.line()) {
      at--;
    }
    all.add(at, quirk);
  }
}
