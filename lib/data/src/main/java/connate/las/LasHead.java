package connate.las;

import connate.las.LasSection.Kind;
import java.util.List;
import java.util.Optional;

/** The header of a file as read. */
record LasHead(LasVersion version, List<LasSection> sections, double nullValue) {

  LasHead {
    sections = List.copyOf(sections);
  }

  /** Returns the lines of all sections of a kind; of curves only those of the first section. */
  List<HeaderLine> items(Kind kind) {
    return sections.stream()
        .filter(s -> s.kind() == kind)
        .limit(kind == Kind.CURVE ? 1 : Long.MAX_VALUE)
        .flatMap(s -> s.items().stream())
        .toList();
  }

  /** Returns the first line of a name: of the well, else of the parameters, else of the version. */
  Optional<HeaderLine> item(String mnemonic) {
    for (Kind kind : List.of(Kind.WELL, Kind.PARAMETER, Kind.VERSION)) {
      for (HeaderLine item : items(kind)) {
        if (item.isNamed(mnemonic)) {
          return Optional.of(item);
        }
      }
    }
    return Optional.empty();
  }
}
