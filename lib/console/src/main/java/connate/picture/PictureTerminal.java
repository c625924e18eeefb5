package connate.picture;

import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Base64;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import javax.imageio.ImageIO;

/** How a terminal takes a picture, judged by what it says of itself in the environment. */
public enum PictureTerminal {
  /** The graphics protocol of kitty, which Ghostty, WezTerm and Konsole speak too. */
  KITTY,
  /** The inline images of iTerm2. */
  ITERM2,
  /** Sixels, the oldest way. */
  SIXEL;

  private static final int CHUNK = 4096;

  /** Returns how pictures are shown; nothing where the terminal cannot or is not known to. */
  public static Optional<PictureTerminal> of(Map<String, String> environment) {
    String type = environment.getOrDefault("TERM", "").toLowerCase(Locale.ROOT);
    String program = environment.getOrDefault("TERM_PROGRAM", "").toLowerCase(Locale.ROOT);
    boolean inside = environment.containsKey("TMUX") || environment.containsKey("STY");
    if (inside || type.startsWith("screen") || type.startsWith("tmux") || type.equals("dumb")) {
      return Optional.empty();
    }
    if (type.contains("kitty")
        || type.contains("ghostty")
        || program.equals("ghostty")
        || program.equals("wezterm")
        || environment.containsKey("KONSOLE_VERSION")) {
      return Optional.of(KITTY);
    }
    if (program.equals("iterm.app")) {
      return Optional.of(ITERM2);
    }
    boolean sixel = type.contains("sixel") || type.startsWith("foot") || type.startsWith("mlterm");
    return sixel ? Optional.of(SIXEL) : Optional.empty();
  }

  /** Returns what shows an image where the cursor stands. */
  public String sequence(BufferedImage image) {
    return switch (this) {
      case KITTY -> kitty(Base64.getEncoder().encodeToString(png(image)));
      case ITERM2 ->
          "\u001b]1337;File=inline=1:" + Base64.getEncoder().encodeToString(png(image)) + "\u0007";
      case SIXEL -> Sixels.of(image);
    };
  }

  private static String kitty(String data) {
    StringBuilder out = new StringBuilder();
    for (int at = 0; at < data.length(); at += CHUNK) {
      int end = Math.min(data.length(), at + CHUNK);
      out.append("\u001b_G").append(at == 0 ? "a=T,f=100,q=2," : "");
      out.append("m=").append(end < data.length() ? 1 : 0).append(';');
      out.append(data, at, end).append("\u001b\\");
    }
    return out.toString();
  }

  private static byte[] png(BufferedImage image) {
    try {
      ByteArrayOutputStream out = new ByteArrayOutputStream();
      ImageIO.write(image, "png", out);
      return out.toByteArray();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
