package connate.layers;

import connate.averages.Averages;

/** Values with the thickness that each stands for. */
record Weighted(double[] values, double[] thickness) {

  boolean isEmpty() {
    return values.length == 0;
  }

  double total() {
    double sum = 0;
    for (double t : thickness) {
      sum += t;
    }
    return sum;
  }

  double sumOfProducts() {
    double sum = 0;
    for (int i = 0; i < values.length; i++) {
      sum += values[i] * thickness[i];
    }
    return sum;
  }

  /** Returns the mean for flow along, or of any other quantity. */
  double arithmetic() {
    return sumOfProducts() / total();
  }

  /** Returns the mean permeability for flow along. */
  double along() {
    return Averages.arithmetic(values, thickness);
  }

  /** Returns the mean permeability for flow across. */
  double across() {
    return Averages.harmonic(values, thickness);
  }

  /** Returns the geometric mean permeability. */
  double geometric() {
    return Averages.geometric(values, thickness);
  }
}
