package sillet.desktop.visit.picture;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.readings.TrySpread;
import sillet.desktop.drawing.strings.FretMark;
import sillet.logbook.moves.FretCents;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.NoteReadings;
import sillet.logbook.moves.Verdict;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.StringPass;

/** The cents of one string along the neck: as read, or as the model has them. */
final class FretMarks {
  private final StringPass string;
  private final @Nullable StringPass before;

  FretMarks(StringPass string, @Nullable StringPass before) {
    this.string = string;
    this.before = before;
  }

  /** Marks at frets; one that was not read is estimated where it has no cell of its own. */
  List<FretMark> at(List<Integer> frets, boolean wholeNeck) {
    List<FretMark> marks = new ArrayList<>();
    for (int fret : frets) {
      Double cents = cents(string, fret);
      Double past = before == null ? null : cents(before, fret);
      FretCents note = note(fret);
      if (cents == null && wholeNeck && note != null) {
        double now = note.nowCents();
        marks.add(FretMark.estimate(fret, now, expected(fret, note, now)));
      } else {
        Double after = cents == null ? null : expected(fret, note, cents);
        marks.add(new FretMark(fret, cents, after, past, false));
      }
    }
    return marks;
  }

  private static @Nullable Double cents(StringPass pass, int fret) {
    NoteReadings readings = pass.string().readings();
    Tries tries = fret == 0 ? readings.open() : readings.frets().get(fret);
    return tries == null ? null : TrySpread.of(tries.values(), readings.sdCents()).median();
  }

  private @Nullable FretCents note(int fret) {
    MoveAdvice advice = string.advice();
    return advice == null
        ? null
        : advice.neck().stream().filter(note -> note.fret() == fret).findFirst().orElse(null);
  }

  /**
   * What stays after the move, as far as the travel lets it. What was read keeps its own error: the
   * move changes it by what the model says. A move cut short does its share of that. Where the
   * model says nothing of a fret, the saddle acts 2^(n/12) - 1 times as much as at fret 12 (first
   * order, physics of the string length).
   */
  private @Nullable Double expected(int fret, @Nullable FretCents note, double cents) {
    MoveAdvice advice = string.advice();
    MoveFigures figures = SaddlePlaces.figures(string);
    if (advice == null || figures == null || string.madeMm() != null) {
      return null;
    }
    Double nut = figures.nutMm();
    if (advice.verdict() == Verdict.LEAVE && (nut == null || nut == 0)) {
      return null;
    }
    double whole =
        note == null
            ? figures.centsPerMm() * figures.saddleMm() * (EqualTemperament.ratio(fret) - 1)
            : note.afterCents() - note.nowCents();
    return cents + share(figures) * whole;
  }

  private double share(MoveFigures figures) {
    Double room = string.string().room().toward(figures.saddleMm());
    double size = Math.abs(figures.saddleMm());
    return room == null || room >= size ? 1 : room / size;
  }
}
