package sillet.acoustics.estimate;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.pitch.Cents;

/**
 * What is learned on the way of how far readings may be believed: weights of wild readings (Huber's
 * at first, which have one optimum, then ones that let go), wider expectations for frets and slots
 * that stand out, and how far the notes of this instrument stray.
 */
final class RobustLoss {
  /** Standard deviations up to which a reading is believed. */
  private static final double BELIEVED = 2.5;

  /** The same where a body's part is not taken off: resonances stand out. */
  private static final double BELIEVED_OF_BODIES = 4;

  /** Round from which on straying is learned: not from readings that are still to be let go. */
  private static final int LEARN_FROM = 2;

  /** Round from which on a wild reading is let go. */
  private static final int LET_GO_FROM = 3;

  /** Change, as a share, below which straying is known well enough. */
  private static final double SETTLED = 2e-3;

  private static final double LEAST_WEIGHT = 1e-6;

  /** Of straying by itself and of a body's, cents; measured guitars stay well within. */
  private static final double LEAST_CENTS = 0.02;

  private static final double MOST_CENTS = 1;

  private final InstrumentModel model;
  private final Noise noise;
  private final double[] expected;
  private boolean settled;

  RobustLoss(InstrumentModel model, Noise noise) {
    this.model = model;
    this.noise = noise;
    this.expected = model.unknowns().sds();
  }

  /** Puts what is learned into the expectations; the point stays where it is. */
  void expect(State state) {
    for (int i = 0; i < expected.length; i++) {
      Unknown unknown = model.unknowns().at(i);
      boolean slot = unknown.kind() == Unknown.Kind.SLOT;
      if (slot || unknown.kind() == Unknown.Kind.FRET) {
        double sd = slot ? slot(unknown) : expected[i];
        state.countIn(i, sd / Math.sqrt(weight(state.value(i) / sd, false)));
      }
    }
  }

  /** A slot's edge and the straying of the open string do the same to every note. */
  private double slot(Unknown unknown) {
    if (unknown.sd() != Expectations.SLOT) {
      return unknown.sd();
    }
    double scale = model.now().get(unknown.string()).occasion().lie().scale();
    return Math.hypot(unknown.sd(), noise.stray() * scale / Cents.PER_UNIT);
  }

  /** Learns; gives for each unknown how many times what it was its sd is now. */
  double[] learn(int round, Linearized rows, Posterior posterior, State state) {
    double[] factors = state.sds().clone();
    if (round > 0) {
      weigh(rows, state, round >= LET_GO_FROM);
      if (round >= LEARN_FROM && !settled) {
        learnStraying(rows, posterior, state);
      }
      expect(state);
    }
    for (int i = 0; i < factors.length; i++) {
      factors[i] = state.sds()[i] / factors[i];
    }
    return factors;
  }

  private void weigh(Linearized rows, State state, boolean letGo) {
    for (int row = 0; row < noise.readings().count(); row++) {
      double byCurve = weight(rows.residual(row) / noise.sd(row), letGo);
      noise.weight(row, Math.min(byCurve, withoutBody(rows, row, state, letGo)));
    }
  }

  private void learnStraying(Linearized rows, Posterior posterior, State state) {
    int body = model.body().places()[0];
    double strayBefore = noise.stray();
    double bodyBefore = state.sds()[body];
    noise.stray(stray(rows, posterior));
    learnBody(posterior, state);
    settled =
        Math.abs(noise.stray() / strayBefore - 1) < SETTLED
            && Math.abs(state.sds()[body] / bodyBefore - 1) < SETTLED;
  }

  /** A reading so far off that no body does it must not teach what the body does. */
  private double withoutBody(Linearized rows, int row, State state, boolean letGo) {
    double[] slopes = rows.slopes(row);
    double cents = 0;
    double squares = 0;
    for (int place : model.body().places()) {
      cents += slopes[place] * state.point()[place];
      squares += slopes[place] * slopes[place];
    }
    double sd = Math.hypot(noise.sd(row), Math.sqrt(squares));
    return weight((rows.residual(row) + cents) / sd * BELIEVED / BELIEVED_OF_BODIES, letGo);
  }

  private static double weight(double off, boolean letGo) {
    double share = BELIEVED / Math.max(BELIEVED, Math.abs(off));
    return Math.max(LEAST_WEIGHT, letGo ? share * share : share);
  }

  /**
   * How far notes stray, from what the fit says of each note's straying: D. J. C. MacKay's fixed
   * point, squares over the number of strayings that the readings determine (from memory).
   */
  private double stray(Linearized rows, Posterior posterior) {
    double squares = Expectations.STRAY_COUNT * Expectations.STRAY_CENTS * Expectations.STRAY_CENTS;
    double determined = Expectations.STRAY_COUNT;
    double variance = noise.stray() * noise.stray();
    List<int[]> notes = noise.readings().notes();
    List<double[]> slopes = new ArrayList<>(notes.size());
    for (int[] note : notes) {
      double[] pulled = new double[expected.length];
      double strays = strays(rows, note, pulled);
      slopes.add(pulled);
      squares += Math.min(strays * strays, BELIEVED * BELIEVED * variance);
    }
    double[] byUnknowns = posterior.variances(slopes);
    for (int i = 0; i < byUnknowns.length; i++) {
      double unsure = noise.strayLeft(notes.get(i)) + byUnknowns[i];
      determined += Math.max(0, 1 - unsure / variance);
    }
    return Math.min(MOST_CENTS, Math.max(LEAST_CENTS, Math.sqrt(squares / determined)));
  }

  /** What a note strays by, and how the unknowns pull at that. */
  private double strays(Linearized rows, int[] note, double[] pulled) {
    double left = noise.strayLeft(note);
    double strays = 0;
    for (int row : note) {
      double weighed = left * noise.precision(row);
      strays += weighed * rows.residual(row);
      double[] own = rows.slopes(row);
      for (int i = 0; i < pulled.length; i++) {
        pulled[i] += weighed * own[i];
      }
    }
    return strays;
  }

  /** How much the body yields, by the same fixed point. */
  private void learnBody(Posterior posterior, State state) {
    int[] places = model.body().places();
    double sd = state.sds()[places[0]];
    double squares = Expectations.BODY_COUNT * Expectations.BODY * Expectations.BODY;
    double determined = Expectations.BODY_COUNT;
    double[] one = new double[expected.length];
    for (int place : places) {
      double value = state.value(place);
      squares += Math.min(value * value, BELIEVED * BELIEVED * sd * sd);
      one[place] = 1;
      determined += Math.max(0, 1 - posterior.variance(one));
      one[place] = 0;
    }
    double learned = Math.min(MOST_CENTS, Math.max(LEAST_CENTS, Math.sqrt(squares / determined)));
    for (int place : places) {
      state.countIn(place, learned);
    }
  }
}
