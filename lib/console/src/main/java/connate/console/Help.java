package connate.console;

import connate.fault.Nearest;
import java.util.Collection;
import java.util.Comparator;

/** The help of the whole program, and guesses for a word that was mistyped. */
final class Help {

  private static final int FAR = 3;

  private Help() {}

  static String text() {
    return String.join(
        "\n",
        "connate replay workbooks/tarn-hill/permeability.jsh",
        "connate replay north.jsh --assume \"porosity cutoff=10 %\" --out north-10.html",
        "",
        "A scripting kernel for the permeability of rock. Without a command it opens the console,",
        "with a workbook (connate north.jsh) the console with the workbook's steps replayed.",
        "  --data DIR, --trust, --no-input, --no-color   for the console",
        "Commands:",
        "  replay WORKBOOK     run it from top to bottom and write its log",
        "  compare OLD NEW     two logs: what moved, and by how much",
        "  verify LOG          replay what a log carries; which results come out again",
        "  unpack LOG DIR      workbook and data of a packed log",
        "  check WORKBOOK      parse and compile; name missing inputs; run nothing",
        "  methods [WORDS]     the catalogue of published methods",
        "connate COMMAND --help tells what it takes.",
        "",
        "Exit: 0 done, 1 ran but failed or differs, 2 usage, 3 bad input data,",
        "      4 refused by the guard, 70 our fault, 130 interrupted.");
  }

  static String near(String word, Collection<String> known) {
    return known.stream()
        .filter(k -> Nearest.distance(word, k) <= FAR)
        .min(Comparator.comparingInt(k -> Nearest.distance(word, k)))
        .map(k -> "; did you mean «" + k + "»?")
        .orElse("");
  }
}
