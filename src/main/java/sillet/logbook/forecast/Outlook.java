package sillet.logbook.forecast;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.estimate.Figure;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.StringSituation;
import sillet.acoustics.forecast.ActionChange;
import sillet.acoustics.forecast.Capo;
import sillet.acoustics.forecast.StringChange;
import sillet.acoustics.forecast.StringForecast;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.solve.Solved;
import sillet.logbook.moves.FretCents;

/**
 * One string's future in the terms of the physics: what is forecast of it, and its notes then.
 *
 * @param estimate of the instrument as it is
 * @param place of the string in it
 * @param change of the string
 * @param forecast of the change
 */
record Outlook(NeckEstimate estimate, int place, StringChange change, StringForecast forecast) {
  private static final int OCTAVE = 12;
  private static final int LAST_FRET = 24;

  /** The string then, with saddle and nut where they stand now. */
  StringSituation leftAlone() {
    return change.situation(estimate.situation(place));
  }

  /** The string then, saddle and nut moved as forecast. */
  StringSituation moved() {
    StringSituation then = leftAlone();
    double saddle = then.lie().saddleSetback() + forecast.saddleMove().value();
    double nut = then.lie().nutSetback() - forecast.nutMove().value();
    return then.withLie(then.lie().withSaddleSetback(saddle).withNutSetback(nut));
  }

  /** Root mean square over frets 1 to 12, cents. */
  static double rms(StringSituation then) {
    double squares = 0;
    for (int fret = 1; fret <= OCTAVE; fret++) {
      squares += then.cents(fret) * then.cents(fret);
    }
    return Math.sqrt(squares / OCTAVE);
  }

  /**
   * Every note left alone and after the move. What is not known of a new string is taken to grow
   * along the neck as a saddle's place does.
   */
  List<FretCents> neck() {
    StringSituation before = leftAlone();
    StringSituation after = moved();
    double own = square(forecast.cents12IfLeft().sd()) - square(figure(OCTAVE).sd());
    List<FretCents> notes = new ArrayList<>();
    for (int fret = 1; fret <= LAST_FRET; fret++) {
      double rise = EqualTemperament.ratio(fret) - 1;
      double sd = Math.sqrt(square(figure(fret).sd()) + Math.max(0, own) * square(rise));
      notes.add(new FretCents(fret, before.cents(fret), sd, false, after.cents(fret)));
    }
    return notes;
  }

  private Figure figure(int fret) {
    return estimate.figure(place, now -> change.situation(now).cents(fret));
  }

  private static double square(double value) {
    return value * value;
  }

  /** What the change of action alone does to fret 12 of the string as it is now, cents; else 0. */
  double actionAlone() {
    StringSituation now = estimate.situation(place);
    return change.actionThen().isPresent()
            && ActionChange.shift(
                    now.lie(), now.fretting(), change.actionThen().getAsDouble(), OCTAVE)
                instanceof Solved<Double> solved
        ? solved.value()
        : 0;
  }

  /** The clearance over fret 12 now, m. */
  double actionNow() {
    return estimate.situation(place).lie().clearances().atTwelve();
  }

  /** Cents of the octave above a capo, against the capoed string, after the move; 0 if none. */
  double octaveAboveCapo(int fret) {
    StringSituation then = moved();
    return Capo.cents(then.lie(), then.fretting(), fret, OCTAVE) instanceof Solved<Double> solved
        ? solved.value()
        : 0;
  }
}
