package sillet.desktop.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.TimeoutException;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.desktop.theme.TextSize;
import sillet.desktop.theme.Theme;

class WindowLookTest {
  @TempDir Path folder;

  @Test
  void keepsThemeAndTextSizeForTheNextStart() throws TimeoutException {
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilShown("#open-demo");
      window.press(KeyCode.F9);
      window.press(KeyCode.CONTROL, KeyCode.PLUS);
      window.press(KeyCode.CONTROL, KeyCode.PLUS);
      window.press(KeyCode.CONTROL, KeyCode.MINUS);
      window.until(() -> new SettingsFile(folder).fetch().textSize().percent() == 110);
    }
    assertThat(new SettingsFile(folder).fetch())
        .isEqualTo(new Settings(Theme.DARK, new TextSize(110)));
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilShown("#open-demo");
      window.until(
          () -> window.scene().getStylesheets().stream().anyMatch(s -> s.contains("dark")));
    }
  }

  @Test
  void showsThatTheyCouldNotBeKept() throws TimeoutException, IOException {
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilShown("#open-demo");
      window.press(KeyCode.CONTROL, KeyCode.D);
      window.untilRows("#bench-list", 3);
      // a folder that is not empty cannot be moved away: no file comes to lie there
      Path inTheWay = Files.createDirectory(new SettingsFile(folder).file());
      Files.writeString(inTheWay.resolve("full"), "");
      window.press(KeyCode.F9);
      window.untilShown("#not-saved");

      assertThat(window.texts()).contains("Not saved");
      assertThat(window.text("#not-saved")).contains(inTheWay.toString());
    }
  }
}
