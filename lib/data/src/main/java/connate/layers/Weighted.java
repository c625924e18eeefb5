package connate.layers;

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

  double arithmetic() {
    return sumOfProducts() / total();
  }

  /** Zero as soon as one value is: flow across a tight bed stops. */
  double harmonic() {
    double sum = 0;
    for (int i = 0; i < values.length; i++) {
      if (values[i] <= 0) {
        return 0;
      }
      sum += thickness[i] / values[i];
    }
    return total() / sum;
  }

  double geometric() {
    double sum = 0;
    for (int i = 0; i < values.length; i++) {
      if (values[i] <= 0) {
        return 0;
      }
      sum += thickness[i] * StrictMath.log(values[i]);
    }
    return StrictMath.exp(sum / total());
  }
}
