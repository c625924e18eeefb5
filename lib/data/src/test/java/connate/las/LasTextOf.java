package connate.las;

import java.nio.charset.StandardCharsets;

/** Small made-up files for the tests: one part is replaced, the rest is plain version 2.0. */
final class LasTextOf {

  static final String VERSION = "~V\nVERS. 2.0 : version\nWRAP. NO : one line\n";
  static final String WELL =
      "~W\nSTRT.M 100.0 : start\nSTOP.M 101.0 : stop\nSTEP.M 0.5 : step\nNULL. -999.25 : null\n"
          + "WELL. A-1 : WELL\n";
  static final String CURVES = "~C\nDEPT.M : depth\nGR.GAPI : gamma\nRHOB.G/C3 : density\n";
  static final String PARAMETERS = "~P\nBS.IN 8.5 : bit\n";
  static final String ROWS = "100.0 50 2.2\n100.5 60 2.3\n101.0 70 2.4\n";

  private LasTextOf() {}

  static LasFile rows(String rows) {
    return text(VERSION + WELL + CURVES + PARAMETERS + "~A\n" + rows);
  }

  static LasFile rows(String rows, LasOptions options) {
    String text = VERSION + WELL + CURVES + PARAMETERS + "~A\n" + rows;
    return LasFile.parse("a.las", bytes(text), options);
  }

  static LasFile wrapped(String rows) {
    return text(VERSION.replace("NO", "YES") + WELL + CURVES + PARAMETERS + "~A\n" + rows);
  }

  static LasFile wellWith(String line) {
    return text(VERSION + WELL + line + "\n" + CURVES + PARAMETERS + "~A\n" + ROWS);
  }

  static LasFile curves(String lines, String rows) {
    return text(VERSION + WELL + lines + PARAMETERS + "~A\n" + rows);
  }

  static LasFile text(String text) {
    return LasFile.parse("a.las", bytes(text));
  }

  static byte[] bytes(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }

  static String plain() {
    return VERSION + WELL + CURVES + PARAMETERS + "~A\n" + ROWS;
  }
}
