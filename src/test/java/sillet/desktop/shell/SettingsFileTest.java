package sillet.desktop.shell;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.desktop.theme.TextSize;
import sillet.desktop.theme.Theme;
import sillet.logbook.text.Rejection;

class SettingsFileTest {
  @TempDir Path folder;

  @Test
  void isAsUsualWhereThereIsNone() {
    assertThat(new SettingsFile(folder).fetch()).isEqualTo(Settings.USUAL);
  }

  @Test
  void readsWhatItWroteAndLeavesNothingElseBehind() throws IOException {
    Settings settings = new Settings(Theme.CONTRAST, new TextSize(150));
    Path made = folder.resolve("not-there-yet");
    new SettingsFile(made).keep(settings);

    assertThat(new SettingsFile(made).fetch()).isEqualTo(settings);
    try (Stream<Path> files = Files.list(made)) {
      assertThat(files).hasSize(1);
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"", "theme=", "theme=purple\ntext-percent=", "text-percent=huge", "=\n==\n\u0000"})
  void keepsTheUsualForWhatItDoesNotKnow(String text) throws IOException {
    SettingsFile file = new SettingsFile(folder);
    Files.writeString(file.file(), text);

    assertThat(file.fetch()).isEqualTo(Settings.USUAL);
  }

  @Test
  void takesTheNearestSizeItCanShow() throws IOException {
    SettingsFile file = new SettingsFile(folder);
    Files.writeString(file.file(), "text-percent=900");

    assertThat(file.fetch().textSize().percent()).isEqualTo(200);
  }

  @Test
  void saysWhereItCouldNotWrite() throws IOException {
    Path inTheWay = Files.writeString(folder.resolve("file"), "");

    assertThatThrownBy(() -> new SettingsFile(inTheWay).keep(Settings.USUAL))
        .isInstanceOfSatisfying(
            Rejection.class,
            said -> assertThat(said.reason().values().get(0)).contains(inTheWay.toString()));
  }
}
