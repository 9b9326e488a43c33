package sillet.desktop.sets;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.UUID;
import javafx.scene.Node;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.Narrow;
import sillet.desktop.controls.Screen;
import sillet.logbook.actions.KeepStringSet;
import sillet.logbook.strings.StringSet;
import sillet.logbook.text.Message;

/** The drawer of string sets: the list, and the chosen set string by string. */
public final class SetsScreen implements Screen {
  private static final int USUAL_STRINGS = 6;

  private final Desk desk;
  private final SetsModel model;
  private final SetsList list;
  private final SetSheet sheet;
  private final HBox body = new HBox();
  private final VBox page = new VBox();
  private @Nullable SetEditorModel editing;
  private boolean saving;

  /** The drawer of the logbook on a desk. */
  public SetsScreen(Desk desk) {
    this.desk = desk;
    this.model =
        new SetsModel(desk.atBench().shop().lengthUnit(), desk.atBench().shop().referenceHz());
    this.list = new SetsList(model, desk.texts(), desk.goTo()::back, this::startNew);
    this.sheet = new SetSheet(model, desk, this::startCopy, this::startChange, this::startLadder);
    HBox.setHgrow(sheet, Priority.ALWAYS);
    VBox.setVgrow(body, Priority.ALWAYS);
    Narrow narrow = new Narrow(page);
    body.getStyleClass().add("panel-row");
    body.getChildren().addAll(list, sheet);
    page.getChildren().addAll(body, narrow.measure());
    page.getStyleClass().add("sets-page");
    page.addEventFilter(KeyEvent.KEY_PRESSED, this::escape);
    model.chosenProperty().addListener((property, before, now) -> say());
    model.comparedProperty().addListener((property, before, now) -> say());
    model.troubleProperty().addListener((property, before, now) -> say());
    say();
  }

  @Override
  public Node node() {
    return page;
  }

  @Override
  public void shown() {
    if (editing == null) {
      list.focus();
    } else {
      sheet.focusEditor();
    }
    fetch(Optional.empty());
  }

  @Override
  public void left() {
    // what is typed of a set stays typed: the screen is made once
  }

  @Override
  public Map<KeyCombination, Runnable> keys() {
    Map<KeyCombination, Runnable> keys = new HashMap<>();
    keys.put(new KeyCodeCombination(KeyCode.N, KeyCombination.SHORTCUT_DOWN), this::startNew);
    keys.put(new KeyCodeCombination(KeyCode.D, KeyCombination.SHORTCUT_DOWN), this::startCopy);
    keys.put(new KeyCodeCombination(KeyCode.E, KeyCombination.SHORTCUT_DOWN), this::startChange);
    keys.put(new KeyCodeCombination(KeyCode.ENTER, KeyCombination.SHORTCUT_DOWN), this::keep);
    keys.put(new KeyCodeCombination(KeyCode.F7), this::nextView);
    return keys;
  }

  private void fetch(Optional<StringSet> wanted) {
    desk.background()
        .run(
            () -> desk.logbook().stringSets().all(),
            sets -> {
              model.show(sets);
              wanted.ifPresent(set -> model.choose(Optional.of(set)));
              list.select();
              say();
              if (editing == null && wanted.isPresent()) {
                list.focus();
              }
            },
            why -> model.troubleProperty().set(Optional.of(why)));
  }

  private void say() {
    list.refresh();
    sheet.show();
  }

  private void nextView() {
    if (!sheet.nextView()) {
      list.focus();
    }
  }

  private void startNew() {
    int strings =
        model.chosenProperty().get().map(set -> set.strings().size()).orElse(USUAL_STRINGS);
    start(SetEditorModel.fresh(UUID.randomUUID(), strings));
  }

  private void startCopy() {
    model
        .chosenProperty()
        .get()
        .ifPresent(
            set -> {
              String name = desk.texts().say("sets.copy-of", set.name());
              start(SetEditorModel.copy(UUID.randomUUID(), name, set.strings()));
            });
  }

  private void startChange() {
    model.chosenProperty().get().ifPresent(set -> start(SetEditorModel.change(set)));
  }

  /** The nearest usual gauges of the ladder as a set of their own. */
  private void startLadder() {
    model
        .chosenProperty()
        .get()
        .ifPresent(
            set -> {
              String name = desk.texts().say("sets.ladder-of", set.name());
              start(SetEditorModel.copy(UUID.randomUUID(), name, sheet.ladderMakes()));
            });
  }

  private void start(SetEditorModel editor) {
    if (editing != null) {
      sheet.focusEditor();
      return;
    }
    editing = editor;
    sheet.edit(editor, this::keep, this::leaveEditor);
    list.setDisable(true);
  }

  private void keep() {
    SetEditorModel editor = editing;
    if (editor == null || saving) {
      return;
    }
    Optional<StringSet> set = editor.finish();
    if (set.isEmpty()) {
      sheet.focusFirstProblem();
      return;
    }
    saving = true;
    String technician = desk.atBench().technician();
    desk.background()
        .run(
            () -> desk.logbook().perform(new KeepStringSet(set.get()), technician),
            saved -> {
              saving = false;
              desk.sign().saved(desk.atBench().clock().instant());
              endEditor();
              fetch(set);
            },
            this::notKept);
  }

  private void notKept(Message why) {
    saving = false;
    desk.sign().notSaved(why);
  }

  private void leaveEditor() {
    endEditor();
    list.focus();
  }

  private void endEditor() {
    editing = null;
    list.setDisable(false);
    sheet.endEdit();
  }

  private void escape(KeyEvent key) {
    if (key.getCode() == KeyCode.ESCAPE && editing != null) {
      leaveEditor();
      key.consume();
    }
  }
}
