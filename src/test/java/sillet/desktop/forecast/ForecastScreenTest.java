package sillet.desktop.forecast;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.concurrent.TimeoutException;
import java.util.function.Consumer;
import java.util.stream.Collectors;
import javafx.scene.Scene;
import javafx.scene.control.Labeled;
import javafx.scene.control.TextField;
import javafx.scene.layout.StackPane;
import javafx.stage.Stage;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import sillet.desktop.drawing.Picture;
import sillet.desktop.theme.TextSize;
import sillet.desktop.theme.Theme;
import sillet.desktop.visit.AtOnce;
import sillet.desktop.visit.SampleVisits;
import sillet.desktop.visit.TestDesk;
import sillet.store.Logbook;

/** The page of a forecast over a logbook in memory; its pictures lie under target/looks. */
class ForecastScreenTest {
  @BeforeAll
  static void startToolkit() throws TimeoutException {
    Picture.startToolkit();
  }

  private record Seen(Picture picture, String words) {}

  private static Seen look(Theme theme, int percent, int[] size, Consumer<Scene> hand) {
    try (Logbook logbook = Logbook.inMemory()) {
      SampleVisits visits = new SampleVisits(logbook);
      visits.takeIn(
          SampleVisits.six(),
          SampleVisits.sixStrings(648),
          SampleVisits.brackets(-0.3, 0.6, 0.6, 1.4, 1.4, 3.1));
      visits.check(6).read(1, 12, "5.0", "3.2", "7.8", "0.3", "2.1", "-2.6");
      Stage stage = Picture.onFxThread(() -> show(logbook, theme, percent, size));
      Picture.onFxThread(
          () -> {
            hand.accept(stage.getScene());
            return stage;
          });
      return Picture.onFxThread(() -> seen(stage));
    }
  }

  private static Stage show(Logbook logbook, Theme theme, int percent, int[] size) {
    ForecastScreen screen = new ForecastScreen(new TestDesk(logbook, new AtOnce()).desk(), 2417);
    Scene scene = new Scene(new StackPane(screen.node()), size[0], size[1]);
    theme.applyTo(scene);
    new TextSize(percent).applyTo(scene);
    Stage stage = new Stage();
    stage.setScene(scene);
    stage.show();
    screen.shown();
    return stage;
  }

  private static Seen seen(Stage stage) {
    stage.getScene().getRoot().applyCss();
    stage.getScene().getRoot().layout();
    String words =
        stage.getScene().getRoot().lookupAll(".label").stream()
            .map(node -> ((Labeled) node).getText())
            .collect(Collectors.joining("\n"));
    Seen seen = new Seen(Picture.of(stage.getScene()), words);
    stage.hide();
    return seen;
  }

  private static void type(Scene scene, String field, String text) {
    ((TextField) scene.lookup(field)).setText(text);
  }

  @Test
  void saysWhatATuningTwoSemitonesLowerAsksFor() throws IOException {
    int[] size = {1280, 750};
    Seen now = look(Theme.LIGHT, 100, size, scene -> {});
    assertThat(now.words()).contains("Nothing changes yet.").doesNotContain("lighter");
    Seen lower = look(Theme.LIGHT, 100, size, scene -> type(scene, "#forecast-semitones", "-2"));
    assertThat(lower.words().lines().filter(line -> line.startsWith("lighter")))
        .as("every string is lighter")
        .hasSize(6);
    assertThat(lower.words()).doesNotContain("Nothing changes yet.");
    lower.picture().save("forecast-6");
  }

  @Test
  void asksForTheFieldThatCannotBeRead() {
    int[] size = {1280, 750};
    Seen wrong = look(Theme.LIGHT, 100, size, scene -> type(scene, "#forecast-pitch-1", "H4"));
    assertThat(wrong.words()).contains("H4");
  }

  @Test
  void staysReadableInTheDarkAndLarge() throws IOException {
    int[] size = {1280, 1100};
    Seen seen =
        look(
            Theme.DARK,
            150,
            size,
            scene -> {
              type(scene, "#forecast-gauge-3", "20w");
              type(scene, "#forecast-action-6", "1.5");
            });
    seen.picture().save("forecast-6-dark-150");
    assertThat(seen.words()).contains("heavier");
  }
}
