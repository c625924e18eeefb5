package connate.conductivity;

/** One sand as the formulas see it: sizes in mm, clay in percent, porosity, water. */
record Sand(
    double d10,
    double d17,
    double d20,
    double d50,
    double uniformity,
    double deKruger,
    double deZunker,
    double deZamarin,
    double clay,
    double n,
    double celsius) {

  /** Returns the number that stands for an input of a card, NaN where none does. */
  double of(String symbol) {
    return switch (symbol) {
      case "d10" -> d10;
      case "d17" -> d17;
      case "d20" -> d20;
      case "d50" -> d50;
      case "Cu" -> uniformity;
      case "n" -> n;
      case "T" -> celsius;
      default -> Double.NaN;
    };
  }
}
