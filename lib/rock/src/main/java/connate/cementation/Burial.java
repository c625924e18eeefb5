package connate.cementation;

import connate.cementation.Settings.Input;

/** One run of a burial model: all volumes are counted for a volume 1 of grains. */
final class Burial {

  private static final double STEP_CELSIUS = 2.5;
  private static final double STEP_METRES = 50;
  private static final double STEP_MA = 5;
  private static final int MOST_STEPS = 200;

  private final CompactionLaw law;
  private final PermeabilityRule rule;
  private final Settings settings;
  private final double surface;
  private final double initial;
  private final double stable;
  private final double onset;
  private final double residual;

  private double greatestStress;
  private double greatestDepth;
  private double between;
  private double cement;

  Burial(CompactionLaw law, PermeabilityRule rule, Settings settings) {
    this.law = law;
    this.rule = rule;
    this.settings = settings;
    this.initial = settings.of(Input.INITIAL_POROSITY);
    this.stable = StrictMath.min(settings.of(Input.STABLE_VOLUME), initial);
    this.onset = settings.of(Input.ONSET);
    this.residual = settings.of(Input.RESIDUAL);
    double grainCm = settings.of(Input.GRAIN_SIZE) * 1e-4;
    this.surface =
        6
            * settings.of(Input.QUARTZ)
            * (1 - settings.of(Input.COAT))
            / grainCm
            * settings.of(Input.RATE);
  }

  BurialPath along(BurialHistory history) {
    BurialPath.Builder path = new BurialPath.Builder();
    greatestStress = 0;
    greatestDepth = 0;
    cement = 0;
    BurialHistory.Point before = history.point(0, 0);
    compact(before);
    note(path, before);
    for (int leg = 0; leg < history.size() - 1; leg++) {
      int steps = steps(history.point(leg, 0), history.point(leg, 1));
      for (int i = 1; i <= steps; i++) {
        BurialHistory.Point after = history.point(leg, (double) i / steps);
        compact(history.point(leg, (i - 0.5) / steps));
        grow(before, after);
        compact(after);
        note(path, after);
        before = after;
      }
    }
    return path.build();
  }

  private static int steps(BurialHistory.Point a, BurialHistory.Point b) {
    double most =
        StrictMath.max(
            StrictMath.abs(b.celsius() - a.celsius()) / STEP_CELSIUS,
            StrictMath.max(
                StrictMath.abs(b.depth() - a.depth()) / STEP_METRES,
                (a.age() - b.age()) / STEP_MA));
    return (int) StrictMath.max(1, StrictMath.min(MOST_STEPS, StrictMath.ceil(most)));
  }

  /**
   * Sets the volume between the grains by the greatest stress felt. Neither cement nor the residual
   * pores inside it can be squeezed.
   */
  private void compact(BurialHistory.Point at) {
    greatestStress = StrictMath.max(greatestStress, at.stress());
    greatestDepth = StrictMath.max(greatestDepth, at.depth() / 1000);
    double coefficient = settings.of(Input.COMPACTION);
    double part = law.volume(initial, stable, coefficient, greatestStress, greatestDepth);
    between = StrictMath.max(part / (1 - part), (cement + residual) / (1 - residual));
  }

  /** Lets quartz grow over a step of straight temperature, from the onset on. */
  private void grow(BurialHistory.Point from, BurialHistory.Point to) {
    double open = between - cement;
    double least = residual * (1 + between);
    if (open <= least) {
      return;
    }
    double moles = precipitated(from.celsius(), to.celsius(), from.age() - to.age());
    double left = open * StrictMath.exp(-Walderhaug.MOLAR_VOLUME * surface * moles / between);
    cement = between - StrictMath.max(left, least);
  }

  private double precipitated(double start, double end, double ma) {
    if (start >= onset && end >= onset) {
      return Walderhaug.precipitated(start, end, ma);
    }
    if (start < onset && end < onset) {
      return 0;
    }
    double hot = StrictMath.max(start, end);
    double share = (hot - onset) / StrictMath.abs(end - start);
    return Walderhaug.precipitated(onset, hot, ma * share);
  }

  private void note(BurialPath.Builder path, BurialHistory.Point at) {
    double bulk = 1 + between;
    double porosity = (between - cement) / bulk;
    double grain = settings.of(Input.GRAIN_SIZE) * 1e-6;
    path.add(
        at,
        between / bulk,
        cement / bulk,
        porosity,
        porosity > 0
            ? rule.squareMetres(porosity, between / bulk, grain, settings.of(Input.SORTING))
            : 0);
  }
}
