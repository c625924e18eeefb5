package connate.well;

import static connate.quantity.Units.degrees;
import static connate.quantity.Units.ft;
import static connate.quantity.Units.m;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.las.SharedFiles;
import connate.series.Series;
import connate.table.Table;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

class SurveyTest {

  private static Survey survey(double[] md, double[] inc, double[] azi) {
    return Survey.of(
        Series.of("md", m, md), Series.of("inc", degrees, inc), Series.of("azi", degrees, azi));
  }

  /**
   * Independent: a survey of 2012 in Barber County, Kansas (Kansas Geological Survey, LAS
   * 1044782786), whose contractor computed vertical depth, north and east with a program of his own
   * and printed them to 0.01 ft. Angles are printed to 0.01°, so that rounding may add up to 0.02
   * ft.
   */
  @Test
  void agreesWithTheContractorsComputation() {
    Well well = Well.read(SharedFiles.of("las-kgs/1044782786.las"));
    Survey survey = Survey.of(well);
    assertEquals(64, survey.size());
    Series tvd = survey.vertical(well.depth());
    Series north = survey.north(well.depth());
    Series east = survey.east(well.depth());
    for (int row = 0; row < well.rows(); row++) {
      assertEquals(well.get("TVD").value(row), tvd.value(row), 0.02);
      assertEquals(
          well.get("+N/-S").value(row) - well.get("+N/-S").value(0), north.value(row), 0.03);
      assertEquals(
          well.get("+E/-W").value(row) - well.get("+E/-W").value(0), east.value(row), 0.03);
    }
    assertEquals(ft, tvd.unit());
  }

  /** Independent: on a quarter circle of radius R, TVD = R sin I and displacement R (1 - cos I). */
  @Test
  void quarterCircleIsExactAtStationsAndBetween() {
    double radius = 300;
    double length = radius * StrictMath.PI / 2;
    Survey survey = survey(new double[] {0, length}, new double[] {0, 90}, new double[] {90, 90});
    for (double part : new double[] {0, 0.1, 0.5, 0.9, 1}) {
      double angle = part * StrictMath.PI / 2;
      Series at = Series.of("md", m, part * length);
      assertEquals(
          radius * StrictMath.sin(angle), survey.vertical(m(part * length)).metres(), 1e-9);
      assertEquals(radius * (1 - StrictMath.cos(angle)), survey.east(at).value(0), 1e-9);
      assertEquals(0, survey.north(at).value(0), 1e-9);
    }
  }

  /** Independent: a turn in the horizontal plane by 180° is a half circle, whose chord is 2 R. */
  @Test
  void turnInThePlane() {
    double length = 100 * StrictMath.PI / 2;
    Survey survey =
        survey(
            new double[] {0, length, 2 * length},
            new double[] {90, 90, 90},
            new double[] {0, 90, 180});
    assertEquals(200, survey.east(Series.of("md", m, 2 * length)).value(0), 1e-9);
    assertEquals(0, survey.north(Series.of("md", m, 2 * length)).value(0), 1e-9);
    assertEquals(0, survey.vertical(m(2 * length)).metres(), 1e-9);
  }

  /** By hand: 60° all the way down makes half the depth. */
  @Test
  void straightHole() {
    Survey survey =
        survey(new double[] {0, 1000, 2000}, new double[] {60, 60, 60}, new double[] {45, 45, 45});
    assertEquals(1000, survey.vertical(m(2000)).metres(), 1e-9);
    assertEquals(750, survey.vertical(m(1500)).metres(), 1e-9);
    assertTrue(Double.isNaN(survey.vertical(Series.of("md", m, 2001)).value(0)));
    assertThrows(IllegalArgumentException.class, () -> survey.vertical(m(2001)));
  }

  @Test
  void verticalAboveTheFirstStationAndUnitsAreKept() {
    Survey survey = survey(new double[] {100, 200}, new double[] {0, 0}, new double[] {0, 0});
    assertEquals(50, survey.vertical(m(50)).metres());
    assertEquals(500, survey.vertical(ft(500)).in(ft), 1e-9);
    assertEquals(ft, survey.vertical(ft(500)).unit());
    assertTrue(survey.toString().contains("survey of 2 stations"), survey.toString());
  }

  /** By hand: 60° all the way down. */
  @Test
  void surveyOfATable() {
    String csv = "MD [ft],Incl [deg],Azim [deg]\n0,60,45\n1000,60,45\n";
    Survey survey = Survey.of(Table.read("survey.csv", csv.getBytes(StandardCharsets.UTF_8)));
    assertEquals(500, survey.vertical(ft(1000)).in(ft), 1e-9);
  }

  @Test
  void impossibleSurveys() {
    double[] two = {0, 1};
    assertThrows(IllegalArgumentException.class, () -> survey(new double[] {1, 1}, two, two));
    assertThrows(IllegalArgumentException.class, () -> survey(two, new double[] {1}, two));
    assertThrows(
        IllegalArgumentException.class, () -> survey(two, new double[] {1, Double.NaN}, two));
  }
}
