package connate.method;

import connate.quantity.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.stream.Collectors;

/**
 * What a published method states of itself: for {@code help}, the log and the index.
 *
 * @param id a short name in lower case, such as {@code kozeny-carman}
 * @param title the name in print
 * @param equation the equation, as its paper writes it
 * @param inputs the inputs, in the order of the arithmetic
 * @param resultSymbol the result's symbol
 * @param resultName the result in words
 * @param resultUnit the unit in which the equation gives it, {@code null} for several results
 * @param source author, year, journal, pages
 * @param constants whether the constants were read in a source
 * @param topics words under which the index finds it
 * @param notes validity in words, pitfalls, disagreements between sources
 */
public record MethodCard(
    String id,
    String title,
    String equation,
    List<MethodInput> inputs,
    String resultSymbol,
    String resultName,
    Unit<?> resultUnit,
    String source,
    Constants constants,
    List<String> topics,
    List<String> notes) {

  /** Starts a card. */
  public static Builder named(String id, String title) {
    return new Builder(id, title);
  }

  /** Returns the published range of all inputs in words, empty where none is stated. */
  public String range() {
    return inputs.stream()
        .map(MethodInput::range)
        .filter(r -> !r.isEmpty())
        .collect(Collectors.joining("; "));
  }

  /** Returns the card as {@code help} prints it. */
  @Override
  public String toString() {
    StringBuilder out = new StringBuilder(title).append("  (").append(id).append(")\n");
    out.append("  ").append(equation).append('\n');
    if (resultUnit != null) {
      line(out, resultSymbol, resultName, resultUnit, "");
    }
    for (MethodInput input : inputs) {
      line(out, input.symbol(), input.name(), input.unit(), rangeOf(input));
    }
    notes.forEach(note -> out.append("  ").append(note).append('\n'));
    return out.append("  Source: ").append(source).append("\n  ").append(constants).toString();
  }

  private static String rangeOf(MethodInput input) {
    return input.valid().equals(Range.ANY) ? "" : ", published for " + input.valid();
  }

  private static void line(
      StringBuilder out, String symbol, String name, Unit<?> unit, String range) {
    out.append("  ").append(symbol).append("  ").append(name);
    out.append(unit.isPure() ? "" : " in " + unit).append(range).append('\n');
  }

  /** Collects the facts of a card. */
  public static final class Builder {
    private final String id;
    private final String title;
    private String equation = "";
    private final List<MethodInput> inputs = new ArrayList<>();
    private String resultSymbol = "";
    private String resultName = "";
    private Unit<?> resultUnit;
    private String source = "";
    private Constants constants;
    private final List<String> topics = new ArrayList<>();
    private final List<String> notes = new ArrayList<>();

    private Builder(String id, String title) {
      this.id = id;
      this.title = title;
    }

    /** States the equation. */
    public Builder equation(String text) {
      equation = text;
      return this;
    }

    /** Adds an input that may be any number. */
    public Builder input(String symbol, String name, Unit<?> unit) {
      return input(symbol, name, unit, Range.ANY);
    }

    /** Adds an input and the range outside which it is impossible. */
    public Builder input(String symbol, String name, Unit<?> unit, Range possible) {
      inputs.add(new MethodInput(symbol, name, unit, possible, Range.ANY));
      return this;
    }

    /** States the published range of the last input, in its unit. */
    public Builder valid(double low, double high) {
      return valid(Range.of(low, high));
    }

    /** States the published range of the last input, in its unit. */
    public Builder valid(Range range) {
      int last = inputs.size() - 1;
      MethodInput input = inputs.get(last);
      inputs.set(
          last,
          new MethodInput(input.symbol(), input.name(), input.unit(), input.possible(), range));
      return this;
    }

    /** States the result and the unit in which the equation gives it. */
    public Builder result(String symbol, String name, Unit<?> unit) {
      resultSymbol = symbol;
      resultName = name;
      resultUnit = unit;
      return this;
    }

    /** States the source: author, year, journal, pages. */
    public Builder source(String text) {
      source = text;
      return this;
    }

    /** States whether the constants were read in a source. */
    public Builder constants(Constants state) {
      constants = state;
      return this;
    }

    /** Adds words under which the index finds the method. */
    public Builder topics(String... words) {
      topics.addAll(List.of(words));
      return this;
    }

    /** Adds a line on validity, a pitfall or a disagreement between sources. */
    public Builder note(String line) {
      notes.add(line);
      return this;
    }

    /** Returns the card. */
    public MethodCard build() {
      if (equation.isEmpty() || source.isEmpty()) {
        throw new IllegalStateException(id + ": a card needs an equation and a source");
      }
      return new MethodCard(
          id,
          title,
          equation,
          List.copyOf(inputs),
          resultSymbol,
          resultName,
          resultUnit,
          source,
          Objects.requireNonNull(constants, id + ": state of the constants"),
          List.copyOf(topics),
          List.copyOf(notes));
    }
  }
}
