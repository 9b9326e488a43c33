package sillet.desktop.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.concurrent.TimeoutException;
import java.util.function.Consumer;
import javafx.scene.Scene;
import javafx.scene.control.ComboBox;
import javafx.scene.control.TextInputControl;
import javafx.stage.Stage;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import sillet.desktop.drawing.Picture;
import sillet.desktop.theme.TextSize;
import sillet.desktop.theme.Theme;
import sillet.desktop.visit.AtOnce;
import sillet.desktop.visit.SampleVisits;
import sillet.desktop.visit.TestDesk;
import sillet.logbook.instruments.InstrumentKind;
import sillet.store.Logbook;

/** Renders the page under target/looks, to be looked at. */
class IntakeGalleryTest {

  @BeforeAll
  static void startToolkit() throws TimeoutException {
    Picture.startToolkit();
  }

  private static void draw(String name, Theme theme, int percent, Consumer<Scene> hand)
      throws IOException {
    int width = name.contains("1920") ? 1920 : 1280;
    int height = name.contains("1920") ? 1030 : 750;
    Picture picture =
        Picture.onFxThread(
            () -> {
              try (Logbook logbook = Logbook.inMemory()) {
                new SampleVisits(logbook)
                    .takeIn(SampleVisits.six(), SampleVisits.sixStrings(648), java.util.List.of());
                IntakeScreen screen =
                    new IntakeScreen(new TestDesk(logbook, new AtOnce()).desk(), null);
                Scene scene =
                    new Scene(new javafx.scene.layout.BorderPane(screen.node()), width, height);
                scene.getRoot().getStyleClass().add("bench-ground");
                theme.applyTo(scene);
                new TextSize(percent).applyTo(scene);
                Stage stage = new Stage();
                stage.setScene(scene);
                stage.show();
                screen.shown();
                scene.getRoot().layout();
                hand.accept(scene);
                scene.getRoot().applyCss();
                scene.getRoot().layout();
                Picture seen = Picture.of(scene);
                stage.hide();
                return seen;
              }
            });
    picture.save("intake-" + name);
    assertThat(picture.countOther(picture.colourAt(2, 400))).isGreaterThan(60_000);
  }

  private static void type(Scene scene, String query, String text) {
    TextInputControl field = (TextInputControl) scene.lookup(query);
    field.requestFocus();
    field.setText(text);
  }

  @SuppressWarnings("unchecked")
  private static void kind(Scene scene, InstrumentKind kind) {
    ((ComboBox<InstrumentKind>) scene.lookup("#kind")).setValue(kind);
  }

  private static void filled(Scene scene) {
    type(scene, "#customer-name", "Ilkka Sandvoll");
    type(scene, "#customer-phone", "555 0171");
    type(scene, "#model", "Alder");
    type(scene, "#scale", "25.5in");
    ((ComboBox<?>) scene.lookup("#screw")).getEditor().setText("M3");
    String[] gauges = {"10", "13", "17", "26", "36", "46"};
    for (int i = 0; i < gauges.length; i++) {
      type(scene, "#gauge-" + (i + 1), gauges[i]);
    }
    type(scene, "#request", "The low strings sound sour up the neck.");
    type(scene, "#promised", "+3");
    type(scene, "#humidity", "44");
    scene.lookup("#temperature").requestFocus();
  }

  @Test
  void anEmptyPageAndAFilledOne() throws IOException {
    draw("empty", Theme.LIGHT, 100, scene -> {});
    draw("filled", Theme.LIGHT, 100, IntakeGalleryTest::filled);
    draw("filled-1920", Theme.DARK, 100, IntakeGalleryTest::filled);
    draw("filled-150", Theme.DARK, 150, IntakeGalleryTest::filled);
  }

  @Test
  void whoIsKnownIsOffered() throws IOException {
    draw("known", Theme.LIGHT, 100, scene -> type(scene, "#customer-name", "mar"));
  }

  @Test
  void whatIsWrongIsMarked() throws IOException {
    draw(
        "wrong",
        Theme.LIGHT,
        100,
        scene -> {
          filled(scene);
          type(scene, "#model", "");
          type(scene, "#scale", "64o");
          type(scene, "#gauge-3", "1.7.1");
          type(scene, "#gauge-6", ".460");
          ((javafx.scene.control.Button) scene.lookup("#take-in")).fire();
        });
  }

  @Test
  void otherKinds() throws IOException {
    draw(
        "banjo",
        Theme.LIGHT,
        100,
        scene -> {
          kind(scene, InstrumentKind.BANJO);
          type(scene, "#scale", "670");
        });
    draw(
        "mandolin",
        Theme.LIGHT,
        100,
        scene -> {
          kind(scene, InstrumentKind.MANDOLIN);
          type(scene, "#scale", "352");
        });
  }
}
