package sillet.desktop.theme;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import javafx.scene.Scene;
import javafx.scene.layout.Pane;
import javafx.scene.text.Font;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.testfx.api.FxToolkit;

class ThemeTest {
  @BeforeAll
  static void startToolkit() throws java.util.concurrent.TimeoutException {
    FxToolkit.registerPrimaryStage();
    Fonts.load();
  }

  @Test
  void comesBackFromItsStoredWord() {
    assertThat(Theme.values()).allMatch(theme -> Theme.ofWord(theme.word()).get() == theme);
    assertThat(Theme.ofWord("sepia")).isEmpty();
  }

  @Test
  void oneKeyGoesRoundAllThemes() {
    assertThat(Theme.LIGHT.next().next().next()).isEqualTo(Theme.LIGHT);
    assertThat(List.of(Theme.LIGHT.next(), Theme.DARK.next()))
        .containsExactly(Theme.DARK, Theme.CONTRAST);
  }

  @Test
  void aChangeOfThemeLeavesTwoSheetsOfOursBeforeTheScreensOwn() {
    Scene scene = new Scene(new Pane());
    scene.getStylesheets().add("screen.css");
    Theme.LIGHT.applyTo(scene);
    Theme.DARK.applyTo(scene);
    Theme.DARK.applyTo(scene);
    assertThat(scene.getStylesheets()).hasSize(3).element(2).isEqualTo("screen.css");
    assertThat(scene.getStylesheets().get(0)).endsWith("sillet.css");
    assertThat(scene.getStylesheets().get(1)).endsWith("dark.css");
  }

  @Test
  void theFamilyIsKnownInItsFourStyles() {
    assertThat(Font.getFontNames(Fonts.FAMILY))
        .contains("B612 Regular", "B612 Bold", "B612 Italic", "B612 Bold Italic");
  }
}
