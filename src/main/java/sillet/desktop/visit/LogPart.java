package sillet.desktop.visit;

import java.util.List;
import java.util.Optional;
import javafx.scene.control.Button;
import sillet.desktop.visit.log.LogModel;
import sillet.desktop.visit.log.NotesPanel;
import sillet.desktop.visit.log.WorkPanel;
import sillet.logbook.actions.Action;
import sillet.logbook.visits.VisitRecord;

/** What was done and what is to be known: work and notes. */
final class LogPart {
  private final VisitDesk desk;
  private final LogModel log;
  private final WorkPanel work;
  private final NotesPanel notes;

  LogPart(VisitDesk desk, List<Button> buttons) {
    this.desk = desk;
    this.log = new LogModel(desk.model().record(), desk.texts(), desk.clock());
    this.work = new WorkPanel(desk.texts(), this::logWork, buttons);
    this.notes = new NotesPanel(desk.texts(), log::kind, this::writeNote);
  }

  WorkPanel work() {
    return work;
  }

  NotesPanel notes() {
    return notes;
  }

  void take(VisitRecord now) {
    log.take(now);
  }

  void show(boolean open) {
    work.show(log.work(), open);
    notes.show(log.notes(), open);
  }

  private boolean logWork(String typed) {
    return keep(log.logWork(typed, desk.desk().atBench().technician()));
  }

  private boolean writeNote(String typed) {
    return keep(log.writeNote(typed));
  }

  private boolean keep(Optional<? extends Action> action) {
    action.ifPresent(desk.saves()::keep);
    return action.isPresent();
  }
}
