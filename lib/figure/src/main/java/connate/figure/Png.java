package connate.figure;

import connate.file.AtomicFile;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.List;
import javax.imageio.ImageIO;
import org.knowm.xchart.XYChart;

/**
 * A figure as a PNG, drawn by XChart: for terminals that show pictures, and for slides. Logs hold
 * the SVG, which is the same on every machine; the letters of a PNG are those of the machine's own
 * fonts.
 *
 * <p>Needs the system's libraries freetype and fontconfig and one font.
 */
public final class Png {

  private Png() {}

  /**
   * Returns the figure as a PNG.
   *
   * @param figure the figure
   * @param width its width in pixels
   * @param height its height in pixels
   * @throws IllegalArgumentException if the figure is none of this library's, has an axis of names,
   *     or the machine has no font libraries
   */
  public static byte[] of(Figure figure, int width, int height) {
    if (!(figure instanceof PlottedFigure plotted)) {
      throw new IllegalArgumentException("only figures of this library can be drawn as PNG");
    }
    if (plotted.plot().panels().stream().anyMatch(Png::hasNames)) {
      throw new IllegalArgumentException(
          "XChart has no axis of names beside one of numbers; use the SVG of «"
              + figure.title()
              + "»");
    }
    try {
      return encoded(drawn(plotted.plot(), width, height));
    } catch (NoClassDefFoundError | UnsatisfiedLinkError e) {
      throw new IllegalArgumentException(
          "a PNG needs the system's font libraries (Debian: libfreetype6 libfontconfig1 and a"
              + " font, such as fonts-dejavu-core)",
          e);
    }
  }

  /** Writes the figure as a PNG file of 1280 by 860 pixels, whole or not at all. */
  public static void write(Figure figure, Path file) {
    AtomicFile.write(file, of(figure, 1280, 860));
  }

  private static boolean hasNames(Panel panel) {
    return panel.x().scale() instanceof NameScale || panel.y().scale() instanceof NameScale;
  }

  /** Panels stand side by side, each as wide as its weight says. */
  private static BufferedImage drawn(Plot plot, int width, int height) {
    BufferedImage image = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
    Graphics2D graphics = image.createGraphics();
    try {
      List<Panel> panels = plot.panels();
      double all = panels.stream().mapToDouble(Panel::weight).sum();
      int left = 0;
      double weight = 0;
      for (int i = 0; i < panels.size(); i++) {
        weight += panels.get(i).weight();
        int right = (int) Math.round(width * weight / all);
        XYChart chart =
            PngPanel.chart(panels.get(i), i == 0 ? plot.title() : "", right - left, height);
        graphics.translate(left, 0);
        chart.paint(graphics, right - left, height);
        graphics.translate(-left, 0);
        left = right;
      }
    } finally {
      graphics.dispose();
    }
    return image;
  }

  private static byte[] encoded(BufferedImage image) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try {
      ImageIO.write(image, "png", out);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return out.toByteArray();
  }
}
