package sillet.desktop.visit;

import java.util.Optional;
import javafx.scene.control.Button;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.theme.Looks;
import sillet.desktop.visit.made.MadeRows;
import sillet.desktop.visit.made.MovesMadeModel;
import sillet.logbook.actions.RecordMoves;
import sillet.logbook.text.Texts;
import sillet.logbook.units.LengthUnit;

/** Confirming what was really done to the saddles, in the place of the words that asked for it. */
final class MadeMode {
  private final VisitDesk desk;
  private final ReadingsPanel panel;
  private final Runnable ended;
  private final Button begin;
  private final Button record;
  private final Button cancel;
  private @Nullable MovesMadeModel model;

  MadeMode(VisitDesk desk, ReadingsPanel panel, Runnable ended) {
    this.desk = desk;
    this.panel = panel;
    this.ended = ended;
    Texts texts = desk.texts();
    begin = KeyHint.button(texts.say("visit.made"), texts.say("visit.key.made"), this::begin);
    begin.setId("moves-made");
    begin.getStyleClass().add(Looks.PRIMARY);
    record = KeyHint.button(texts.say("visit.made.record"), texts.say("visit.key.made"), this::go);
    record.setId("record-moves");
    record.getStyleClass().add(Looks.PRIMARY);
    cancel =
        KeyHint.button(texts.say("visit.made.cancel"), texts.say("visit.key.cancel"), this::end);
    cancel.setId("cancel-moves");
    showButtons();
  }

  boolean on() {
    return model != null;
  }

  /** Begins, or records what stands there. */
  void key() {
    if (on()) {
      go();
    } else {
      begin();
    }
  }

  private void begin() {
    VisitModel visit = desk.model();
    if (!visit.open() || visit.pass() != visit.lastPass() || desk.saves().movesPending()) {
      return;
    }
    LengthUnit unit = desk.desk().atBench().shop().lengthUnit();
    model = new MovesMadeModel(visit.strings(), unit);
    MadeRows rows = new MadeRows(model, desk.texts(), this::showButtons, record::requestFocus);
    panel.showMade(rows);
    showButtons();
    ended.run();
    rows.focus();
  }

  private void go() {
    if (model == null) {
      return;
    }
    Optional<RecordMoves> action = model.action(desk.model().visitId(), desk.clock().instant());
    if (action.isPresent()) {
      desk.saves().keep(action.get());
      end();
    }
  }

  /** Leaves it without recording anything. */
  void end() {
    if (model == null) {
      return;
    }
    model = null;
    panel.showMade(null);
    showButtons();
    ended.run();
  }

  /** Shows the buttons that go with what is being done. */
  void showButtons() {
    VisitModel visit = desk.model();
    if (model == null) {
      panel.actions(begin);
      boolean closed = !visit.open() || visit.pass() != visit.lastPass();
      begin.setDisable(closed || desk.saves().movesPending() || nothingRead());
    } else {
      panel.actions(cancel, record);
      record.setDisable(!model.complete());
    }
  }

  private boolean nothingRead() {
    return desk.model().strings().stream().allMatch(string -> string.advice() == null);
  }
}
