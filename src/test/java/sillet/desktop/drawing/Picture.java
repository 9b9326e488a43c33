package sillet.desktop.drawing;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import javafx.application.Platform;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javafx.scene.image.WritableImage;
import javafx.scene.paint.Color;
import javax.imageio.ImageIO;
import org.testfx.api.FxToolkit;
import sillet.desktop.theme.Fonts;
import sillet.desktop.theme.TextSize;
import sillet.desktop.theme.Theme;

/** A scene rendered without a display, to look at and to count pixels in. */
public final class Picture {
  private static final Path LOOKS = Path.of("target", "looks");
  private static final int CLOSE = 6;

  private final WritableImage image;

  private Picture(WritableImage image) {
    this.image = image;
  }

  /** Starts the toolkit once and makes the type known. */
  public static void startToolkit() throws TimeoutException {
    FxToolkit.registerPrimaryStage();
    Fonts.load();
  }

  /** Lays the content out in a scene of the given size in px and renders it. */
  public static Picture of(Callable<Parent> content, Theme theme, int percent, int... size) {
    return onFxThread(
        () -> {
          Scene scene = new Scene(content.call(), size[0], size[1]);
          theme.applyTo(scene);
          new TextSize(percent).applyTo(scene);
          return new Picture(scene.snapshot(null));
        });
  }

  /** Renders a scene as it is; on the FX thread only. */
  public static Picture of(Scene scene) {
    return new Picture(scene.snapshot(null));
  }

  /** Runs on the FX thread and waits. */
  public static <V> V onFxThread(Callable<V> work) {
    FutureTask<V> task = new FutureTask<>(work);
    Platform.runLater(task);
    try {
      return task.get(30, TimeUnit.SECONDS);
    } catch (InterruptedException | ExecutionException | TimeoutException e) {
      throw new AssertionError("Work on the FX thread failed", e);
    }
  }

  /** Writes the picture under target/looks. */
  public Picture save(String name) throws IOException {
    int width = (int) image.getWidth();
    int height = (int) image.getHeight();
    BufferedImage copy = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
    for (int y = 0; y < height; y++) {
      for (int x = 0; x < width; x++) {
        copy.setRGB(x, y, image.getPixelReader().getArgb(x, y));
      }
    }
    Files.createDirectories(LOOKS);
    ImageIO.write(copy, "png", LOOKS.resolve(name + ".png").toFile());
    return this;
  }

  public Color colourAt(int x, int y) {
    return image.getPixelReader().getColor(x, y);
  }

  /** Pixels of a colour, blended edges left out. */
  public int count(String webColour) {
    return countBetween(webColour, 0, (int) image.getWidth());
  }

  /** The same in the columns from one x to another. */
  public int countBetween(String webColour, int fromX, int toX) {
    Color wanted = Color.web(webColour);
    int count = 0;
    for (int y = 0; y < (int) image.getHeight(); y++) {
      for (int x = fromX; x < toX; x++) {
        count += near(colourAt(x, y), wanted) ? 1 : 0;
      }
    }
    return count;
  }

  /** Pixels that are not of a colour. */
  public int countOther(Color ground) {
    int count = 0;
    for (int y = 0; y < (int) image.getHeight(); y++) {
      for (int x = 0; x < (int) image.getWidth(); x++) {
        count += near(colourAt(x, y), ground) ? 0 : 1;
      }
    }
    return count;
  }

  private static boolean near(Color seen, Color wanted) {
    return Math.abs(seen.getRed() - wanted.getRed()) * 255 < CLOSE
        && Math.abs(seen.getGreen() - wanted.getGreen()) * 255 < CLOSE
        && Math.abs(seen.getBlue() - wanted.getBlue()) * 255 < CLOSE;
  }
}
