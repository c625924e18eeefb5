package connate.cementation;

import connate.chance.Distribution;
import connate.chance.Draw;
import connate.chance.Uncertain;
import connate.method.Caution;
import connate.method.Listening;
import connate.quantity.Fraction;
import connate.quantity.Temperature;
import connate.quantity.Units;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Compaction and quartz cement as one: a burial history drives both step by step to porosity and
 * permeability through time.
 *
 * <pre>{@code
 * var sand  = Sandstone.of(um(280), number(1.3), percent(62)).coated(percent(35));
 * var model = BurialModel.of(sand).uncertain("coat", normal(0.35, 0.10));
 * var past  = model.along(burial);
 * var runs  = simulate(20_000, seed(7), draw -> model.with(draw).along(burial).present());
 * }</pre>
 *
 * <p>All volumes are counted against the grains, which neither grow nor shrink. Compaction sets the
 * volume between the grains by the greatest stress so far, so that uplift does not undo it; cement
 * fills that volume with the law of Walderhaug over straight pieces of temperature, in closed form.
 * The open quartz surface goes with the share of that volume that is still open. Cementing stops at
 * the residual porosity.
 *
 * <p>Uncertain inputs go by name: {@code grain size} in µm, {@code sorting} (for the permeability
 * of Panda and Lake alone), {@code quartz}, {@code coat}, {@code initial porosity}, {@code stable
 * volume} as fractions, {@code compaction} (the coefficient of the law), {@code rate} (a factor on
 * the rate of quartz cement), {@code onset} in °C, {@code residual} as a fraction.
 *
 * <p><b>Checked</b> in {@code BurialModelTest}.
 */
public final class BurialModel {

  /** Caution: an uncertain input reaches beyond what is possible and is cut there. */
  static final String CUT = "M31";

  /** Caution: compaction and cement count the same loss twice. */
  static final String TWICE = "M32";

  private final CompactionLaw law;
  private final PermeabilityRule rule;
  private final Settings settings;
  private final Map<String, Distribution> uncertain;

  private BurialModel(
      CompactionLaw law,
      PermeabilityRule rule,
      Settings settings,
      Map<String, Distribution> uncertain) {
    this.law = law;
    this.rule = rule;
    this.settings = settings;
    this.uncertain = uncertain;
  }

  /** Returns the model of a sandstone: Lander and Walderhaug's compaction, Walderhaug's cement. */
  public static BurialModel of(Sandstone sandstone) {
    Settings settings = Settings.of(sandstone, CompactionLaw.LANDER_WALDERHAUG.usualCoefficient());
    return new BurialModel(
        CompactionLaw.LANDER_WALDERHAUG, PermeabilityRule.KOZENY_CARMAN, settings, Map.of());
  }

  /** Returns the model with another law of compaction and its usual coefficient. */
  public BurialModel with(CompactionLaw other) {
    if (other != CompactionLaw.LANDER_WALDERHAUG) {
      Listening.caution(
          Caution.of(
              TWICE,
              "burial model",
              "compaction by the law "
                  + other
                  + " has no floor; curves fitted to deep rock hold its cement already, which"
                  + " quartz cement then counts twice"));
    }
    return new BurialModel(
        other, rule, settings.with(Settings.Input.COMPACTION, other.usualCoefficient()), uncertain);
  }

  /** Returns the model with another rule for permeability. */
  public BurialModel with(PermeabilityRule other) {
    return new BurialModel(law, other, settings, uncertain);
  }

  /** Returns the model with quartz cement from a temperature on; 70 °C where none is stated. */
  public BurialModel withOnset(Temperature onset) {
    return with(Settings.Input.ONSET.toString(), onset.in(Units.degC));
  }

  /** Returns the model with a porosity below which cement stops; 2 % where none is stated. */
  public BurialModel withResidual(Fraction residual) {
    return with(Settings.Input.RESIDUAL.toString(), residual.fraction());
  }

  /**
   * Returns the model with one input changed.
   *
   * @param name the input, as the class comment names it
   * @param value the number in the input's unit
   * @throws IllegalArgumentException if there is no such input, or the value is impossible
   */
  public BurialModel with(String name, double value) {
    Settings.Input input = Settings.Input.named(name);
    return new BurialModel(law, rule, settings.with(input, input.checked(value)), uncertain);
  }

  /** Returns the model with an input that is drawn anew in each run of a simulation. */
  public BurialModel uncertain(String name, Distribution chance) {
    Settings.Input input = Settings.Input.named(name);
    if (!input.holds(chance.quantile(1e-3)) || !input.holds(chance.quantile(1 - 1e-3))) {
      Listening.caution(
          Caution.of(
              CUT,
              "burial model",
              "the law of «"
                  + name
                  + "», "
                  + chance.words()
                  + ", reaches beyond "
                  + input.range()
                  + " and is cut there"));
    }
    Map<String, Distribution> more = new LinkedHashMap<>(uncertain);
    more.put(input.toString(), chance);
    return new BurialModel(law, rule, settings, more);
  }

  /** Returns the model with an uncertain quantity, in the unit that the input goes by. */
  public BurialModel uncertain(String name, Uncertain<?> chance) {
    Settings.Input input = Settings.Input.named(name);
    if (!chance.unit().isSame(input.unit())) {
      throw new IllegalArgumentException(
          "«"
              + name
              + "» is drawn in "
              + (input.unit().isPure() ? "pure numbers" : input.unit())
              + ", found a law in "
              + chance.unit());
    }
    return uncertain(name, chance.law());
  }

  /** Returns the model of one run: every uncertain input has the number of the draw. */
  public BurialModel with(Draw draw) {
    Settings drawn = settings;
    for (Map.Entry<String, Distribution> entry : uncertain.entrySet()) {
      Settings.Input input = Settings.Input.named(entry.getKey());
      double value = draw.of(entry.getKey(), entry.getValue());
      drawn = drawn.with(input, input.cut(value));
    }
    return new BurialModel(law, rule, drawn, Map.of());
  }

  /** Returns what the sandstone went through on a burial history. */
  public BurialPath along(BurialHistory history) {
    Listening.used(law.card());
    Listening.used(Walderhaug.CARD);
    Listening.used(rule.card());
    return new Burial(law, rule, settings).along(history);
  }

  @Override
  public String toString() {
    return "burial model: " + law + ", quartz cement, " + rule + "; " + settings;
  }
}
