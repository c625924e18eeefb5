package connate.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.quantity.Units;
import connate.series.Labels;
import connate.series.Series;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;

class PngTest {

  private static final Series PHI = Series.of("porosity", Units.percent, 8, 12, 17, 24, 22, 15);
  private static final Series K = Series.of("k", Units.mD, 0.1, 1, 12, 140, 0, 7);
  private static final Labels FACIES = Labels.of("facies", "a", "b", "a", "b", "a", "b");

  private static List<Figure> figures() {
    Series depth = Series.of("depth", Units.m, 100, 101, 102, 103, 104, 105);
    return List.of(
        Figures.crossplot(PHI, K).byGroup(FACIES),
        Figures.histogram(K).logAxis().byGroup(FACIES),
        Figures.depthPlot(PHI.atDepth(depth), K.atDepth(depth)),
        Figures.curves(PHI, K),
        Figures.probabilityPlot(K));
  }

  private static BufferedImage image(byte[] png) throws IOException {
    return ImageIO.read(new ByteArrayInputStream(png));
  }

  @Test
  void everyKindOfFigureIsDrawn() throws IOException {
    String folder = System.getProperty("raster.folder");
    int number = 0;
    for (Figure figure : figures()) {
      byte[] png = Png.of(figure, 640, 430);
      BufferedImage image = image(png);
      assertEquals(640, image.getWidth(), figure.title());
      assertEquals(430, image.getHeight(), figure.title());
      Set<Integer> colours = new HashSet<>();
      for (int x = 0; x < 640; x += 2) {
        for (int y = 0; y < 430; y += 2) {
          colours.add(image.getRGB(x, y));
        }
      }
      assertTrue(colours.size() > 8, figure.title() + " shows " + colours.size() + " colours");
      if (folder != null) {
        Files.write(Path.of(folder, "raster-" + number++ + ".png"), png);
      }
    }
  }

  @Test
  void axesOfNamesAreRefusedInWords() {
    var e =
        assertThrows(
            IllegalArgumentException.class, () -> Png.of(Figures.boxes(PHI, FACIES), 640, 430));
    assertTrue(e.getMessage().contains("use the SVG"), e.getMessage());
  }

  @Test
  void foreignFiguresAreRefused() {
    Figure foreign =
        new Figure() {
          @Override
          public String title() {
            return "";
          }

          @Override
          public String description() {
            return "";
          }

          @Override
          public List<String> notes() {
            return List.of();
          }

          @Override
          public String svg(String idPrefix) {
            return "";
          }

          @Override
          public String sketch(int columns, int rows) {
            return "";
          }

          @Override
          public int width() {
            return 1;
          }

          @Override
          public int height() {
            return 1;
          }
        };
    assertThrows(IllegalArgumentException.class, () -> Png.of(foreign, 10, 10));
  }
}
