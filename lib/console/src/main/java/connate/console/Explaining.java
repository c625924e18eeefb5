package connate.console;

import java.util.ArrayList;
import java.util.List;
import jdk.jshell.SourceCodeAnalysis;
import jdk.jshell.SourceCodeAnalysis.Documentation;

/** What the language itself knows of a name: how it is called. */
final class Explaining {

  private static final int MOST = 12;

  private Explaining() {}

  /** Returns how a type, method or member can be called; empty where it is not known. */
  static List<String> of(String name, SourceCodeAnalysis analysis) {
    String asked = name.strip().replaceAll("\\(.*", "");
    if (!asked.matches("[\\w.]+")) {
      return List.of();
    }
    for (String form : List.of(asked + "(", asked)) {
      List<String> found = at(form, form.length(), analysis);
      if (!found.isEmpty()) {
        return found;
      }
    }
    return List.of();
  }

  /** Returns the signatures that fit what is being typed. */
  static List<String> at(String typed, int cursor, SourceCodeAnalysis analysis) {
    List<String> lines =
        analysis.documentation(typed, cursor, false).stream()
            .map(Documentation::signature)
            .map(Explaining::plain)
            .distinct()
            .sorted()
            .toList();
    if (lines.size() <= MOST) {
      return lines;
    }
    List<String> cut = new ArrayList<>(lines.subList(0, MOST));
    cut.add("… " + (lines.size() - MOST) + " more");
    return cut;
  }

  private static String plain(String signature) {
    return signature.replaceAll("\\b(?:[a-z]\\w*\\.)+(?=[A-Z])", "");
  }
}
