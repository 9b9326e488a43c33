package sillet.desktop.shell;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeoutException;
import javafx.scene.Group;
import javafx.scene.Node;
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
import sillet.store.Logbook;

/**
 * Walks over all screens of shell, lists and history in each shape of the window, keeps a picture
 * of each under target/looks, and checks that nothing sticks out of the window or lies on another
 * word.
 */
@ExtendWith(SoftAssertionsExtension.class)
class ScreensLookTest {
  @TempDir Path folder;
  @InjectSoftAssertions SoftAssertions soft;

  @ParameterizedTest
  @CsvSource({
    "light, 1280, 800, 100",
    "dark, 1280, 800, 100",
    "light, 1920, 1080, 100",
    "dark, 1280, 800, 150",
    "light, 1280, 800, 200",
    "contrast, 1280, 800, 100"
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
      window.type("Quay Street Strings");
      window.robot.clickOn("#reference-hz");
      window.press(KeyCode.CONTROL, KeyCode.A);
      window.type("44");
      window.press(KeyCode.CONTROL, KeyCode.ENTER);
      keep(window, size, "first-start-" + shape);
      window.press(KeyCode.CONTROL, KeyCode.D);
      window.untilRows("#bench-list", 3);
      keep(window, size, "bench-demo-" + shape);
      window.press(KeyCode.F3);
      window.type("lapwing");
      window.untilRows("#instrument-list", 1);
      keep(window, size, "search-" + shape);
      window.press(KeyCode.ENTER);
      window.press(KeyCode.ENTER);
      window.untilRows("#visit-list", 2);
      window.press(KeyCode.DOWN);
      window.untilSaid("ticket 1007");
      keep(window, size, "history-" + shape);
      window.press(KeyCode.CONTROL, KeyCode.DIGIT4);
      window.untilShown("#technicians");
      keep(window, size, "shop-" + shape);
    }
  }

  @ParameterizedTest
  @CsvSource({"light, 1280, 800, 100", "dark, 1920, 1080, 100", "light, 1280, 800, 150"})
  void keepsAFullBenchWithLongNamesInside(String theme, int width, int height, int percent)
      throws TimeoutException, IOException {
    int[] size = {width, height};
    String shape = theme + "-" + width + "-" + percent;
    new SettingsFile(folder)
        .keep(new Settings(Theme.ofWord(theme).orElseThrow(), new TextSize(percent)));
    try (Logbook logbook = Logbook.create(TestWindow.placeIn(folder))) {
      BusyShop.fill(logbook);
    }
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilRows("#bench-list", 13);
      window.until(() -> window.scene().getStylesheets().stream().anyMatch(s -> s.contains(theme)));
      keep(window, size, "bench-full-" + shape);
      window.press(KeyCode.CONTROL, KeyCode.DIGIT2);
      window.untilRows("#instrument-list", 13);
      keep(window, size, "instruments-" + shape);
      window.press(KeyCode.F3);
      window.type("fieldfare extra");
      window.untilRows("#instrument-list", 1);
      window.press(KeyCode.ENTER);
      window.press(KeyCode.ENTER);
      window.untilRows("#visit-list", 1);
      keep(window, size, "history-long-" + shape);
    }
  }

  /** The headless screen is 1280 wide; a larger window is laid out in a scene of its own. */
  private void keep(TestWindow window, int[] size, String name) throws IOException {
    Scene real = window.scene();
    Parent root = real.getRoot();
    Node focused = real.getFocusOwner();
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
