package sillet.acoustics.estimate;

import java.util.List;
import org.jspecify.annotations.Nullable;

/** Everything the estimator ends with. */
final class Solution {
  private final InstrumentModel model;
  private final Noise noise;
  private final double[] sds;
  private final double[] point;
  private final Linearized rows;
  private final Posterior posterior;
  private final FretPlaces frets;

  Solution(InstrumentModel model, Noise noise, State state, Linearized rows, Posterior posterior) {
    this.model = model;
    this.noise = noise;
    this.sds = state.sds();
    this.point = state.point();
    this.rows = rows;
    this.posterior = posterior;
    this.frets = model.frets(point, sds);
  }

  InstrumentModel model() {
    return model;
  }

  Noise noise() {
    return noise;
  }

  double[] sds() {
    return sds;
  }

  double[] point() {
    return point;
  }

  Linearized rows() {
    return rows;
  }

  Posterior posterior() {
    return posterior;
  }

  FretPlaces frets() {
    return frets;
  }

  /** Slope by a fret's place where it is an unknown; else the variance that it leaves. */
  double placeVariance(int fret, double slope, double[] slopes) {
    int place = model.unknowns().placeOfFret(fret);
    if (place >= 0) {
      slopes[place] += slope * sds[place];
      return 0;
    }
    double off = slope * Expectations.FRET_PLACE;
    return off * off;
  }

  /** A note of the curve with its own straying, as far as readings of it tell. */
  NoteEstimate withReadings(NoteEstimate curve, OccasionModel now, int fret) {
    int[] read = read(now, fret);
    if (read == null) {
      double stray = noise.stray() * noise.stray();
      return new NoteEstimate(curve.cents(), curve.slopes(), curve.ownVariance() + stray);
    }
    double left = noise.strayLeft(read);
    double cents = curve.cents();
    double[] slopes = curve.slopes().clone();
    for (int row : read) {
      double weighed = left * noise.precision(row);
      cents += weighed * rows.residual(row);
      double[] own = rows.slopes(row);
      for (int i = 0; i < slopes.length; i++) {
        slopes[i] -= weighed * own[i];
      }
    }
    return new NoteEstimate(cents, slopes, curve.ownVariance() + left);
  }

  private int @Nullable [] read(OccasionModel now, int fret) {
    List<OccasionModel> occasions = model.occasions();
    for (int[] note : noise.readings().notes()) {
      Readings.One first = noise.readings().at(note[0]);
      if (first.fret() == fret) {
        OccasionModel occasion = occasions.get(first.occasion());
        if (occasion.string() == now.string()
            && occasion.occasion().lie().openHz() == now.occasion().lie().openHz()) {
          return note;
        }
      }
    }
    return null;
  }
}
