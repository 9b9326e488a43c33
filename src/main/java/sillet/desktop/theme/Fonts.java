package sillet.desktop.theme;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;
import javafx.scene.text.Font;

/** The one type family of the program. Its four files travel inside the jar. */
public final class Fonts {
  /** The family name under which JavaFX knows the loaded files. */
  public static final String FAMILY = "B612";

  private static final List<String> STYLES = List.of("Regular", "Bold", "Italic", "BoldItalic");

  private Fonts() {}

  /** Makes the family known to JavaFX. Call once, before the first window is laid out. */
  public static void load() {
    for (String style : STYLES) {
      loadFile("/sillet/desktop/fonts/B612-" + style + ".ttf");
    }
  }

  private static void loadFile(String place) {
    try (InputStream file = Fonts.class.getResourceAsStream(place)) {
      if (file == null || Font.loadFont(file, 14) == null) {
        throw new IllegalStateException(
            "Font " + place + " is missing from the program or damaged");
      }
    } catch (IOException e) {
      throw new UncheckedIOException("Font " + place + " could not be read", e);
    }
  }
}
