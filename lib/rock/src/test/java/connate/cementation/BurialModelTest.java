package connate.cementation;

import static connate.chance.Distributions.normal;
import static connate.chance.Simulation.simulate;
import static connate.quantity.Units.Ma;
import static connate.quantity.Units.degC;
import static connate.quantity.Units.fraction;
import static connate.quantity.Units.number;
import static connate.quantity.Units.percent;
import static connate.quantity.Units.um;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.chance.Runs;
import connate.chance.Sampling;
import connate.checks.Told;
import connate.permeability.KozenyCarman;
import connate.permeability.PandaLake;
import connate.quantity.Units;
import connate.series.Series;
import java.util.Locale;
import org.junit.jupiter.api.Test;

class BurialModelTest {

  private static final Sandstone SAND =
      new Sandstone(um(300), number(1.3), percent(80), percent(30), percent(40), percent(28));

  private static BurialHistory history(double[]... points) {
    double[][] columns = new double[3][points.length];
    for (int i = 0; i < points.length; i++) {
      for (int j = 0; j < 3; j++) {
        columns[j][i] = points[i][j];
      }
    }
    return BurialHistory.of(
        Series.of("age", Units.Ma, columns[0]),
        Series.of("depth", Units.m, columns[1]),
        Series.of("temperature", Units.degC, columns[2]));
  }

  private static final BurialHistory STEADY =
      history(
          new double[] {100, 0, 10},
          new double[] {60, 2000, 70},
          new double[] {20, 4000, 140},
          new double[] {0, 4000, 140});

  private static final BurialHistory UPLIFT =
      history(new double[] {100, 0, 10}, new double[] {30, 4500, 150}, new double[] {0, 2500, 90});

  /**
   * Independent: Walderhaug's closed form. Without compaction and below no onset the model is the
   * law of quartz cement by itself; quartz of the rock is that of the grains times 1 − φ0.
   */
  @Test
  void withoutCompactionItIsWalderhaug() {
    Sandstone sand =
        new Sandstone(
            um(300), number(1.3), fraction(0.65 / 0.74), percent(0), percent(26), percent(26));
    BurialModel model = BurialModel.of(sand).with("compaction", 0).with("onset", 0);
    BurialHistory heating = history(new double[] {60, 0, 80}, new double[] {0, 100, 140});
    assertEquals(Reference.of("heating"), model.along(heating).finalPorosity().fraction(), 1e-8);
    BurialHistory held =
        history(new double[] {60, 0, 80}, new double[] {20, 100, 120}, new double[] {0, 100, 120});
    assertEquals(Reference.of("held"), model.along(held).finalPorosity().fraction(), 1e-8);
    assertEquals(
        Reference.of("coated"),
        model.with("coat", 0.9).along(heating).finalPorosity().fraction(),
        1e-8);
  }

  /**
   * Independent: compaction and cement as coupled differential equations by SciPy's DOP853
   * (reference.py). The steps of the model freeze compaction within each: 2e-5 is what is left.
   */
  @Test
  void coupledEquationsBySciPy() {
    compare("steady", BurialModel.of(SAND).along(STEADY));
    compare("uplift", BurialModel.of(SAND).with("coat", 0.6).along(UPLIFT));
    BurialHistory over = STEADY.withOverpressure(Series.of("over", Units.MPa, 0, 10, 25, 25));
    compare("overpressured", BurialModel.of(SAND).with("coat", 0.9).along(over));
  }

  private static void compare(String name, BurialPath path) {
    assertEquals(Reference.of(name + " porosity"), path.finalPorosity().fraction(), 2e-5, name);
    int last = path.size() - 1;
    assertEquals(Reference.of(name + " cement"), path.cement().value(last) / 100, 2e-5, name);
  }

  /** Independent: volumes close at every instant, and nothing ever opens again. */
  @Test
  void closesAndNeverReopens() {
    BurialPath path = BurialModel.of(SAND).along(UPLIFT);
    double before = 1;
    double cement = 0;
    for (int i = 0; i < path.size(); i++) {
      double phi = path.porosity().value(i);
      assertEquals(path.intergranularVolume().value(i), phi + path.cement().value(i), 1e-9);
      assertTrue(phi <= before * 100 + 1e-12);
      assertTrue(path.cement().value(i) >= cement - 1e-12);
      before = phi / 100;
      cement = path.cement().value(i);
    }
    assertTrue(path.stress().value(path.size() - 1) < 40);
    assertEquals(2500, path.depth().value(path.size() - 1), 1e-9);
    assertEquals(90, path.temperature().value(path.size() - 1), 1e-9);
    assertEquals(0, path.age().value(path.size() - 1), 1e-9);
  }

