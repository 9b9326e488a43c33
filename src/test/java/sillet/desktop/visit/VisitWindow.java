package sillet.desktop.visit;

import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.TimeoutException;
import java.util.function.Consumer;
import javafx.application.Platform;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.ButtonBase;
import javafx.scene.control.Labeled;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.StackPane;
import javafx.stage.Stage;
import org.testfx.api.FxRobot;
import org.testfx.util.WaitForAsyncUtils;
import sillet.desktop.drawing.Picture;
import sillet.desktop.theme.TextSize;
import sillet.desktop.theme.Theme;
import sillet.logbook.visits.VisitRecord;
import sillet.store.Logbook;

/** The page of an invented visit in a window of its own, over a logbook in memory. */
final class VisitWindow implements AutoCloseable {
  static final int TICKET = 2417;

  final FxRobot robot = new FxRobot();
  final Logbook logbook = Logbook.inMemory();
  final TestDesk desk = new TestDesk(logbook, new AtOnce());
  private final Stage stage;
  private final VisitScreen screen;

  private VisitWindow(Consumer<SampleVisits> told) {
    told.accept(new SampleVisits(logbook));
    screen = Picture.onFxThread(() -> new VisitScreen(desk.desk(), TICKET));
    stage = Picture.onFxThread(this::show);
  }

  static VisitWindow over(Consumer<SampleVisits> told) throws TimeoutException {
    Picture.startToolkit();
    Platform.setImplicitExit(false);
    return new VisitWindow(told);
  }

  /** A six-string that nobody has read. */
  static VisitWindow blank() throws TimeoutException {
    return over(
        visits -> visits.takeIn(SampleVisits.six(), SampleVisits.sixStrings(648), List.of()));
  }

  private Stage show() {
    Scene scene = new Scene(new StackPane(screen.node()), 1280, 750);
    Theme.LIGHT.applyTo(scene);
    TextSize.USUAL.applyTo(scene);
    scene.getAccelerators().putAll(screen.keys());
    Stage shown = new Stage();
    shown.setScene(scene);
    shown.show();
    screen.shown();
    return shown;
  }

  <V> V now(Callable<V> look) {
    WaitForAsyncUtils.waitForFxEvents();
    return Picture.onFxThread(look);
  }

  Node node(String query) {
    return stage.getScene().lookup(query);
  }

  /** What stands in a field. */
  String field(String query) {
    return now(() -> ((TextField) node(query)).getText());
  }

  /** What a label or button says. */
  String said(String query) {
    return now(() -> ((Labeled) node(query)).getText());
  }

  /** Identity of what has the focus. */
  String focused() {
    return now(
        () -> {
          for (Node at = stage.getScene().getFocusOwner(); at != null; at = at.getParent()) {
            if (at.getId() != null) {
              return at.getId();
            }
          }
          return "nothing";
        });
  }

  /** Whether some label says this. */
  boolean says(String text) {
    return now(
        () ->
            stage.getScene().getRoot().lookupAll(".label").stream()
                .anyMatch(node -> node instanceof Labeled label && label.getText().contains(text)));
  }

  void focus(String query) {
    now(
        () -> {
          node(query).requestFocus();
          return query;
        });
  }

  void fire(String query) {
    now(
        () -> {
          ((ButtonBase) node(query)).fire();
          return query;
        });
  }

  void type(String text) {
    robot.write(text, 0);
    WaitForAsyncUtils.waitForFxEvents();
  }

  void press(KeyCode... keys) {
    robot.push(keys);
    WaitForAsyncUtils.waitForFxEvents();
  }

  void leave() {
    now(
        () -> {
          screen.left();
          return screen;
        });
  }

  /** What the logbook holds of it now. */
  VisitRecord record() {
    return logbook.visits().byTicket(TICKET).orElseThrow();
  }

  @Override
  public void close() {
    now(
        () -> {
          stage.close();
          return stage;
        });
    logbook.close();
  }
}
