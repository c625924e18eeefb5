package connate.figure;

import static connate.figure.Figures.crossplot;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.calibration.LogLinear;
import connate.calibration.TransformFit;
import connate.quantity.Units;
import connate.series.Series;
import java.util.List;
import org.junit.jupiter.api.Test;

class CrossplotTest {

  private static final double NAN = Double.NaN;

  private static Series phi(double... values) {
    return Series.of("porosity", Units.fraction, values);
  }

  private static Series k(double... values) {
    return Series.of("k_air", Units.mD, values);
  }

  /** By hand: row 1 is 0, row 2 negative, row 3 missing in y, row 4 missing in x. */
  @Test
  void countsWhatALogAxisCannotHold() {
    Figure figure =
        crossplot(phi(0.1, 0.2, 0.2, 0.2, NAN, 0.3), k(1, 0, -3, NAN, 10, 100)).logAxis();
    assertEquals(
        List.of("n = 2 of 6; not drawn: 2 missing, 2 zero or negative on a log axis"),
        figure.notes());
    SvgRules.check(figure);
  }

  @Test
  void keepsZerosOnAnEvenAxis() {
    Figure figure = crossplot(phi(0.1, 0.2, 0.3), k(1, 0, 2)).linearAxis();
    assertEquals(List.of("n = 3"), figure.notes());
  }

  @Test
  void namesQuantityAndUnitOnBothAxes() {
    String svg = crossplot(phi(0.1, 0.2, 0.3), k(1, 3, 200)).svg("a");
    assertTrue(svg.contains(">porosity (fraction)<"), svg);
    assertTrue(svg.contains(">k_air, permeability (mD), log scale<"), svg);
  }

  @Test
  void labelsDecades() {
    String svg = crossplot(phi(0.1, 0.2, 0.3), k(0.05, 3, 2000)).svg("a");
    for (String decade : List.of("0.1", "1", "10", "100", "1000")) {
      assertTrue(svg.contains(">" + decade + "</text>"), decade);
    }
  }

  /** By hand: y is the square of x, so ranks agree and the rank correlation is 1. */
  @Test
  void saysWhatIsSeen() {
    String words = crossplot(phi(0.1, 0.2, 0.3, 0.4), k(1, 4, 9, 16)).description();
    assertTrue(words.contains("k_air rises with porosity (rank correlation 1)"), words);
    assertTrue(words.contains("from 0.1 to 0.4"), words);
    assertTrue(words.contains("from 1 to 16 mD"), words);
    assertTrue(words.contains("n = 4"), words);
  }

  @Test
  void drawsFitAndBandInTheUnitsOfTheAxes() {
    Series porosity = Invented.porosity(60);
    TransformFit fit = LogLinear.fit(porosity, Invented.permeability(60));
    Series percent = porosity.to(Units.percent);
    Figure figure =
        crossplot(percent, Invented.permeability(60)).line(fit).band(fit.prediction(0.8));
    SvgRules.check(figure);
    assertTrue(figure.svg("a").contains(">" + fit.label() + "<"));
    assertTrue(figure.description().contains("Band: 80 % of new plugs"));
  }

  @Test
  void refusesALineOfAnotherDimension() {
    TransformFit fit = LogLinear.fit(Invented.porosity(60), Invented.permeability(60));
    Series density = Series.of("RHOB", Units.gPerCm3, new double[60]);
    String message =
        assertThrows(
                IllegalArgumentException.class,
                () -> crossplot(density, Invented.permeability(60)).line(fit))
            .getMessage();
    assertTrue(message.contains("the x axis has density (g/cm³)"), message);
  }

  @Test
  void tellsGroupsApartAndCountsThem() {
    Figure figure =
        crossplot(Invented.porosity(31), Invented.permeability(31))
            .byGroup(Invented.facies(31, "sand", "silt", null));
    assertTrue(figure.notes().contains("By facies: sand 11, silt 10, no facies 10"));
    SvgRules.check(figure);
  }

  /** By hand: 25 groups of two; nine keep their names, sixteen go together. */
  @Test
  void putsTheSmallestOfManyGroupsTogether() {
    String[] many = new String[25];
    for (int i = 0; i < many.length; i++) {
      many[i] = "g" + i;
    }
    Figure figure =
        crossplot(Invented.porosity(50), Invented.permeability(50))
            .byGroup(Invented.facies(50, many));
    String svg = figure.svg("a");
    assertTrue(svg.contains(">g8<") && !svg.contains(">g9<"));
    assertTrue(svg.contains(">16 other groups<"));
  }

  @Test
  void saysWhyThereIsNothingToDraw() {
    String message =
        assertThrows(
                IllegalArgumentException.class, () -> crossplot(phi(0.1, NAN), k(0, 3)).svg("a"))
            .getMessage();
    assertEquals(
        "a crossplot of «k_air» against «porosity» has nothing to draw: 1 missing, 1 zero or"
            + " negative on a log axis",
        message);
  }

  @Test
  void refusesColumnsOfDifferentLength() {
    assertThrows(IllegalArgumentException.class, () -> crossplot(phi(0.1), k(1, 2)));
  }

  @Test
  void drawsOnePointAndEqualPoints() {
    SvgRules.check(crossplot(phi(0.1), k(5)));
    SvgRules.check(crossplot(phi(0.1, 0.1), k(5, 5)));
    SvgRules.check(crossplot(phi(0, 0), k(0, 0)).linearAxis());
    SvgRules.check(crossplot(phi(0.1, 0.2), k(1e-12, 1e15)));
  }

  /**
   * Bound of the design: 5,000 points stay at or under 150 KB. Measured: 51 KB, and 107 KB in six
   * groups.
   */
  @Test
  void staysSmallWithManyPoints() {
    Series x = Invented.porosity(5000);
    int plain = crossplot(x, Invented.permeability(5000)).svg("a").length();
    int grouped =
        crossplot(x, Invented.permeability(5000))
            .byGroup(Invented.facies(5000, "a", "b", "c", "d", "e", "f"))
            .svg("a")
            .length();
    assertTrue(plain <= 150_000, "plain " + plain);
    assertTrue(grouped <= 150_000, "in groups " + grouped);
  }

  /** Independent: every point that is drawn stands once in the paths of dots. */
  @Test
  void drawsEveryPointOnce() {
    String svg = crossplot(Invented.porosity(777), Invented.permeability(777)).svg("a");
    assertEquals(777, svg.split("h0", -1).length - 1);
  }
}