  /** Independent: what physics says of each input. */
  @Test
  void signsOfTheInputs() {
    BurialModel model = BurialModel.of(SAND);
    double middle = porosity(model);
    assertTrue(porosity(model.with("coat", 0.9)) > middle);
    assertTrue(porosity(model.with("grain size", 600)) > middle);
    assertTrue(porosity(model.with("quartz", 0.4)) > middle);
    assertTrue(porosity(model.with("rate", 0.3)) > middle);
    assertTrue(porosity(model.withOnset(degC(110))) > middle);
    assertTrue(porosity(model.with("stable volume", 0.10)) < middle);
    BurialHistory over = STEADY.withOverpressure(Series.of("over", Units.MPa, 0, 10, 25, 30));
    BurialModel coated = model.with("coat", 0.95);
    assertTrue(
        coated.along(over).finalPorosity().fraction()
            > coated.along(STEADY).finalPorosity().fraction());
  }

  private static double porosity(BurialModel model) {
    return model.along(STEADY).finalPorosity().fraction();
  }

  /** Cement stops at the residual porosity, and without coats this sand gets there. */
  @Test
  void stopsAtTheResidual() {
    BurialModel hot = BurialModel.of(SAND.coated(percent(0))).with("rate", 50);
    assertEquals(0.02, porosity(hot), 1e-12);
    assertEquals(0.03, porosity(hot.withResidual(percent(3))), 1e-12);
  }

  /** Independent: the rules for permeability against the methods themselves. */
  @Test
  void permeabilityRules() {
    BurialModel model = BurialModel.of(SAND);
    BurialPath path = model.along(STEADY);
    double phi = path.finalPorosity().fraction();
    double kozeny = KozenyCarman.of(fraction(phi), um(300)).in(Units.mD);
    assertEquals(kozeny, path.finalPermeability().in(Units.mD), 1e-9 * kozeny);
    double before = path.intergranularVolume().value(path.size() - 1) / 100;
    double open = KozenyCarman.of(fraction(before), um(300)).in(Units.mD);
    double kept =
        CementedPermeability.after(Units.mD(open), fraction(before), fraction(phi), number(0))
            .in(Units.mD);
    assertEquals(
        kept,
        model.with(PermeabilityRule.SURFACE_KEPT).along(STEADY).finalPermeability().in(Units.mD),
        1e-9 * kept);
    double shrink =
        CementedPermeability.after(Units.mD(open), fraction(before), fraction(phi), number(2.0 / 3))
            .in(Units.mD);
    assertEquals(
        shrink,
        model.with(PermeabilityRule.PORES_SHRINK).along(STEADY).finalPermeability().in(Units.mD),
        1e-9 * shrink);
    double garn = Garn.of(fraction(phi)).in(Units.mD);
    assertEquals(
        garn,
        model.with(PermeabilityRule.GARN).along(STEADY).finalPermeability().in(Units.mD),
        1e-9 * garn);
    assertEquals(path.size(), path.permeability().size());
  }

  /**
   * Independent: the law of Panda and Lake itself, with the moments of lognormal sizes by number:
   * mean d exp(−2.5 σ²), C² = exp(σ²) − 1, skewness C³ + 3 C.
   */
  @Test
  void pandaAndLakeOfLognormalGrains() {
    BurialPath path =
        BurialModel.of(SAND).with("sorting", 1.6).with(PermeabilityRule.PANDA_LAKE).along(STEADY);
    double sigma = connate.grains.Trask.phiSpread(number(1.6)).value() * StrictMath.log(2);
    double c = StrictMath.sqrt(StrictMath.expm1(sigma * sigma));
    double mean = 300 * StrictMath.exp(-2.5 * sigma * sigma);
    double law =
        PandaLake.of(path.finalPorosity(), um(mean), c, c * c * c + 3 * c, 2.5).in(Units.mD);
    assertEquals(law, path.finalPermeability().in(Units.mD), 1e-9 * law);
    assertTrue(law < BurialModel.of(SAND).along(STEADY).finalPermeability().in(Units.mD));
    assertThrows(IllegalArgumentException.class, () -> BurialModel.of(SAND).with("sorting", 0.8));
  }

