package sillet.desktop.visit;

import java.time.Clock;
import java.util.Optional;
import java.util.function.Consumer;
import sillet.desktop.controls.SaveSign;
import sillet.desktop.visit.readings.Cell;
import sillet.desktop.visit.readings.CellFace;
import sillet.desktop.visit.readings.GridHand;
import sillet.desktop.visit.readings.GridWalk;
import sillet.desktop.visit.readings.Way;

/** Carries what is typed in the cells into the model, and each finished reading to the disk. */
final class VisitHand implements GridHand {
  private final VisitModel model;
  private final Saves saves;
  private final SaveSign sign;
  private final Clock clock;
  private final Consumer<Cell> focus;
  private final Consumer<Cell> entered;
  private final Runnable changed;

  VisitHand(VisitDesk desk, Consumer<Cell> focus, Consumer<Cell> entered, Runnable changed) {
    this.model = desk.model();
    this.saves = desk.saves();
    this.sign = desk.sign();
    this.clock = desk.clock();
    this.focus = focus;
    this.entered = entered;
    this.changed = changed;
  }

  @Override
  public CellFace face(Cell cell) {
    return model.grid().face(cell);
  }

  @Override
  public void entered(Cell cell) {
    entered.accept(cell);
    changed.run();
  }

  @Override
  public void typed(Cell cell, String text) {
    model.type(cell, text);
    drafted();
  }

  @Override
  public void stepped(Cell cell, int tenths) {
    model.step(cell, tenths);
    drafted();
  }

  private void drafted() {
    if (model.draft() && saves.failure() == null) {
      sign.draft(clock.instant());
    }
    changed.run();
  }

  @Override
  public void done(Cell cell) {
    model.commit(cell).ifPresent(saves::keep);
    changed.run();
  }

  @Override
  public boolean go(Cell from, Way way) {
    GridWalk walk = model.walk();
    Optional<Cell> to =
        switch (way) {
          case NEXT_STRING -> Optional.of(walk.nextString(from));
          case PREVIOUS_STRING -> Optional.of(walk.previousString(from));
          case NEXT_FRET -> walk.nextFret(from);
          case PREVIOUS_FRET -> walk.previousFret(from);
        };
    to.ifPresent(focus);
    return to.isPresent();
  }
}
