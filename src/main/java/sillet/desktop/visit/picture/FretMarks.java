package sillet.desktop.visit.picture;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.readings.TrySpread;
import sillet.desktop.drawing.strings.FretMark;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.NoteReadings;
import sillet.logbook.moves.Verdict;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.StringPass;

/** The cents of one string at the frets that have cells. */
final class FretMarks {
  private final StringPass string;
  private final @Nullable StringPass before;

  FretMarks(StringPass string, @Nullable StringPass before) {
    this.string = string;
    this.before = before;
  }

  List<FretMark> at(List<Integer> frets) {
    List<FretMark> marks = new ArrayList<>();
    for (int fret : frets) {
      Double cents = cents(string, fret);
      Double past = before == null ? null : cents(before, fret);
      marks.add(new FretMark(fret, cents, expected(fret, cents), past, false));
    }
    return marks;
  }

  private static @Nullable Double cents(StringPass pass, int fret) {
    NoteReadings readings = pass.string().readings();
    Tries tries = fret == 0 ? readings.open() : readings.frets().get(fret);
    return tries == null ? null : TrySpread.of(tries.values(), readings.sdCents()).median();
  }

  /**
   * What stays after the move, as far as the travel lets it. At fret n a saddle acts 2^(n/12) - 1
   * times as much as at fret 12 (first order, physics of the string length); the drawing shows no
   * finer difference.
   */
  private @Nullable Double expected(int fret, @Nullable Double cents) {
    MoveAdvice advice = string.advice();
    MoveFigures figures = SaddlePlaces.figures(string);
    if (cents == null || advice == null || figures == null || string.madeMm() != null) {
      return null;
    }
    if (advice.verdict() == Verdict.LEAVE) {
      return null;
    }
    return cents + figures.centsPerMm() * possibleMm(figures) * (EqualTemperament.ratio(fret) - 1);
  }

  private double possibleMm(MoveFigures figures) {
    Double room = string.string().room().toward(figures.saddleMm());
    double size = Math.abs(figures.saddleMm());
    return Math.copySign(room == null ? size : Math.min(room, size), figures.saddleMm());
  }
}
