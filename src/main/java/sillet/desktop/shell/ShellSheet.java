package sillet.desktop.shell;

import java.util.List;
import java.util.Objects;
import javafx.scene.Scene;

/** Dresses a scene: theme, text size and the sheets of shell and screens behind the theme's. */
final class ShellSheet {
  private static final List<String> SHEETS = List.of(sheet("shell.css"), sheet("parts.css"));

  private ShellSheet() {}

  static void dress(Scene scene, Settings settings) {
    settings.theme().applyTo(scene);
    settings.textSize().applyTo(scene);
    for (String sheet : SHEETS) {
      if (!scene.getStylesheets().contains(sheet)) {
        scene.getStylesheets().add(sheet);
      }
    }
  }

  private static String sheet(String name) {
    var place = ShellSheet.class.getResource("/sillet/desktop/" + name);
    return Objects.requireNonNull(place, name + " is missing from the program").toExternalForm();
  }
}
