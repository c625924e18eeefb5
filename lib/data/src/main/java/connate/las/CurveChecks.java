package connate.las;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Names the curves apart and looks for values that may be no values. */
final class CurveChecks {

  /** Values that programs write for "no value" or for "above the scale", beside the null. */
  private static final double[] SENTINELS = {
    -999.25, -999, -9999, -9999.25, -99999, -999.999, -999.9, 999.25, 9999, 9999.25, 99999, 999999,
    100000, 1000000, 1e30, -1e30
  };

  private static final int SHOWN = 6;

  private final Quirks quirks;
  private final double nullValue;
  private final Map<Double, List<String>> marks = new LinkedHashMap<>();
  private final List<String> spanning = new ArrayList<>();
  private int firstMark;
  private int firstSpanning;

  CurveChecks(Quirks quirks, double nullValue) {
    this.quirks = quirks;
    this.nullValue = nullValue;
  }

  /** Returns a name for each curve that no other has: the mnemonic, then with _2, _3 behind it. */
  List<String> names(List<HeaderLine> curves) {
    Set<String> all = new HashSet<>();
    for (HeaderLine curve : curves) {
      all.add(HeaderReader.key(curve.mnemonic()));
    }
    Map<String, Integer> seen = new HashMap<>();
    List<String> names = new ArrayList<>();
    for (int i = 0; i < curves.size(); i++) {
      String mnemonic = curves.get(i).mnemonic();
      String base = mnemonic.isEmpty() ? "CURVE" + (i + 1) : mnemonic;
      int count = seen.merge(HeaderReader.key(base), 1, Integer::sum);
      String name = base;
      if (count > 1) {
        do {
          name = base + "_" + count++;
        } while (!all.add(HeaderReader.key(name)));
      }
      names.add(name);
    }
    return names;
  }

  /** Tells of curves with the same mnemonic, and whether their values are the same. */
  void duplicates(List<LasCurve> curves) {
    Map<String, LasCurve> first = new HashMap<>();
    for (LasCurve curve : curves) {
      LasCurve other = first.putIfAbsent(HeaderReader.key(curve.mnemonic()), curve);
      if (other != null) {
        quirks.caution(
            "L36",
            curve.header().line(),
            Words.fill(
                "{} is listed again (first on line {}): named {}; {}",
                curve.mnemonic(),
                other.header().line(),
                curve.name(),
                compared(other, curve)));
      }
    }
  }

  private static String compared(LasCurve a, LasCurve b) {
    if (a.isText() || b.isText()) {
      return "text";
    }
    int differ = 0;
    for (int i = 0; i < a.size(); i++) {
      if (Double.compare(a.value(i), b.value(i)) != 0) {
        differ++;
      }
    }
    return differ == 0 ? "both hold the same values" : differ + " values differ";
  }

  /** Looks at the values of a curve. */
  void values(LasCurve curve, boolean isIndex) {
    if (curve.isText() || curve.size() == 0) {
      return;
    }
    if (curve.missing() == curve.size()) {
      quirks.caution("L38", curve.header().line(), curve.name() + " has no value at all");
      return;
    }
    double min = Double.POSITIVE_INFINITY;
    double max = Double.NEGATIVE_INFINITY;
    double[] values = curve.raw();
    for (int i = 0; i < curve.size(); i++) {
      double v = values[i];
      if (v < min) {
        min = v;
      }
      if (v > max) {
        max = v;
      }
    }
    if (isIndex) {
      return;
    }
    for (double sentinel : SENTINELS) {
      if (sentinel == min || sentinel == max) {
        sentinel(curve, sentinel);
      }
    }
    if (nullValue >= min && nullValue <= max && curve.missing() > 0) {
      firstSpanning = spanning.isEmpty() ? curve.header().line() : firstSpanning;
      spanning.add(Words.fill("{} ({} to {})", curve.name(), plain(min), plain(max)));
    }
  }

  private void sentinel(LasCurve curve, double sentinel) {
    int count = 0;
    for (int i = 0; i < curve.size(); i++) {
      if (curve.raw()[i] == sentinel) {
        count++;
      }
    }
    firstMark = marks.isEmpty() ? curve.header().line() : firstMark;
    marks
        .computeIfAbsent(sentinel, s -> new ArrayList<>())
        .add(curve.name() + " (" + count + " times)");
  }

  /** Tells of marks beside the null, and of a null among the values, once each. */
  void summarise() {
    marks.forEach(
        (mark, names) ->
            quirks.caution(
                "L39",
                firstMark,
                Words.fill(
                        "{} stands at the end of the values of {}: a mark for no value or out of scale? ",
                        plain(mark),
                        some(names))
                    + "kept as values"));
    if (!spanning.isEmpty()) {
      quirks.caution(
          "L40",
          firstSpanning,
          Words.fill(
              "the null value {} lies among the values of {}: read as missing all the same",
              plain(nullValue),
              some(spanning)));
    }
  }

  private static String some(List<String> names) {
    String shown = String.join(", ", names.subList(0, Math.min(SHOWN, names.size())));
    return names.size() > SHOWN ? shown + " and " + (names.size() - SHOWN) + " more" : shown;
  }

  private static String plain(double value) {
    return IndexFinder.plain(value);
  }
}
