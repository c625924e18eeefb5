package connate.figure;

/**
 * An axis: what it measures, and how.
 *
 * @param title quantity and unit; empty for an axis of names
 * @param scale how values become positions
 * @param reversed whether values fall along it, as depth does upwards
 */
record Axis(String title, Scale scale, boolean reversed) {

  static Axis of(String title, Scale scale) {
    return new Axis(title, scale, false);
  }

  /** Returns the same axis turned round. */
  Axis reverse() {
    return new Axis(title, scale, !reversed);
  }

  /** Returns where a value stands: 0 at the left or below, 1 at the right or above. */
  double at(double value) {
    double t = scale.position(value);
    return reversed ? 1 - t : t;
  }

  /** Returns the value at a place. */
  double value(double at) {
    return scale.value(reversed ? 1 - at : at);
  }

  /** Returns the places of some values. */
  double[] at(double[] values, double from, double to) {
    double[] out = new double[values.length];
    for (int i = 0; i < out.length; i++) {
      out[i] = scale.holds(values[i]) ? from + (to - from) * at(values[i]) : Double.NaN;
    }
    return out;
  }
}
