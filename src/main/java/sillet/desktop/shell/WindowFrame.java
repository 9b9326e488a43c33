package sillet.desktop.shell;

import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Screen;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;

/**
 * What stands in the window: the top line, below it two lines that show only when they have to
 * (this is the demo; this is not saved, because), and the screen.
 */
final class WindowFrame extends BorderPane {
  private final Texts texts;
  private final TopLine topLine;
  private final HBox demoLine;
  private final Button leaveDemo;
  private final Label notSaved = new Label();
  private final VBox top;

  WindowFrame(Texts texts) {
    this.texts = texts;
    this.topLine = new TopLine(texts);
    this.leaveDemo = new Button(texts.say("shell.leave-demo"));
    leaveDemo.setId("leave-demo");
    this.demoLine = demoLine();
    notSaved.setId("not-saved");
    notSaved.setWrapText(true);
    notSaved.getStyleClass().addAll(Looks.NEEDS_HAND, "not-saved-line");
    this.top = new VBox(topLine, demoLine, notSaved);
    getStyleClass().addAll(Looks.BENCH_GROUND, "window-frame");
    setTop(top);
    shows(notSaved, false);
    alone();
  }

  TopLine topLine() {
    return topLine;
  }

  void onLeaveDemo(Runnable action) {
    leaveDemo.setOnAction(pressed -> action.run());
  }

  /** Marks everything below as invented, or takes the mark away. */
  void demo(boolean invented) {
    shows(demoLine, invented);
  }

  /** Shows a screen under the top line. */
  void show(Screen screen, Place place) {
    shows(top, true);
    topLine.here(place);
    place(screen);
  }

  /** Shows what needs no top line: no logbook is open. */
  void showAlone(Screen screen) {
    alone();
    place(screen);
  }

  /**
   * What lies in a scroll pane belongs to the window, and can take the focus, once it is laid out.
   */
  private void place(Screen screen) {
    setCenter(screen.node());
    applyCss();
    layout();
  }

  /** Says what is saved, and why not. */
  void say(SaveSignModel.Sign sign) {
    topLine.say(sign);
    Optional<Message> why = sign.why();
    notSaved.setText(why.map(texts::say).orElse(""));
    shows(notSaved, why.isPresent());
  }

  private void alone() {
    shows(top, false);
  }

  private HBox demoLine() {
    Label head = new Label(texts.say("shell.demo"));
    head.getStyleClass().add(Looks.STRONG);
    head.setId("demo-mark");
    Region between = new Region();
    HBox.setHgrow(between, Priority.ALWAYS);
    HBox line = new HBox(head, between, leaveDemo);
    line.getStyleClass().add("demo-line");
    return line;
  }

  private static void shows(Node node, boolean visible) {
    node.setVisible(visible);
    node.setManaged(visible);
  }
}
