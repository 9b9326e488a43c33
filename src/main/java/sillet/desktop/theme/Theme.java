package sillet.desktop.theme;

import atlantafx.base.theme.PrimerDark;
import atlantafx.base.theme.PrimerLight;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import javafx.scene.Scene;

/** A colour sheet over the one base sheet. The stable word is what a setting keeps. */
public enum Theme {
  LIGHT("light", new PrimerLight().getUserAgentStylesheet()),
  DARK("dark", new PrimerDark().getUserAgentStylesheet()),
  CONTRAST("contrast", new PrimerDark().getUserAgentStylesheet());

  private static final String BASE_SHEET = sheet("sillet");

  private final String word;
  private final String underneath;

  Theme(String word, String underneath) {
    this.word = word;
    this.underneath = underneath;
  }

  /** The theme a stored word names; empty for a word of another program version. */
  public static Optional<Theme> ofWord(String word) {
    return Arrays.stream(values()).filter(theme -> theme.word.equals(word)).findFirst();
  }

  public String word() {
    return word;
  }

  /** The theme one key press further: light, dark, contrast, light again. */
  public Theme next() {
    return switch (this) {
      case LIGHT -> DARK;
      case DARK -> CONTRAST;
      case CONTRAST -> LIGHT;
    };
  }

  /**
   * Dresses a scene. May be called again at any time to change the theme; sheets of a screen that
   * stand behind ours stay where they are. Popups take the sheets of the window they belong to.
   */
  public void applyTo(Scene scene) {
    scene.setUserAgentStylesheet(underneath);
    List<String> sheets = scene.getStylesheets();
    List<String> ours = List.of(BASE_SHEET, colourSheet());
    if (sheets.size() >= 2 && sheets.subList(0, 2).equals(ours)) {
      return;
    }
    for (Theme other : values()) {
      sheets.remove(other.colourSheet());
    }
    sheets.remove(BASE_SHEET);
    sheets.addAll(0, ours);
  }

  private String colourSheet() {
    return sheet(word);
  }

  private static String sheet(String name) {
    var place = Theme.class.getResource("/sillet/desktop/" + name + ".css");
    if (place == null) {
      throw new IllegalStateException("Style sheet " + name + ".css is missing from the program");
    }
    return place.toExternalForm();
  }
}
