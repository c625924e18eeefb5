package connate.figure;

import static connate.figure.Figures.bars;
import static connate.figure.Figures.boxes;
import static connate.figure.Figures.crossplot;
import static connate.figure.Figures.curves;
import static connate.figure.Figures.depthPlot;
import static connate.figure.Figures.histogram;
import static connate.figure.Figures.probabilityPlot;
import static connate.figure.Figures.tornado;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.chance.Tornado;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Band;
import connate.series.Curve;
import connate.series.Labels;
import connate.series.Series;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Names from files are written as text and nothing else, wherever they stand. */
class HostileNamesTest {

  private record Named(String label) implements Curve, Band {
    @Override
    public double y(double x) {
      return 1;
    }

    @Override
    public double low(double x) {
      return 0.5;
    }

    @Override
    public double high(double x) {
      return 2;
    }

    @Override
    public Unit<?> xUnit() {
      return Units.fraction;
    }

    @Override
    public Unit<?> yUnit() {
      return Units.mD;
    }
  }

  private record Share(String label) implements Curve {
    @Override
    public double y(double x) {
      return x;
    }

    @Override
    public Unit<?> xUnit() {
      return Units.fraction;
    }

    @Override
    public Unit<?> yUnit() {
      return Units.fraction;
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "<script>alert(1)</script>",
        "\"><image href=\"x\" onload=\"alert(1)\"/>",
        "a & b &lt; &#x3c;script&#x3e;",
        "]]><!-- --><![CDATA[",
        "bell \u0007 null \u0000 escape \u001b[31m",
        "turned \u202E gnirts \u2066x\u2069",
        "lone \uD800 surrogate and \uFFFF",
        "' onmouseover='alert(1)",
        "javascript:alert(1) url(#x) style=color:red",
        "二氧化矽 ქვიშა 🪨🪨🪨",
        "a-very-long-name-without-any-blank-that-goes-on-and-on-and-on-and-on-and-on-and-on-and-on",
        "   "
      })
  void standAsText(String name) {
    Series x = Invented.porosity(20).named(name);
    Series y = Invented.permeability(20).named(name);
    Labels groups = Invented.facies(20, name, "other");
    Named line = new Named(name);
    check(crossplot(x, y).byGroup(groups).line(line).band(line));
    check(histogram(y).byGroup(groups).lognormal());
    check(curves(x, x.named(name)).line(new Share(name)));
    check(probabilityPlot(y).byGroup(groups).law());
    check(boxes(y, groups));
    check(bars(groups, y));
    check(tornado(new Tornado(name, Units.mD(2), List.of(bar(name)))));
    check(depthPlot(x).named(name).track(y, y).zone(name, Units.m(2001), Units.m(2008)));
  }

  private static Tornado.Bar bar(String name) {
    return new Tornado.Bar(name, Units.mD(1), Units.mD(3));
  }

  private static void check(Figure figure) {
    SvgRules.check(figure);
    String svg = figure.svg("a");
    assertFalse(svg.contains("<script") || svg.contains("<image") || svg.contains("<![CDATA"), svg);
    assertTrue(svg.codePoints().noneMatch(c -> c < ' ' && c != '\n' || c >= 0x202A && c <= 0x202E));
    String sketch = figure.sketch(80, 24);
    assertTrue(sketch.codePoints().noneMatch(c -> c < ' ' && c != '\n' || c == 0x202E), sketch);
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "1a", "a b", "a\"b", "<", "é", "-a"})
  void idPrefixIsAName(String prefix) {
    Figure figure = histogram(Invented.porosity(9));
    assertThrows(IllegalArgumentException.class, () -> figure.svg(prefix));
  }
}
