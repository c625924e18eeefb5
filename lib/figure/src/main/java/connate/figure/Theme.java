package connate.figure;

import connate.figure.svg.Lettering;
import connate.figure.svg.Lettering.Side;
import connate.figure.svg.Pen;

/**
 * The one look of all figures: white ground, no box, hairlines across, small translucent points.
 *
 * <p>Colours: Okabe and Ito (2008), Color Universal Design, in the order in which they hold a
 * contrast of 3:1 on white: black 21, blue 5.2, vermillion 3.9, green 3.4, purple 3.1. Text holds
 * 4.5:1.
 */
final class Theme {

  /** Colours of lines and points. */
  static final String[] LINES = {"#000000", "#0072B2", "#D55E00", "#009E73", "#CC79A7"};

  /** Okabe and Ito's sky blue: 2.3:1, so for areas with other words or edges only. */
  static final String SKY = "#56B4E9";

  /** Okabe and Ito's orange, likewise. */
  static final String ORANGE = "#E69F00";

  static final double POINT = 4;
  static final double POINT_OPACITY = 0.55;

  /** For points over a log, which must be seen on its line. */
  static final double OVER_OPACITY = 0.85;

  static final double LINE = 1.8;
  static final double LOG_LINE = 1;
  static final double BAND_OPACITY = 0.16;

  static final Pen HAIRLINE = Pen.line("#D9D9D9", 0.7);
  static final Pen BASE = Pen.line("#555555", 1);
  static final Pen SMALL = Pen.line("#888888", 0.7);

  static final Lettering TITLE = new Lettering(14, "#111111", true, Side.START);
  static final Lettering AXIS = new Lettering(13, "#222222", false, Side.MIDDLE);
  static final Lettering TICK = new Lettering(12, "#333333", false, Side.MIDDLE);
  static final Lettering LEGEND = new Lettering(12, "#222222", false, Side.START);
  static final Lettering NOTE = new Lettering(12, "#555555", false, Side.START);
  static final Lettering INSIDE = new Lettering(11, "#333333", false, Side.MIDDLE);

  private Theme() {}
}
