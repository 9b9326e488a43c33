package sillet.desktop.visit.made;

import java.time.Instant;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Eighths;
import sillet.logbook.moves.Direction;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.Verdict;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.Figures;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.StringPass;

/** What was done to one saddle, as typed; blank where it was left alone. */
public final class MadeRow {
  private static final int MM_DECIMALS = 2;
  private static final double STEP_MM = 0.05;
  private static final double STEP_TURNS = 0.125;

  private final StringPass asked;
  private final LengthUnit unit;
  private String text;
  private boolean away;

  MadeRow(StringPass asked, LengthUnit unit) {
    this.asked = asked;
    this.unit = unit;
    MoveFigures figures = proposed(asked.advice());
    this.away = figures == null || figures.direction() != Direction.TOWARD;
    this.text = figures == null ? "" : start(figures);
  }

  private static @Nullable MoveFigures proposed(@Nullable MoveAdvice advice) {
    return advice == null || advice.verdict() == Verdict.LEAVE ? null : advice.figures();
  }

  /** The proposal, cut to the travel that is left: more cannot have been done. */
  private String start(MoveFigures figures) {
    double mm = Math.abs(figures.saddleMm());
    Double room = asked.string().room().toward(figures.saddleMm());
    double possible = room == null ? mm : Math.min(mm, room);
    return written(possible);
  }

  private String written(double mm) {
    Double screw = screwMm();
    if (screw == null) {
      return Figures.fixed(mm / unit.mm(), unit == LengthUnit.INCH ? MM_DECIMALS + 2 : MM_DECIMALS);
    }
    Eighths turns = Eighths.of(mm / screw);
    return turns.none() ? "" : turns.written();
  }

  public int string() {
    return asked.string().string().number();
  }

  /** The string as it was reckoned. */
  public StringPass asked() {
    return asked;
  }

  /** Way per turn of this saddle's screw; null where there is none or it is not known. */
  public @Nullable Double screwMm() {
    return asked.string().room().screwMm();
  }

  public String text() {
    return text;
  }

  /** Takes what now stands in the field. */
  public void type(String typed) {
    text = typed;
  }

  /** True if it went away from the neck. */
  public boolean away() {
    return away;
  }

  /** Turns the direction around. */
  public void turnAround() {
    away = !away;
  }

  /**
   * Makes the move larger or smaller by an eighth of a turn, or by 0.05 mm; never below nothing.
   */
  public void step(int steps) {
    if (problem() != null) {
      return;
    }
    Double screw = screwMm();
    double now = text.isBlank() ? 0 : MoveText.parse(text, screw, unit).mm();
    double step = screw == null ? STEP_MM : STEP_TURNS * screw;
    text = written(Math.max(0, now + steps * step));
  }

  /** Why the text cannot be read; null if it can. */
  public @Nullable Message problem() {
    if (text.isBlank()) {
      return null;
    }
    try {
      MoveText.parse(text, screwMm(), unit);
      return null;
    } catch (Rejection unreadable) {
      return unreadable.reason();
    }
  }

  /** The move to be recorded; null where the saddle was left alone or the text cannot be read. */
  @Nullable MadeMove move(Instant at) {
    if (text.isBlank() || problem() != null) {
      return null;
    }
    MoveText made = MoveText.parse(text, screwMm(), unit);
    if (made.mm() == 0) {
      return null;
    }
    return new MadeMove(
        asked.pass(), string(), away ? made.mm() : -made.mm(), made.turns(), null, at);
  }
}
