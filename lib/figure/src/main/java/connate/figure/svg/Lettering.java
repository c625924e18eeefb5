package connate.figure.svg;

/**
 * How text is set.
 *
 * @param size the height in pixels
 * @param colour the colour
 * @param bold whether it is bold
 * @param side which side of the text stands at its position
 */
public record Lettering(double size, String colour, boolean bold, Side side) {

  /** Which part of a text stands at its position. */
  public enum Side {
    /** Its beginning. */
    START,
    /** Its middle. */
    MIDDLE,
    /** Its end. */
    END
  }

  /** Checks that the colour is hexadecimal. */
  public Lettering {
    if (!colour.matches("#[0-9A-Fa-f]{3}|#[0-9A-Fa-f]{6}")) {
      throw new IllegalArgumentException("«" + colour + "» is not a colour");
    }
  }

  /** Returns the same lettering with another side at its position. */
  public Lettering at(Side other) {
    return new Lettering(size, colour, bold, other);
  }

  /** Returns the width of a text in pixels. */
  public double width(String text) {
    return TextWidth.of(text, bold) * size;
  }

  /** Returns the presentation attributes. */
  String attributes() {
    StringBuilder out = new StringBuilder("font-size=\"").append(Pen.decimal(size)).append('"');
    out.append(" fill=\"").append(colour).append('"');
    if (bold) {
      out.append(" font-weight=\"bold\"");
    }
    switch (side) {
      case START -> {}
      case MIDDLE -> out.append(" text-anchor=\"middle\"");
      case END -> out.append(" text-anchor=\"end\"");
    }
    return out.toString();
  }
}
