package connate.las;

import connate.las.LasSection.Kind;
import java.util.ArrayList;
import java.util.List;

/** Reads a file from its bytes, section by section. */
final class LasReader {

  private static final int MOST_COLUMNS = 10_000;

  private final Quirks quirks = new Quirks();
  private final LasOptions options;
  private final LasText text;
  private final long bytes;
  private Sections.Raw data;

  LasReader(String name, byte[] content, LasOptions options) {
    this.options = options;
    this.bytes = content.length;
    this.text = LasText.of(name, content, quirks);
  }

  /** Returns the file. */
  LasFile read() {
    List<Sections.Raw> raw = Sections.scan(text);
    if (raw.isEmpty()) {
      throw text.refusal("L02", "is no LAS file: no line starts with ~", "check the file's type");
    }
    LasHead head = head(raw);
    List<HeaderLine> lines = head.items(Kind.CURVE);
    checkCurves(lines);
    Block block = new Block(data.bodyFrom(), data.bodyTo(), lines.size(), head.nullValue());
    Layout layout = Layout.of(text, block, stated(head), quirks);
    Columns columns =
        layout.wrapped()
            ? new WrappedScan(text, block, quirks, options.settingAside()).run()
            : new RowScan(text, block, layout, quirks, options.settingAside()).run();
    IndexWords well = well(head);
    int[] labels = ColumnLabels.order(text, data, lines);
    IndexFinder.Found found =
        new IndexFinder(text, well, lines, columns, labels, quirks).find(options.index());
    int column = found.order()[found.curve()];
    if (columns.isText(column)) {
      throw text.refusal(
          lines.get(found.curve()),
          "L17",
          Words.fill("the index {} holds text", lines.get(found.curve()).mnemonic()),
          "give the index as a number: depth, or seconds from a start");
    }
    new IndexChecks(text, well, lines.get(found.curve()), columns, column, quirks).run();
    List<LasCurve> curves = curves(lines, columns, found, head.nullValue());
    List<LasSet> sets =
        new SetReader(quirks, stated(head).delimiter(), head.nullValue()).read(head.sections());
    return new LasFile(text.file, bytes, head, curves, found.curve(), sets, quirks.sorted());
  }

  private LasHead head(List<Sections.Raw> raw) {
    HeaderReader reader = new HeaderReader(text, quirks);
    reader.readPreface(text.lineStart(raw.get(0).titleFrom()));
    LasVersion version = reader.version(raw);
    List<LasSection> sections = new ArrayList<>();
    for (Sections.Raw section : raw) {
      Kind kind = SectionKinds.of(section, version);
      if (kind == Kind.DATA) {
        takeData(section);
        int line = text.lineOf(section.titleFrom());
        sections.add(new LasSection(kind, section.title(), line, List.of(), List.of()));
      } else {
        sections.add(reader.read(section, kind, version));
      }
    }
    reader.summarise();
    if (data == null) {
      throw text.refusal(
          text.to,
          text.to,
          "L04",
          "no data: no section ~A",
          version == LasVersion.V3_0 ? "add ~Log_Data" : "add ~A above the numbers");
    }
    LasHead head = new LasHead(version, sections, Double.NaN);
    HeadChecks checks = new HeadChecks(text, head, quirks);
    checks.run(options.settingAside());
    return new LasHead(version, sections, checks.nullValue());
  }

  private void takeData(Sections.Raw section) {
    if (data != null) {
      throw text.refusal(
          section.titleFrom(),
          text.lineEnd(section.titleFrom()),
          "L11",
          "a second data section; the first is on line " + text.lineOf(data.titleFrom()),
          "split the file in two");
    }
    data = section;
  }

  private void checkCurves(List<HeaderLine> lines) {
    if (lines.isEmpty()) {
      throw text.refusal(
          "L05",
          "no curves: the section ~C is missing or empty",
          "add ~C with one line per column of the data");
    }
    if (lines.size() > MOST_COLUMNS) {
      throw text.refusal(
          "L16", lines.size() + " curves, where at most 10000 are read", "split the file");
    }
  }

  private static Layout stated(LasHead head) {
    boolean wrapped = is(head, "WRAP", "YES");
    byte delimiter = 0;
    if (head.version() == LasVersion.V3_0) {
      delimiter = (byte) (is(head, "DLM", "COMMA") ? ',' : is(head, "DLM", "TAB") ? '\t' : 0);
    }
    return new Layout(delimiter, (byte) '.', wrapped);
  }

  private static boolean is(LasHead head, String mnemonic, String value) {
    HeaderLine item = item(head, Kind.VERSION, mnemonic);
    return (item.value().isEmpty() ? item.unit() : item.value()).equalsIgnoreCase(value);
  }

  private IndexWords well(LasHead head) {
    HeaderLine start = item(head, Kind.WELL, "STRT");
    return new IndexWords(
        HeaderNumber.of(start),
        HeaderNumber.of(item(head, Kind.WELL, "STOP")),
        HeaderNumber.of(item(head, Kind.WELL, "STEP")),
        start.unit(),
        new int[] {
          start.line(), item(head, Kind.WELL, "STOP").line(), item(head, Kind.WELL, "STEP").line()
        },
        head.nullValue());
  }

  private static HeaderLine item(LasHead head, Kind kind, String mnemonic) {
    for (HeaderLine item : head.items(kind)) {
      if (item.isNamed(mnemonic)) {
        return item;
      }
    }
    return HeaderLine.of(mnemonic, "", "", "");
  }

  private List<LasCurve> curves(
      List<HeaderLine> lines, Columns columns, IndexFinder.Found found, double nullValue) {
    CurveChecks checks = new CurveChecks(quirks, nullValue);
    List<String> names = checks.names(lines);
    List<LasCurve> curves = new ArrayList<>();
    for (int i = 0; i < lines.size(); i++) {
      int column = found.order()[i];
      String[] words = columns.words(column);
      double[] numbers = words == null ? columns.cells[column] : null;
      LasCurve curve = new LasCurve(names.get(i), lines.get(i), numbers, words, columns.rows());
      checks.values(curve, i == found.curve());
      curves.add(curve);
    }
    checks.summarise();
    checks.duplicates(curves);
    return curves;
  }
}
