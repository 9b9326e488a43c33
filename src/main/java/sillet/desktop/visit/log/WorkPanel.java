package sillet.desktop.visit.log;

import java.util.List;
import java.util.function.Function;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/** Work done, line by line, and what closes the visit. */
public final class WorkPanel extends VBox {
  private final Lines lines = new Lines();
  private final TextField next = new TextField();
  private final Label said = new Label();

  /**
   * The panel.
   *
   * @param texts the words
   * @param write takes a line; answers whether it was taken
   * @param closing what stands at the foot
   */
  public WorkPanel(Texts texts, Function<String, Boolean> write, List<Button> closing) {
    Label head = new Label(texts.say("visit.work"));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    next.setId("work-line");
    next.setPromptText(texts.say("visit.work.prompt"));
    next.setAccessibleText(texts.say("visit.work.prompt"));
    next.setOnAction(
        entered -> {
          if (write.apply(next.getText())) {
            next.clear();
          }
        });
    Region between = new Region();
    VBox.setVgrow(between, Priority.ALWAYS);
    FlowPane foot = new FlowPane();
    foot.getStyleClass().add("panel-foot");
    foot.getChildren().addAll(closing);
    getStyleClass().addAll(Looks.PANEL, "work");
    said.getStyleClass().add(Looks.NOTE);
    said.setId("work-said");
    said.setWrapText(true);
    said.setMinHeight(USE_PREF_SIZE);
    said.setManaged(false);
    getChildren().addAll(head, lines, next, between, said, foot);
  }

  /** Says what was done with the buttons at the foot. */
  public void say(String words) {
    said.setText(words);
    said.setManaged(!words.isEmpty());
  }

  /** Shows what was done. */
  public void show(List<WrittenLine> work, boolean open) {
    lines.show(work);
    next.setDisable(!open);
  }

  /** Puts the focus where the next line is typed. */
  public void focus() {
    next.requestFocus();
  }
}
