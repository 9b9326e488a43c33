package sillet.desktop.shell;

import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneId;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.stream.Stream;
import javafx.application.Platform;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.ButtonBase;
import javafx.scene.control.Labeled;
import javafx.scene.control.ListView;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import org.testfx.api.FxRobot;
import org.testfx.util.WaitForAsyncUtils;
import sillet.desktop.controls.Ask;
import sillet.desktop.drawing.Picture;
import sillet.store.place.LogbookPlace;

/** The real window over a real logbook in a folder of the test, driven by keys. */
final class TestWindow implements AutoCloseable {
  static final Clock CLOCK =
      Clock.fixed(Instant.parse("2025-12-01T14:05:00Z"), ZoneId.of("Europe/Berlin"));
  private static final int SECONDS = 20;

  final FxRobot robot = new FxRobot();
  final TestAsk ask = new TestAsk();
  private final LogbookPlace own;
  private Ask systemAsk = ask;
  private final Stage stage;
  private final ShopWindow window;

  private TestWindow(Path folder) {
    own = placeIn(folder);
    stage = Picture.onFxThread(Stage::new);
    window = Picture.onFxThread(() -> new ShopWindow(stage, own, CLOCK, this::instead));
    Picture.onFxThread(
        () -> {
          window.open();
          return stage;
        });
  }

  /** Opens the window over the logbook in a folder. */
  static TestWindow over(Path folder) throws TimeoutException {
    Picture.startToolkit();
    Platform.setImplicitExit(false);
    return new TestWindow(folder);
  }

  static LogbookPlace placeIn(Path folder) {
    return new LogbookPlace(folder.resolve("logbook.mv.db"));
  }

  private Ask instead(Ask system) {
    systemAsk = system;
    return ask;
  }

  /** What asks where no test answers. */
  Ask systemAsk() {
    return systemAsk;
  }

  LogbookPlace own() {
    return own;
  }

  Scene scene() {
    return stage.getScene();
  }

  /** Waits until a condition holds on the window's thread. */
  void until(Callable<Boolean> condition) {
    try {
      WaitForAsyncUtils.waitFor(SECONDS, TimeUnit.SECONDS, () -> Picture.onFxThread(condition));
    } catch (TimeoutException late) {
      throw new AssertionError("Did not come about in " + SECONDS + " s", late);
    }
    WaitForAsyncUtils.waitForFxEvents();
  }

  /** Waits until a node shows. */
  void untilShown(String query) {
    until(() -> scene().lookup(query) != null && shows(scene().lookup(query)));
  }

  boolean shown(String query) {
    return Picture.onFxThread(() -> scene().lookup(query) != null && shows(scene().lookup(query)));
  }

  String text(String query) {
    return Picture.onFxThread(() -> ((Labeled) scene().lookup(query)).getText());
  }

  /** The name of the node that has the focus. */
  String focused() {
    return Picture.onFxThread(() -> String.valueOf(scene().getFocusOwner().getId()));
  }

  /** All words that show. */
  List<String> texts() {
    return Picture.onFxThread(this::textsNow);
  }

  /** Waits until a part of some text shows. */
  void untilSaid(String part) {
    until(() -> textsNow().stream().anyMatch(text -> text.contains(part)));
  }

  private List<String> textsNow() {
    return Stream.of(".label", ".button", ".text-input")
        .flatMap(kind -> scene().getRoot().lookupAll(kind).stream())
        .filter(TestWindow::shows)
        .map(node -> node instanceof Labeled said ? said.getText() : typed(node))
        .toList();
  }

  private static String typed(Node node) {
    return node instanceof TextInputControl input ? input.getText() : "";
  }

  ListView<?> list(String query) {
    return (ListView<?>) Picture.onFxThread(() -> scene().lookup(query));
  }

  /** Waits until a list has as many rows. */
  void untilRows(String query, int count) {
    until(
        () ->
            scene().lookup(query) instanceof ListView<?> list
                && shows(list)
                && list.getItems().size() == count);
  }

  void press(KeyCode... keys) {
    robot.push(keys);
    WaitForAsyncUtils.waitForFxEvents();
  }

  void type(String text) {
    robot.write(text, 0);
    WaitForAsyncUtils.waitForFxEvents();
  }

  void fire(String query) {
    Picture.onFxThread(
        () -> {
          ((ButtonBase) scene().lookup(query)).fire();
          return query;
        });
  }

  private static boolean shows(Node node) {
    for (Node at = node; at != null; at = at.getParent()) {
      if (!at.isVisible()) {
        return false;
      }
    }
    return node.getScene() != null;
  }

  /** Closes as the technician does and waits until the window is gone. */
  @Override
  public void close() {
    Picture.onFxThread(
        () -> {
          window.close();
          return window;
        });
    until(() -> !stage.isShowing());
  }
}
