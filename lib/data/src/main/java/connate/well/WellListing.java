package connate.well;

import connate.las.LasFile;
import connate.las.Quirk;
import connate.quantity.Length;
import connate.quantity.Numbers;
import connate.role.Role;
import connate.series.Listing;
import connate.series.Series;
import connate.series.Unstated;
import java.util.ArrayList;
import java.util.List;

/** How a well shows: rows, ranges, units, nulls, and what needs a look. */
final class WellListing {

  private static final int MOST_NOTES = 12;

  private WellListing() {}

  static Listing of(Well well, LasFile file, String source, List<WellCurve> curves) {
    Listing.Builder table =
        Listing.titled(caption(well, file, source))
            .column("curve")
            .column("unit")
            .column("role")
            .column("missing")
            .column("least")
            .column("greatest")
            .column("look");
    for (WellCurve curve : curves) {
      if (curve.isText()) {
        int words = curve.labels().orElseThrow().distinct().size();
        table.row(curve.name(), "", role(curve), null, null, null, words + " different words");
      } else {
        row(table, curve);
      }
    }
    notes(file).forEach(table::note);
    return table.build();
  }

  private static String caption(Well well, LasFile file, String source) {
    StringBuilder out = new StringBuilder(well.name()).append("   ");
    out.append(well.rows()).append(" rows");
    if (well.rows() > 0) {
      out.append(", ").append(Numbers.record(well.top().number())).append(" to ");
      out.append(written(well.base()));
      out.append(well.hasStep() ? ", step " + written(well.step()) : "");
    }
    if (file != null) {
      out.append(", from ").append(source).append(" (LAS ").append(file.version()).append(')');
    }
    return out.toString();
  }

  private static String written(Length depth) {
    return Numbers.record(depth.number()) + depth.unit().suffix();
  }

  private static String role(WellCurve curve) {
    return curve.role().map(Role::name).orElse("");
  }

  private static void row(Listing.Builder table, WellCurve curve) {
    Series series = curve.series();
    double[] present = series.present();
    double least = Double.POSITIVE_INFINITY;
    double greatest = Double.NEGATIVE_INFINITY;
    for (double value : present) {
      least = Math.min(least, value);
      greatest = Math.max(greatest, value);
    }
    boolean isEmpty = present.length == 0;
    table.row(
        curve.name(),
        curve.symbol(),
        role(curve),
        series.size() - present.length,
        isEmpty ? null : least,
        isEmpty ? null : greatest,
        String.join("; ", looks(curve, series, present, least, greatest)));
  }

  private static List<String> looks(
      WellCurve curve, Series series, double[] present, double least, double greatest) {
    List<String> looks = new ArrayList<>();
    if (present.length == 0) {
      looks.add("no value");
      return looks;
    }
    boolean wantsUnit = curve.role().map(Role::unit).isPresent();
    if (wantsUnit && series.unit().equals(Unstated.UNIT)) {
      looks.add(curve.symbol().isEmpty() ? "no unit" : "unit not known");
    }
    if (least == greatest && present.length > 1) {
      looks.add("the same in every row");
    }
    curve.role().ifPresent(r -> range(r, series, present, looks));
    return looks;
  }

  private static void range(Role role, Series series, double[] present, List<String> looks) {
    if (Double.isNaN(role.low()) || !role.isMeasuredIn(series.unit())) {
      return;
    }
    int outside = 0;
    for (double value : present) {
      double v = series.unit().convert(value, role.unit());
      outside += v < role.low() || v > role.high() ? 1 : 0;
    }
    if (outside > 0) {
      looks.add(
          outside
              + " outside "
              + Numbers.text(role.low())
              + " to "
              + Numbers.text(role.high())
              + role.unit().suffix());
    }
  }

  private static List<String> notes(LasFile file) {
    List<String> notes = new ArrayList<>();
    if (file == null) {
      return notes;
    }
    for (Quirk quirk : file.quirks()) {
      if (quirk.isCaution()) {
        notes.add(quirk.toString());
      }
    }
    if (notes.size() > MOST_NOTES) {
      int more = notes.size() - MOST_NOTES;
      notes.subList(MOST_NOTES, notes.size()).clear();
      notes.add("and " + more + " more");
    }
    return notes;
  }
}
