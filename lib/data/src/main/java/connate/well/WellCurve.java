package connate.well;

import connate.las.LasColumn;
import connate.las.LasCurve;
import connate.quantity.Unit;
import connate.role.Role;
import connate.role.Roles;
import connate.series.Labels;
import connate.series.Series;
import java.util.Optional;

/** A curve of a well: of the file, made into a series when it is first asked for, or added. */
final class WellCurve {

  private final String name;
  private final String mnemonic;
  private final String symbol;
  private final LasCurve source;
  private final Series depth;
  private final boolean added;
  private Series series;
  private Labels labels;

  private WellCurve(
      String name, String symbol, LasCurve source, Series depth, Series series, boolean added) {
    this.name = name;
    this.mnemonic = source == null ? name : source.mnemonic();
    this.symbol = symbol;
    this.source = source;
    this.depth = depth;
    this.series = series;
    this.added = added;
  }

  static WellCurve of(LasCurve curve, Series depth) {
    return new WellCurve(curve.name(), curve.unit(), curve, depth, null, false);
  }

  static WellCurve added(String name, Series series) {
    return new WellCurve(name, symbolOf(series), null, null, series, true);
  }

  private static String symbolOf(Series series) {
    return series.unit().isPure() ? "" : series.unit().symbol();
  }

  String name() {
    return name;
  }

  String mnemonic() {
    return mnemonic;
  }

  /** Returns the unit as written. */
  String symbol() {
    return symbol;
  }

  boolean isAdded() {
    return added;
  }

  boolean isText() {
    return source != null && source.isText();
  }

  Optional<Role> role() {
    return Roles.find(mnemonic, symbol);
  }

  Series series() {
    if (series == null) {
      Unit<?> unit = CurveUnits.of(symbol, role().orElse(null));
      series = new LasSeries(name, unit, source, depth);
    }
    return series;
  }

  Optional<Labels> labels() {
    if (!isText()) {
      return Optional.empty();
    }
    if (labels == null) {
      String[] words = new String[source.size()];
      for (int row = 0; row < words.length; row++) {
        words[row] = source.word(row).orElse(null);
      }
      labels = Labels.of(name, words);
    }
    return Optional.of(labels);
  }

  /** Returns the curve at some of its rows. */
  WellCurve rows(int[] rows, Series at) {
    if (isText()) {
      Labels all = labels().orElseThrow();
      String[] words = new String[rows.length];
      for (int i = 0; i < rows.length; i++) {
        words[i] = all.label(rows[i]);
      }
      WellCurve some = new WellCurve(name, symbol, source, at, null, added);
      some.labels = Labels.of(name, words);
      return some;
    }
    double[] values = new double[rows.length];
    for (int i = 0; i < rows.length; i++) {
      values[i] = series().value(rows[i]);
    }
    return sampled(values, at);
  }

  /** Returns the curve with other values at other depths. */
  WellCurve sampled(double[] values, Series at) {
    Series own = traits(Series.over(name, series().unit(), values, at));
    return new WellCurve(name, symbol, source, at, own, added);
  }

  private Series traits(Series values) {
    Series with = values;
    for (var trait : series().traits().entrySet()) {
      with = with.with(trait.getKey(), trait.getValue());
    }
    return with;
  }

  /** Returns the curve as a column to be written. */
  LasColumn column() {
    if (isText()) {
      Labels own = labels().orElseThrow();
      String[] words = new String[own.size()];
      for (int row = 0; row < words.length; row++) {
        words[row] = own.label(row) == null ? "" : own.label(row);
      }
      return new LasColumn(name, symbol, code(), description(), null, words);
    }
    return new LasColumn(name, symbol, code(), description(), series().values(), null);
  }

  private String code() {
    return source == null ? "" : source.header().value();
  }

  private String description() {
    return source == null ? "computed" : source.header().description();
  }

  /** Returns a depth as a column to be written. */
  static LasColumn column(Series depth, LasCurve index) {
    String name = index == null ? "DEPT" : index.name();
    String words = index == null ? "depth" : index.header().description();
    String code = index == null ? "" : index.header().value();
    return new LasColumn(name, depth.unit().symbol(), code, words, depth.values(), null);
  }
}
