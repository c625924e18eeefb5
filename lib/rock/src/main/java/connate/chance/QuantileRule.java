package connate.chance;

/** How a quantile is read between the sorted values; numbers after Hyndman and Fan (1996). */
public enum QuantileRule {

  /** Type 7: position 1 + (n − 1) p, the usual rule of statistics programs. */
  LINEAR,

  /** Type 6: position (n + 1) p, the plotting position of Weibull. */
  WEIBULL;

  double position(int n, double p) {
    return this == LINEAR ? (n - 1) * p : (n + 1) * p - 1;
  }
}
