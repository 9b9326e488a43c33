package sillet.desktop.sets;

import java.util.Optional;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.controls.ListKeys;
import sillet.desktop.theme.Looks;
import sillet.logbook.strings.StringSet;
import sillet.logbook.text.Texts;

/** The sets of the drawer. Space sets the chosen one beside the others. */
final class SetsList extends VBox {
  private final SetsModel model;
  private final ListView<StringSet> list;
  private boolean selecting;

  /**
   * The list.
   *
   * @param model of the drawer
   * @param texts the words
   * @param back leads back
   * @param startNew begins a new set
   */
  SetsList(SetsModel model, Texts texts, Runnable back, Runnable startNew) {
    this.model = model;
    this.list = new ListView<>(model.sets());
    Label head = new Label(texts.say("sets.sets"));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    list.setId("set-list");
    list.getStyleClass().add("set-list");
    list.setAccessibleText(texts.say("sets.sets"));
    list.setCellFactory(view -> new SetCell(texts, this::compared));
    ListKeys.teach(list, () -> {}, back);
    list.addEventFilter(
        KeyEvent.KEY_PRESSED,
        key -> {
          if (key.getCode() == KeyCode.SPACE) {
            model.compare();
            key.consume();
          }
        });
    list.getSelectionModel()
        .selectedItemProperty()
        .addListener(
            (property, before, now) -> {
              if (now != null && !selecting) {
                model.choose(Optional.of(now));
              }
            });
    VBox.setVgrow(list, Priority.ALWAYS);
    Label hint = new Label(texts.say("sets.compare-hint"));
    hint.getStyleClass().add(Looks.NOTE);
    hint.setWrapText(true);
    hint.setMinHeight(USE_PREF_SIZE);
    Button fresh = KeyHint.button(texts.say("sets.new"), texts.say("sets.new-key"), startNew);
    fresh.setId("new-set");
    fresh.setMaxWidth(Double.MAX_VALUE);
    getStyleClass().addAll(Looks.PANEL, "sets-panel");
    getChildren().addAll(head, list, hint, fresh);
  }

  private boolean compared(StringSet set) {
    return model.comparedProperty().get().map(one -> one.id().equals(set.id())).orElse(false);
  }

  void focus() {
    list.requestFocus();
  }

  /** Puts the selection on the set that is looked at. */
  void select() {
    selecting = true;
    model
        .chosenProperty()
        .get()
        .ifPresent(
            set -> {
              int place = model.sets().indexOf(set);
              list.getSelectionModel().select(place);
              list.getFocusModel().focus(place);
              list.scrollTo(Math.max(0, place - 2));
            });
    selecting = false;
  }

  void refresh() {
    list.refresh();
  }
}
