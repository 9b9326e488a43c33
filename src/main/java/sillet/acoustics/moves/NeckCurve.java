package sillet.acoustics.moves;

import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;

/** Cents at frets 1 to 12 against the open string: as read, by the model where unread. */
final class NeckCurve {
  static final int FRETS = 12;

  private final double[] cents;

  private NeckCurve(double[] cents) {
    this.cents = cents;
  }

  /** The curve of a task whose string stands as {@code now}. */
  static NeckCurve of(MoveTask task, FrettedPitch now) {
    double[] cents = new double[FRETS];
    for (int fret = 1; fret <= FRETS; fret++) {
      cents[fret - 1] = now.centsAgainstOpen(fret);
    }
    double reference = task.against() == Reference.HARMONIC ? now.harmonicAgainstTwiceOpen() : 0;
    for (FretReading reading : task.readings()) {
      if (reading.fret() <= FRETS) {
        cents[reading.fret() - 1] = reading.cents() + reference;
      }
    }
    return new NeckCurve(cents);
  }

  /** The same notes once the string stands elsewhere: each changes as the model says. */
  NeckCurve moved(FrettedPitch now, FrettedPitch then) {
    double[] changed = new double[FRETS];
    for (int fret = 1; fret <= FRETS; fret++) {
      changed[fret - 1] =
          cents[fret - 1] + then.centsAgainstOpen(fret) - now.centsAgainstOpen(fret);
    }
    return new NeckCurve(changed);
  }

  double at(int fret) {
    return cents[fret - 1];
  }

  /** Root mean square, cents. */
  double rms() {
    double squares = 0;
    for (double one : cents) {
      squares += one * one;
    }
    return Math.sqrt(squares / FRETS);
  }
}