  /** Laws without a floor may count cement twice, and the model says so. */
  @Test
  void otherLawsOfCompaction() {
    try (Told told = new Told()) {
      BurialModel athy = BurialModel.of(SAND).with(CompactionLaw.ATHY);
      assertTrue(told.says("M32", "twice"), told.toString());
      BurialPath path = athy.with("rate", 0).along(UPLIFT);
      assertEquals(0.40 * StrictMath.exp(-0.27 * 4.5), path.finalPorosity().fraction(), 1e-12);
      BurialPath stress =
          BurialModel.of(SAND).with(CompactionLaw.EFFECTIVE_STRESS).with("rate", 0).along(UPLIFT);
      double felt = 1.270 * 9.80665 * 4.5;
      assertEquals(0.40 * StrictMath.exp(-0.022 * felt), stress.finalPorosity().fraction(), 1e-12);
    }
  }

  @Test
  void impossibleInputs() {
    BurialModel model = BurialModel.of(SAND);
    var name = assertThrows(IllegalArgumentException.class, () -> model.with("colour", 1));
    assertTrue(name.getMessage().contains("grain size, sorting, quartz, coat"), name.getMessage());
    assertThrows(IllegalArgumentException.class, () -> model.with("coat", 35));
    assertThrows(IllegalArgumentException.class, () -> SAND.coated(percent(135)));
    assertThrows(
        IllegalArgumentException.class,
        () -> new Sandstone(um(0), number(1.3), percent(80), percent(0), percent(40), percent(28)));
    assertThrows(IllegalArgumentException.class, () -> SAND.withStableVolume(percent(50)));
    assertThrows(
        IllegalArgumentException.class, () -> model.uncertain("coat", normal(um(300), um(30))));
    assertEquals(
        38.525, Sandstone.of(um(280), number(1.3), percent(62)).initial().in(Units.percent), 5e-4);
    assertEquals(0.35, SAND.withInitialPorosity(percent(35)).initial().fraction(), 1e-12);
  }

  @Test
  void lawsBeyondThePossibleAreTold() {
    try (Told told = new Told()) {
      BurialModel.of(SAND).uncertain("coat", normal(0.1, 0.1));
      assertTrue(told.says("M31", "is cut there"), told.toString());
    }
    try (Told told = new Told()) {
      BurialModel.of(SAND).uncertain("grain size", normal(um(300), um(30)));
      assertTrue(told.codes().isEmpty(), told.toString());
    }
  }

  /** Required: uncertain inputs by draws; 2,000 runs, the same on one thread and on two. */
  @Test
  void simulated() {
    BurialModel model =
        BurialModel.of(SAND)
            .uncertain("coat", normal(0.5, 0.1))
            .uncertain("grain size", normal(um(300), um(30)));
    long start = System.nanoTime();
    Runs runs =
        simulate(2000, Sampling.seed(7), draw -> model.with(draw).along(STEADY).present(), 2);
    System.out.printf(
        Locale.ROOT, "2000 burial runs: %.2f s%n", (System.nanoTime() - start) * 1e-9);
    Runs again =
        simulate(2000, Sampling.seed(7), draw -> model.with(draw).along(STEADY).present(), 1);
    assertEquals(runs.get("porosity").mean(), again.get("porosity").mean());
    double middle =
        BurialModel.of(SAND).with("coat", 0.5).along(STEADY).finalPorosity().in(Units.percent);
    assertEquals(middle, runs.get("porosity").median().number(), 0.3);
    assertTrue(runs.inputs().contains("coat"));
  }

  @Test
  void shows() {
    BurialPath path = BurialModel.of(SAND).along(STEADY);
    assertTrue(path.listing().rows().size() <= 14);
    assertTrue(path.toString().contains("quartz cement"));
    assertTrue(BurialModel.of(SAND).toString().contains("lander walderhaug"));
    assertEquals(0.40, path.porosityAt(Ma(100)).fraction(), 1e-12);
    assertTrue(path.porosityAt(Ma(60)).fraction() < 0.33);
    assertThrows(IllegalArgumentException.class, () -> path.porosityAt(Ma(101)));
  }
}
