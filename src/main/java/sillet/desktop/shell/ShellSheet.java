package sillet.desktop.shell;

import java.util.Objects;
import javafx.scene.Scene;

/** Dresses a scene: theme, text size and the sheet of shell and screens behind the theme's. */
final class ShellSheet {
  private static final String SHEET =
      Objects.requireNonNull(
              ShellSheet.class.getResource("/sillet/desktop/shell.css"),
              "shell.css is missing from the program")
          .toExternalForm();

  private ShellSheet() {}

  static void dress(Scene scene, Settings settings) {
    settings.theme().applyTo(scene);
    settings.textSize().applyTo(scene);
    if (!scene.getStylesheets().contains(SHEET)) {
      scene.getStylesheets().add(SHEET);
    }
  }
}
