package connate.checks;

/** Of which kind a check is. A regression is no check of a method. */
public enum Kind {
  PUBLISHED,
  INDEPENDENT,
  BY_HAND,
  REGRESSION
}
