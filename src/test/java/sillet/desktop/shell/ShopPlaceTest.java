package sillet.desktop.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.TimeoutException;
import javafx.application.Platform;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import javafx.stage.Window;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.desktop.drawing.Picture;
import sillet.desktop.theme.TextSize;
import sillet.desktop.theme.Theme;
import sillet.logbook.actions.NameShop;
import sillet.logbook.shop.Shop;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.store.Logbook;

class ShopPlaceTest {
  @TempDir Path folder;

  @Test
  void takesTechniciansThatWereLeftOutAtFirst() throws TimeoutException {
    begin();
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilShown("#bench-said");
      assertThat(window.shown("#technician")).isFalse();
      window.press(KeyCode.CONTROL, KeyCode.DIGIT4);
      window.untilShown("#technicians");
      assertThat(window.focused()).isEqualTo("shop-name");
      window.robot.clickOn("#technicians");
      window.type("Noor");
      window.press(KeyCode.CONTROL, KeyCode.S);
      window.untilSaid("Saved");

      assertThat(window.text("#technician")).isEqualTo("Noor");
      assertThat(window.text("#save-words")).startsWith("Saved ");
    }
    try (Logbook logbook = Logbook.open(TestWindow.placeIn(folder))) {
      assertThat(logbook.shop().shop().orElseThrow().what().technicians()).containsExactly("Noor");
      assertThat(logbook.shop().shop().orElseThrow().what().name()).isEqualTo("Quay");
    }
  }

  @Test
  void showsEveryKeyAndGivesTheFocusBack() throws TimeoutException, IOException {
    begin();
    new SettingsFile(folder).keep(new Settings(Theme.LIGHT, new TextSize(200)));
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilShown("#bench-said");
      window.press(KeyCode.F3);
      Node before = Picture.onFxThread(() -> window.scene().getFocusOwner());
      window.press(KeyCode.F1);
      Scene sheet = dialog(window);
      assertThat(sheet.getHeight()).isLessThanOrEqualTo(window.scene().getHeight());
      assertThat(labels(sheet)).contains(Texts.english().say("shell.key-theme-does"));
      Picture.onFxThread(() -> Picture.of(sheet)).save("dialog-keys");
      window.press(KeyCode.ENTER);
      window.until(() -> windows(window).isEmpty());

      assertThat(Picture.onFxThread(() -> window.scene().getFocusOwner())).isSameAs(before);
    }
  }

  @Test
  void showsACodeForWhatNobodyForesaw() throws TimeoutException, IOException {
    begin();
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilShown("#bench-said");
      IllegalStateException odd = new IllegalStateException("odd");
      Platform.runLater(
          () -> {
            throw odd;
          });
      Scene dialog = dialog(window);

      assertThat(
              Picture.onFxThread(
                  () ->
                      dialog.getRoot().lookupAll(".text-field").stream()
                          .map(field -> ((TextField) field).getText())
                          .toList()))
          .containsExactly(Unexpected.code(odd));
      Picture.onFxThread(() -> Picture.of(dialog)).save("dialog-unexpected");
      window.press(KeyCode.ENTER);
      window.until(() -> windows(window).isEmpty());
    }
  }

  @Test
  void asksBeforeSomethingIsLost() throws TimeoutException, IOException {
    begin();
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilShown("#bench-said");
      List<Boolean> answers = new CopyOnWriteArrayList<>();
      Message question = Message.of("bench.nothing");
      Platform.runLater(() -> answers.add(window.systemAsk().confirm(question)));
      Scene dialog = dialog(window);
      Picture.onFxThread(() -> Picture.of(dialog)).save("dialog-question");
      window.press(KeyCode.ESCAPE);
      window.until(() -> windows(window).isEmpty() && answers.size() == 1);
      assertThat(answers).containsExactly(false);

      Platform.runLater(() -> answers.add(window.systemAsk().confirm(question)));
      dialog(window);
      window.press(KeyCode.ENTER);
      window.until(() -> answers.size() == 2);
      assertThat(answers).containsExactly(false, true);
    }
  }

  private void begin() {
    try (Logbook logbook = Logbook.create(TestWindow.placeIn(folder))) {
      logbook.perform(new NameShop(Shop.usual("Quay", List.of())), "");
    }
  }

  private static Scene dialog(TestWindow window) {
    window.until(() -> windows(window).size() == 1);
    return Picture.onFxThread(() -> windows(window).get(0).getScene());
  }

  private static List<Window> windows(TestWindow window) {
    return Window.getWindows().stream()
        .filter(other -> other instanceof Stage && other != window.scene().getWindow())
        .toList();
  }

  private static List<String> labels(Scene scene) {
    return Picture.onFxThread(
        () ->
            scene.getRoot().lookupAll(".label").stream()
                .map(label -> ((Label) label).getText())
                .toList());
  }
}
