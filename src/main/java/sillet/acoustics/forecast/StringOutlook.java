package sillet.acoustics.forecast;

import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import sillet.acoustics.estimate.Figure;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.StringSituation;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.Setbacks;
import sillet.acoustics.wire.StringConstants;

/**
 * Figures of one string once it is changed: the value at the most likely situation; the variance
 * from what is not known of the instrument, of a string that nobody has read yet, of a height that
 * is still to be set, and of how each note strays from any model.
 */
final class StringOutlook {
  /** How near to the typed figure an action is set, m: what a rule over fret 12 can read. */
  private static final double ACTION_SET = 8e-5;

  private final NeckEstimate estimate;
  private final int string;
  private final NotesThen aim;
  private final BestPlace best;
  private final StringSituation now;
  private final OptionalDouble nutThen;

  /**
   * An outlook.
   *
   * @param best where the string then wants saddle and nut
   * @param now the most likely situation
   * @param nutThen where the nut is going to stand; empty = where the best place has it
   */
  StringOutlook(
      NeckEstimate estimate,
      int string,
      NotesThen aim,
      BestPlace best,
      StringSituation now,
      OptionalDouble nutThen) {
    this.estimate = estimate;
    this.string = string;
    this.aim = aim;
    this.best = best;
    this.now = now;
    this.nutThen = nutThen;
  }

  /** From where the saddle stands to where the string then wants it. */
  Figure saddleMove() {
    return figure(best.saddlePull(), sit -> setback(sit) - sit.lie().saddleSetback());
  }

  /** Where the string then wants its saddle. */
  Figure setbackThen() {
    return figure(best.saddlePull(), this::setback);
  }

  /** Toward the bridge. */
  Figure nutMove() {
    if (nutThen.isPresent()) {
      double there = nutThen.getAsDouble();
      return estimate.figure(string, sit -> sit.lie().nutSetback() - there);
    }
    if (!moves(best.nutPull())) {
      return new Figure(0, 0);
    }
    return figure(
        best.nutPull(),
        sit -> sit.lie().nutSetback() - best.place().nut() - best.nutShift(notes(sit)));
  }

  /** A note of the aim (by place in it) if the saddle stays, cents. */
  Figure centsIfLeft(NotesThen note) {
    double[] one = {1};
    ToDoubleFunction<StringSituation> cents = sit -> note.cents(note.then(sit))[0];
    StringSituation then = note.then(now);
    return widened(estimate.figure(string, cents), ownVariance(note, then, one));
  }

  /** What the note at fret 12 comes to once saddle and nut were moved, cents. */
  Figure centsAfter(NotesThen note, Figure saddleMove) {
    double[] at = note.cents(NotesThen.at(note.then(now), best.place()));
    Setbacks beside = new Setbacks(best.place().saddle() + 1e-5, best.place().nut());
    double slope = (note.cents(NotesThen.at(note.then(now), beside))[0] - at[0]) / 1e-5;
    return new Figure(at[0], Math.abs(slope) * saddleMove.sd());
  }

  private double setback(StringSituation sit) {
    return best.place().saddle() + best.saddleShift(notes(sit));
  }

  /** The notes then at the best place; a nut that stays stands where it stands. */
  private double[] notes(StringSituation sit) {
    StringSituation then = aim.then(sit);
    boolean nutMoves = nutThen.isPresent() || moves(best.nutPull());
    double nut = nutMoves ? best.place().nut() : sit.lie().nutSetback();
    return aim.cents(NotesThen.at(then, new Setbacks(best.place().saddle(), nut)));
  }

  private static boolean moves(double[] nutPull) {
    for (double one : nutPull) {
      if (one != 0) {
        return true;
      }
    }
    return false;
  }

  private Figure figure(double[] pull, ToDoubleFunction<StringSituation> f) {
    StringSituation then = NotesThen.at(aim.then(now), best.place());
    return widened(estimate.figure(string, f), ownVariance(aim, then, pull));
  }

  private static Figure widened(Figure figure, double variance) {
    return new Figure(figure.value(), Math.sqrt(figure.sd() * figure.sd() + variance));
  }

  /** Variance of the sum of pull times note by what the estimate does not know. */
  private double ownVariance(NotesThen notes, StringSituation then, double[] pull) {
    double[] likely = notes.cents(then);
    double variance = 0;
    for (StringConstants otherwise : notes.wire().otherwise(then.lie().constants())) {
      variance += square(pull, likely, notes.cents(then.withConstants(otherwise)));
    }
    if (notes.setsTheAction()) {
      Clearances set = then.lie().clearances();
      Clearances higher = ActionChange.to(set, set.atTwelve() + ACTION_SET);
      variance += square(pull, likely, notes.cents(then.withClearances(higher)));
    }
    for (double one : pull) {
      variance += one * one * estimate.strayCents() * estimate.strayCents();
    }
    return variance;
  }

  private static double square(double[] pull, double[] one, double[] other) {
    double sum = 0;
    for (int i = 0; i < pull.length; i++) {
      sum += pull[i] * (other[i] - one[i]);
    }
    return sum * sum;
  }
}
