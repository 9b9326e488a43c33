package sillet.desktop.shell;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeoutException;
import javafx.scene.Group;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javafx.scene.input.KeyCode;
import org.assertj.core.api.SoftAssertions;
import org.assertj.core.api.junit.jupiter.InjectSoftAssertions;
import org.assertj.core.api.junit.jupiter.SoftAssertionsExtension;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sillet.desktop.drawing.Picture;
import sillet.desktop.theme.TextSize;
import sillet.desktop.theme.Theme;

/**
 * Walks over string sets and the sheets of frets and pickups in each shape of the window, keeps
 * pictures under target/looks, and checks that nothing sticks out or is cut.
 */
@ExtendWith(SoftAssertionsExtension.class)
class PartsLookTest {
  @TempDir Path folder;
  @InjectSoftAssertions SoftAssertions soft;

  @ParameterizedTest
  @CsvSource({
    "light, 1280, 800, 100",
    "dark, 1280, 800, 100",
    "light, 1920, 1080, 100",
    "dark, 1280, 800, 150",
  })
  void keepsEverythingInsideTheWindow(String theme, int width, int height, int percent)
      throws TimeoutException, IOException {
    int[] size = {width, height};
    String shape = theme + "-" + width + "-" + percent;
    new SettingsFile(folder)
        .keep(new Settings(Theme.ofWord(theme).orElseThrow(), new TextSize(percent)));
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilShown("#shop-name");
      window.until(() -> window.scene().getStylesheets().stream().anyMatch(s -> s.contains(theme)));
      window.press(KeyCode.CONTROL, KeyCode.D);
      window.untilRows("#bench-list", 3);
      sets(window, size, shape);
      instrument(window, size, shape);
    }
  }

  private void sets(TestWindow window, int[] size, String shape) throws IOException {
    window.press(KeyCode.CONTROL, KeyCode.DIGIT3);
    window.untilRows("#set-list", 4);
    window.press(KeyCode.SPACE);
    window.press(KeyCode.DOWN);
    keep(window, size, "sets-" + shape);
    window.press(KeyCode.F7);
    window.untilShown("#sets-wanted");
    keep(window, size, "sets-ladder-" + shape);
    window.press(KeyCode.F7);
    keep(window, size, "sets-materials-" + shape);
    window.press(KeyCode.F7);
    window.press(KeyCode.CONTROL, KeyCode.D);
    window.untilShown("#set-name-field");
    window.press(KeyCode.TAB);
    window.press(KeyCode.TAB);
    window.press(KeyCode.CONTROL, KeyCode.A);
    window.type("thin");
    window.press(KeyCode.TAB);
    keep(window, size, "sets-edit-" + shape);
    window.press(KeyCode.ESCAPE);
  }

  private void instrument(TestWindow window, int[] size, String shape) throws IOException {
    window.press(KeyCode.F3);
    window.type("lapwing");
    window.untilRows("#instrument-list", 1);
    window.press(KeyCode.ENTER);
    window.press(KeyCode.ENTER);
    window.untilRows("#visit-list", 2);
    keep(window, size, "parts-history-" + shape);
    window.press(KeyCode.CONTROL, KeyCode.F);
    window.untilSaid("costs most");
    keep(window, size, "frets-" + shape);
    window.press(KeyCode.ESCAPE);
    window.untilRows("#visit-list", 2);
    window.press(KeyCode.CONTROL, KeyCode.P);
    window.untilSaid("hardly heard, up to");
    keep(window, size, "pickups-" + shape);
  }

  /** The headless screen is 1280 wide; a larger window is laid out in a scene of its own. */
  private void keep(TestWindow window, int[] size, String name) throws IOException {
    Scene real = window.scene();
    Parent root = real.getRoot();
    var focused = real.getFocusOwner();
    Scene scene =
        Picture.onFxThread(
            () -> {
              if (size[0] <= real.getWidth()) {
                return real;
              }
              real.setRoot(new Group());
              Scene larger = new Scene(root, size[0], size[1]);
              larger.setUserAgentStylesheet(real.getUserAgentStylesheet());
              larger.getStylesheets().setAll(real.getStylesheets());
              return larger;
            });
    Picture.onFxThread(() -> Picture.of(scene)).save(name);
    List<String> amiss = Picture.onFxThread(() -> Misplaced.in(scene));
    Picture.onFxThread(
        () -> {
          if (scene != real) {
            scene.setRoot(new Group());
            real.setRoot(root);
            focused.requestFocus();
          }
          return real;
        });
    soft.assertThat(amiss).as(name).isEmpty();
  }
}
