package connate.grains;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import connate.series.Series;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.function.BiConsumer;
import org.junit.jupiter.api.Test;

/** Twelve random analyses against base R: approx, weighted sums, integrate (reference.R). */
class ReferenceCurvesTest {

  private static final String R = "base R: approx, weighted sums, integrate (reference.R)";
  private static final double[] LIMITS = {
    0.002, 0.016, 0.063, 0.125, 0.18, 0.25, 0.355, 0.5, 0.71, 1, 2
  };
  private static final int CLASSES = LIMITS.length - 1;

  private static void each(BiConsumer<GrainCurve, Map<String, Double>> check) throws IOException {
    var resource =
        Objects.requireNonNull(ReferenceCurvesTest.class.getResourceAsStream("reference.csv"));
    try (var in = new BufferedReader(new InputStreamReader(resource, StandardCharsets.UTF_8))) {
      List<String> heads = Arrays.asList(in.readLine().split(","));
      List<String[]> rows = in.lines().map(line -> line.split(",")).toList();
      assertTrue(rows.size() >= 12);
      for (String[] row : rows) {
        Map<String, Double> expected = new LinkedHashMap<>();
        for (int i = 0; i < row.length; i++) {
          expected.put(heads.get(i), Double.valueOf(row[i]));
        }
        double[] weights = new double[CLASSES];
        for (int i = 0; i < CLASSES; i++) {
          weights[i] = expected.get("w" + (i + 1));
        }
        check.accept(
            GrainCurve.of(Series.of("d", Units.mm, LIMITS), Series.of("R", Units.percent, weights)),
            expected);
      }
    }
  }

  private static void near(Map<String, Double> expected, String name, double found) {
    double value = expected.get(name);
    assertEquals(value, found, 1e-9 * Math.max(1, Math.abs(value)), name);
  }

  @Test
  void percentiles() throws IOException {
    each(
        (curve, r) -> {
          near(r, "d10", curve.d(10).in(Units.mm));
          near(r, "d50", curve.d(50).in(Units.mm));
          near(r, "d60", curve.d(60).in(Units.mm));
          near(r, "d10linear", curve.with(Between.LINEAR).d(10).in(Units.mm));
        });
  }

  @Test
  @Check(method = "folk-ward", kind = Kind.INDEPENDENT, source = R)
  void folkAndWard() throws IOException {
    each(
        (curve, r) -> {
          FolkWard measures = FolkWard.of(curve);
          near(r, "mean", measures.mean().value());
          near(r, "sorting", measures.sorting().value());
          near(r, "skewness", measures.skewness().value());
          near(r, "kurtosis", measures.kurtosis().value());
        });
  }

  @Test
  @Check(method = "grain-moments", kind = Kind.INDEPENDENT, source = R)
  void moments() throws IOException {
    each(
        (curve, r) -> {
          GrainMoments moments = GrainMoments.of(curve);
          near(r, "m1", moments.mean().value());
          near(r, "m2", moments.sorting().value());
          near(r, "m3", moments.skewness().value());
          near(r, "m4", moments.kurtosis().value());
        });
  }

  @Test
  @Check(method = "effective-diameter-kruger", kind = Kind.INDEPENDENT, source = R)
  @Check(method = "effective-diameter-zunker", kind = Kind.INDEPENDENT, source = R)
  @Check(method = "effective-diameter-zamarin", kind = Kind.INDEPENDENT, source = R)
  void effectiveDiameters() throws IOException {
    each(
        (curve, r) -> {
          near(r, "kruger", EffectiveDiameter.kruger(curve).in(Units.mm));
          near(r, "zunker", EffectiveDiameter.zunker(curve).in(Units.mm));
          near(r, "zamarin", EffectiveDiameter.zamarin(curve).in(Units.mm));
        });
  }
}
