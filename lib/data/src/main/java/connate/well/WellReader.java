package connate.well;

import connate.fault.DataException;
import connate.fault.Fault;
import connate.las.HeaderLine;
import connate.las.LasCurve;
import connate.las.LasFile;
import connate.las.Quirk;
import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Unit;
import connate.series.Series;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;

/** Makes a well of a LAS file. */
final class WellReader {

  private WellReader() {}

  /** Returns the well of a file whose index says its unit. */
  static Well of(LasFile file) {
    LasCurve index = file.index();
    String symbol = index.unit().isEmpty() ? startUnit(file) : index.unit();
    return of(file, CurveUnits.depth(symbol).orElseThrow(() -> noDepth(file, index, symbol)));
  }

  /** Returns the well of a file whose index is in a unit; tells what the reader is cautious of. */
  static Well of(LasFile file, Unit<?> depthUnit) {
    for (Quirk quirk : file.quirks()) {
      if (quirk.isCaution()) {
        String place = quirk.line() == 0 ? "" : " line " + quirk.line();
        Listening.caution(
            Caution.of(quirk.code(), file.name(), file.name() + place + ": " + quirk.message()));
      }
    }
    LasCurve index = file.index();
    Series bare = Series.over(index.name(), depthUnit, index.values(), null);
    Series depth = bare.atDepth(bare);
    Map<String, WellCurve> curves = new LinkedHashMap<>();
    for (LasCurve curve : file.curves()) {
      if (curve != index) {
        curves.put(Well.key(curve.name()), WellCurve.of(curve, depth));
      }
    }
    String named = file.item("WELL").map(HeaderLine::value).orElse("");
    return new Well(named.isEmpty() ? fileName(file) : named, file.name(), file, depth, curves);
  }

  private static DataException noDepth(LasFile file, LasCurve index, String symbol) {
    HeaderLine line = index.header();
    String words =
        symbol.isEmpty()
            ? "the index " + index.name() + " has no unit"
            : "the index " + index.name() + " is in «" + symbol + "», which is no unit of depth";
    return new DataException(
        new Fault(
            file.name(),
            line.line(),
            1,
            1,
            "W04",
            words,
            line.text().strip(),
            "write M or FT behind its dot, or say it: Well.of(file, ft)"));
  }

  private static String startUnit(LasFile file) {
    return file.item("STRT").map(HeaderLine::unit).orElse("");
  }

  private static String fileName(LasFile file) {
    String name = Path.of(file.name()).getFileName().toString();
    int dot = name.lastIndexOf('.');
    return dot > 0 ? name.substring(0, dot) : name;
  }
}
