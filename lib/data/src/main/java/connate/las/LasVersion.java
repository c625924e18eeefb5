package connate.las;

/** The versions of the format. */
public enum LasVersion {
  /** Version 1.2 of 1990: texts of the well section stand after the colon. */
  V1_2("1.2"),
  /** Version 2.0 of 1992, with the updates of 2014 and 2017. */
  V2_0("2.0"),
  /** Version 3.0 of 2000: several data sets, delimiters, formats. */
  V3_0("3.0");

  private final String text;

  LasVersion(String text) {
    this.text = text;
  }

  /** Returns the number as it is written in a file. */
  @Override
  public String toString() {
    return text;
  }
}
