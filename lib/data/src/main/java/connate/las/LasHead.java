package connate.las;

import connate.las.LasSection.Kind;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The header of a file as read. */
record LasHead(LasVersion version, List<LasSection> sections, double nullValue) {

  LasHead {
    sections = List.copyOf(sections);
  }

  /** Returns the lines of all sections of a kind; of curves only those of the first section. */
  List<HeaderLine> items(Kind kind) {
    List<HeaderLine> items = new ArrayList<>();
    for (LasSection section : sections) {
      if (section.kind() == kind) {
        items.addAll(section.items());
        if (kind == Kind.CURVE) {
          break;
        }
      }
    }
    return List.copyOf(items);
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
