package connate.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.figure.Figures;
import connate.quantity.Units;
import connate.series.Series;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.File;
import java.io.IOException;
import java.util.Base64;
import java.util.Map;
import java.util.Optional;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;

class RasterTest {

  private static final int RED = 0xFFFF0000;
  private static final int WHITE = 0xFFFFFFFF;

  private static BufferedImage drawn(String inside) {
    return Raster.of(
        "<svg xmlns=\"http://www.w3.org/2000/svg\" width=\"40\" height=\"20\">" + inside + "</svg>",
        1);
  }

  /** By hand: a square of 10 by 10 from (5, 5), once by lines and once cut by a clip. */
  @Test
  void pathsAreFilledWhereTheyStand() {
    BufferedImage image = drawn("<g fill=\"#f00\"><path d=\"M5 5h10v10h-10z\"/></g>");
    assertEquals(RED, image.getRGB(10, 10));
    assertEquals(WHITE, image.getRGB(20, 10));
    BufferedImage cut =
        drawn(
            "<defs><clipPath id=\"c\"><rect width=\"8\" height=\"20\"/></clipPath></defs>"
                + "<g clip-path=\"url(#c)\"><g fill=\"#FF0000\"><path d=\"M5 5h10v10h-10z\"/></g></g>"
                + "<g fill=\"#FF0000\"><path d=\"M30 5l5 0 0 5-5 0z\"/></g>");
    assertEquals(RED, cut.getRGB(6, 10));
    assertEquals(WHITE, cut.getRGB(10, 10));
    assertEquals(RED, cut.getRGB(32, 7), "the clip ends with its group");
  }

  /** By hand: a stroke of no length with round ends is a dot. */
  @Test
  void roundStrokesOfNoLengthAreDots() {
    BufferedImage image =
        drawn(
            "<g fill=\"none\" stroke=\"#FF0000\" stroke-width=\"8\" stroke-linecap=\"round\">"
                + "<path d=\"M20 10h0\"/></g>");
    assertEquals(RED, image.getRGB(20, 10));
    assertEquals(WHITE, image.getRGB(26, 10));
  }

  @Test
  void whatIsNoFigureIsRefused() {
    assertThrows(IllegalArgumentException.class, () -> Raster.of("<svg", 1));
    assertThrows(IllegalArgumentException.class, () -> Raster.of("<svg width=\"x\"/>", 1));
  }

  @Test
  void figureOfOursComesOutInEveryProtocol() throws IOException {
    String svg =
        Figures.crossplot(
                Series.of("porosity", Units.percent, 12, 18, 21, 25),
                Series.of("k", Units.mD, 1.2, 40, 160, 900))
            .svg("f");
    BufferedImage image = Raster.of(svg, 1);
    String target = System.getProperty("connate.raster.out", "");
    if (!target.isEmpty()) {
      ImageIO.write(image, "png", new File(target));
    }
    String kitty = PictureTerminal.KITTY.sequence(image);
    String data = kitty.replaceAll("\u001b_G[^;]*;", "").replace("\u001b\\", "");
    BufferedImage back = ImageIO.read(new ByteArrayInputStream(Base64.getDecoder().decode(data)));
    assertEquals(image.getWidth(), back.getWidth());
    assertEquals(image.getRGB(300, 200), back.getRGB(300, 200));
    String sixels = PictureTerminal.SIXEL.sequence(image);
    assertTrue(sixels.startsWith("\u001bPq\"1;1;640;") && sixels.endsWith("\u001b\\"));
    assertEquals((image.getHeight() + 5) / 6, sixels.chars().filter(c -> c == '-').count());
    assertTrue(PictureTerminal.ITERM2.sequence(image).startsWith("\u001b]1337;File=inline=1:"));
  }

  @Test
  void terminalsAreKnownByTheirEnvironment() {
    assertEquals(
        Optional.of(PictureTerminal.KITTY), PictureTerminal.of(Map.of("TERM", "xterm-kitty")));
    assertEquals(
        Optional.of(PictureTerminal.ITERM2),
        PictureTerminal.of(Map.of("TERM", "xterm-256color", "TERM_PROGRAM", "iTerm.app")));
    assertEquals(Optional.of(PictureTerminal.SIXEL), PictureTerminal.of(Map.of("TERM", "foot")));
    assertTrue(PictureTerminal.of(Map.of("TERM", "xterm-256color")).isEmpty());
    assertTrue(PictureTerminal.of(Map.of("TERM", "xterm-kitty", "TMUX", "/tmp/x")).isEmpty());
  }
}
