package connate.cementation;

import connate.quantity.Numbers;
import connate.quantity.Unit;
import connate.quantity.Units;
import java.util.Arrays;
import java.util.Locale;
import java.util.stream.Collectors;

/** The numbers of a burial model, each in its unit. */
final class Settings {

  /** What may be set, with its unit and what is possible. */
  enum Input {
    GRAIN_SIZE(Units.um, 1, 5000),
    SORTING(Units.number, 1, 6),
    QUARTZ(Units.fraction, 0, 1),
    COAT(Units.fraction, 0, 1),
    INITIAL_POROSITY(Units.fraction, 0.05, 0.7),
    STABLE_VOLUME(Units.fraction, 0, 0.5),
    COMPACTION(Units.number, 0, 2),
    RATE(Units.number, 0, 100),
    ONSET(Units.degC, 0, 200),
    RESIDUAL(Units.fraction, 0, 0.3);

    private final Unit<?> unit;
    private final double low;
    private final double high;

    Input(Unit<?> unit, double low, double high) {
      this.unit = unit;
      this.low = low;
      this.high = high;
    }

    static Input named(String name) {
      return Arrays.stream(values())
          .filter(input -> input.toString().equals(name.strip().toLowerCase(Locale.ROOT)))
          .findFirst()
          .orElseThrow(
              () ->
                  new IllegalArgumentException(
                      "a burial model has no input «"
                          + name
                          + "», but "
                          + Arrays.stream(values())
                              .map(Input::toString)
                              .collect(Collectors.joining(", "))));
    }

    Unit<?> unit() {
      return unit;
    }

    boolean holds(double value) {
      return value >= low && value <= high;
    }

    double checked(double value) {
      if (!holds(value)) {
        throw new IllegalArgumentException(
            this + " must lie from " + range() + ", found " + Numbers.text(value));
      }
      return value;
    }

    double cut(double value) {
      return StrictMath.max(low, StrictMath.min(high, value));
    }

    String range() {
      return Numbers.text(low) + " to " + Numbers.text(high) + unit.suffix();
    }

    @Override
    public String toString() {
      return name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }
  }

  private static final double ONSET_CELSIUS = 70;
  private static final double RESIDUAL_POROSITY = 0.02;

  private final double[] values;

  private Settings(double[] values) {
    this.values = values;
  }

  static Settings of(Sandstone sand, double compaction) {
    return new Settings(
        new double[] {
          Input.GRAIN_SIZE.checked(sand.grain().in(Units.um)),
          Input.SORTING.checked(sand.sorting().value()),
          sand.quartz().fraction(),
          sand.coat().fraction(),
          Input.INITIAL_POROSITY.checked(sand.initial().fraction()),
          sand.stable().fraction(),
          compaction,
          1,
          ONSET_CELSIUS,
          RESIDUAL_POROSITY
        });
  }

  Settings with(Input input, double value) {
    double[] changed = values.clone();
    changed[input.ordinal()] = value;
    return new Settings(changed);
  }

  double of(Input input) {
    return values[input.ordinal()];
  }

  @Override
  public String toString() {
    return Arrays.stream(Input.values())
        .map(input -> input + " " + Numbers.text(of(input)) + input.unit().suffix())
        .collect(Collectors.joining(", "));
  }
}
