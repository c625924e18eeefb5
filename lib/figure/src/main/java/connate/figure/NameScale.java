package connate.figure;

import java.util.ArrayList;
import java.util.List;

/** Names in a row, at 0, 1, 2 and so on. */
record NameScale(List<String> names) implements Scale {

  NameScale {
    names = List.copyOf(names);
  }

  @Override
  public double position(double value) {
    return (value + 0.5) / names.size();
  }

  @Override
  public double value(double position) {
    return position * names.size() - 0.5;
  }

  @Override
  public boolean holds(double value) {
    return Double.isFinite(value);
  }

  @Override
  public List<Tick> ticks(int wanted) {
    List<Tick> ticks = new ArrayList<>();
    for (int i = 0; i < names.size(); i++) {
      ticks.add(Tick.of(i, names.get(i)));
    }
    return ticks;
  }
}
