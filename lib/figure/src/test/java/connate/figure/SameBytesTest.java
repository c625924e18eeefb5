package connate.figure;

import static connate.figure.Figures.bars;
import static connate.figure.Figures.boxes;
import static connate.figure.Figures.crossplot;
import static connate.figure.Figures.curves;
import static connate.figure.Figures.depthPlot;
import static connate.figure.Figures.histogram;
import static connate.figure.Figures.probabilityPlot;
import static org.junit.jupiter.api.Assertions.assertEquals;

import connate.calibration.LogLinear;
import connate.calibration.TransformFit;
import connate.quantity.Units;
import connate.series.Series;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;

/** The same figure gives the same bytes: in two runs, in another locale, on another JDK. */
class SameBytesTest {

  private static String all() {
    Series phi = Invented.porosity(300);
    Series k = Invented.permeability(300);
    TransformFit fit = LogLinear.fit(phi, k);
    List<Figure> figures =
        List.of(
            crossplot(phi, k)
                .byGroup(Invented.facies(300, "a", "b"))
                .line(fit)
                .band(fit.prediction(0.8)),
            histogram(k).lognormal(),
            curves(phi.depth().orElseThrow(), phi).quantity("part"),
            probabilityPlot(k).law(),
            boxes(k, Invented.facies(300, "a", "b")),
            bars(Invented.facies(9, "a", "b", "c"), Invented.porosity(9)),
            depthPlot(phi).track(k, k).zone("Sand", Units.m(2010), Units.m(2050)));
    StringBuilder out = new StringBuilder();
    for (int i = 0; i < figures.size(); i++) {
      out.append(figures.get(i).svg("f" + i)).append(figures.get(i).sketch(80, 24));
    }
    return out.toString();
  }

  @Test
  void twiceAndInAnotherLocale() {
    String first = all();
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(Locale.forLanguageTag("ar-EG-u-nu-arab"));
      assertEquals(first, all());
    } finally {
      Locale.setDefault(before);
    }
  }

  /**
   * Regression: the bytes as they were when this was written, the same on JDK 17 and 25. After a
   * wanted change of the look, look at the figures and replace the value; on a failure without one,
   * find what depends on the machine.
   */
  @Test
  void onEveryJdk() throws Exception {
    byte[] digest =
        MessageDigest.getInstance("SHA-256").digest(all().getBytes(StandardCharsets.UTF_8));
    assertEquals("3a65087de177b175", HexFormat.of().formatHex(digest).substring(0, 16));
  }
}
