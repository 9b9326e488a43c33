package sillet.acoustics.estimate;

import java.util.List;
import org.hipparchus.linear.CholeskyDecomposition;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.EqualTemperament;

/**
 * What the body does to notes: a bridge that yields at a note's frequency makes the string longer
 * there by tension times yield, so that notes of the same pitch stray alike on every string.
 *
 * <p>To first order a note whose vibrating length is L strays by -C (mu L) / (pi^2 M) cents, M the
 * mass that would yield as much at this frequency (N. H. Fletcher, T. D. Rossing, The Physics of
 * Musical Instruments, on end supports, from memory). It is counted as -(mu L / m) x, m the mean
 * mass of the open strings and x cents, which are not known but alike at frequencies that are near,
 * as a resonance makes them: the likeness falls with the distance d in semitones as 1 / (1 + (d /
 * w)^2), w the width of a resonance.
 */
final class Body {
  private static final int OCTAVE = 12;
  private static final double JITTER = 1e-6;

  private final int lowest;
  private final int[] places;
  private final double[][] lower;
  private final double meanMass;

  private Body(int lowest, int[] places, double[][] lower, double meanMass) {
    this.lowest = lowest;
    this.places = places;
    this.lower = lower;
    this.meanMass = meanMass;
  }

  /** Over all pitches that strings have, up to fret 12 or the highest fret read. */
  static Body of(Unknowns unknowns, List<OccasionModel> occasions) {
    int lowest = Integer.MAX_VALUE;
    int highest = Integer.MIN_VALUE;
    for (OccasionModel one : occasions) {
      int open = number(one.occasion().lie().openHz());
      lowest = Math.min(lowest, open);
      highest = Math.max(highest, open + OCTAVE);
      for (int fret : one.frets()) {
        highest = Math.max(highest, open + fret);
      }
    }
    int[] places = new int[highest - lowest + 1];
    RealMatrix likeness = MatrixUtils.createRealMatrix(places.length, places.length);
    for (int i = 0; i < places.length; i++) {
      places[i] = unknowns.place(Unknown.Kind.BODY, Unknown.SHARED, i, Expectations.BODY);
      for (int j = 0; j < places.length; j++) {
        double off = (i - j) / Expectations.BODY_WIDTH;
        likeness.setEntry(i, j, 1 / (1 + off * off));
      }
      likeness.addToEntry(i, i, JITTER);
    }
    return new Body(
        lowest, places, new CholeskyDecomposition(likeness).getL().getData(), meanMass(occasions));
  }

  private static int number(double hz) {
    return (int) Math.rint(Cents.between(440, hz) / 100);
  }

  /** Places of the unknowns that the body takes. */
  int[] places() {
    return places;
  }

  /** Adds to the slopes what the body does to a fretted note against the open string. */
  void chain(StringLie lie, int fret, double[] sds, double[] slopes) {
    int open = number(lie.openHz());
    double length = lie.scale() / EqualTemperament.ratio(fret);
    add(open + fret, shortens(lie, length), sds, slopes);
    add(open, -shortens(lie, lie.scale()), sds, slopes);
  }

  private double shortens(StringLie lie, double length) {
    return -lie.constants().unitMass() * length / meanMass;
  }

  private static double meanMass(List<OccasionModel> occasions) {
    double sum = 0;
    for (OccasionModel one : occasions) {
      StringLie lie = one.occasion().lie();
      sum += lie.constants().unitMass() * lie.scale();
    }
    return sum / occasions.size();
  }

  private void add(int number, double factor, double[] sds, double[] slopes) {
    int row = Math.max(0, Math.min(places.length - 1, number - lowest));
    for (int i = 0; i <= row; i++) {
      slopes[places[i]] += factor * lower[row][i] * sds[places[i]];
    }
  }
}
