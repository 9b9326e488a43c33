package sillet.desktop.visit.log;

import java.util.List;
import java.util.function.Consumer;
import java.util.function.Function;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.NoteKind;

/** Notes for the bench, advice given, what was offered and declined. */
public final class NotesPanel extends VBox {
  private final Lines lines = new Lines();
  private final TextField next = new TextField();
  private final HBox kinds = new HBox();

  /**
   * The panel.
   *
   * @param texts the words
   * @param chosen takes what the next note is for
   * @param write takes a note; answers whether it was taken
   */
  public NotesPanel(Texts texts, Consumer<NoteKind> chosen, Function<String, Boolean> write) {
    Label head = new Label(texts.say("visit.notes"));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    kinds.getStyleClass().add("choices");
    ToggleGroup group = new ToggleGroup();
    for (NoteKind kind : NoteKind.values()) {
      ToggleButton choice = new ToggleButton(texts.say(kind.key()));
      choice.setId("note-kind-" + kind.word());
      choice.getStyleClass().add(Looks.CHOICE);
      choice.setMinWidth(Region.USE_PREF_SIZE);
      choice.setToggleGroup(group);
      choice.setSelected(kind == NoteKind.NOTE);
      choice.setOnAction(
          pressed -> {
            choice.setSelected(true);
            chosen.accept(kind);
            next.requestFocus();
          });
      kinds.getChildren().add(choice);
    }
    next.setId("note-line");
    next.setPromptText(texts.say("visit.notes.prompt"));
    next.setAccessibleText(texts.say("visit.notes.prompt"));
    next.setOnAction(
        entered -> {
          if (write.apply(next.getText())) {
            next.clear();
          }
        });
    getStyleClass().addAll(Looks.PANEL, "notes");
    getChildren().addAll(head, lines, kinds, next);
  }

  /** Shows what was written. */
  public void show(List<WrittenLine> notes, boolean open) {
    lines.show(notes);
    next.setDisable(!open);
    kinds.setDisable(!open);
  }

  /** Puts the focus where the next note is typed. */
  public void focus() {
    next.requestFocus();
  }
}
