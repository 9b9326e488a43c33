package sillet.acoustics.estimate;

import org.jspecify.annotations.Nullable;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;

/**
 * Estimates all strings of an instrument together: the most likely point of all unknowns (maximum a
 * posteriori) by Gauss-Newton steps, with every expectation normal, a loss that lets go of wild
 * readings, and the straying of single notes learned on the way.
 *
 * <p>Shared by the strings: the nut's place, the frets' places, how ends hold and how the hand
 * presses, relief. A string's own: where its saddle stands, its stiffness, its heights, its slot.
 * The posterior is that of the model made linear at the most likely point.
 */
public final class NeckEstimator {
  private static final int MOST_ROUNDS = 14;
  private static final int FEWEST_ROUNDS = 5;
  private static final int MOST_HALVINGS = 8;

  /** In standard deviations before reading. */
  private static final double SETTLED = 1e-3;

  private final InstrumentModel model;
  private final Noise noise;
  private final RobustLoss loss;
  private final State state;

  private NeckEstimator(InstrumentModel model) {
    this.model = model;
    this.noise = new Noise(new Readings(model.occasions()), Expectations.STRAY_CENTS);
    this.loss = new RobustLoss(model, noise);
    this.state = new State(model.unknowns().sds());
  }

  /**
   * Estimates an instrument.
   *
   * @param evidence any number of readings or none
   * @return the estimate; not solved where a string cannot be tuned to its pitch
   */
  public static Outcome<NeckEstimate> estimate(InstrumentEvidence evidence) {
    Outcome<InstrumentModel> model = InstrumentModel.of(evidence);
    return model instanceof Solved<InstrumentModel> solved
        ? new NeckEstimator(solved.value()).solve()
        : Outcome.notSolved(((NotSolved<InstrumentModel>) model).because());
  }

  private Outcome<NeckEstimate> solve() {
    loss.expect(state);
    Linearized here = at(state.point());
    for (int round = 0; here != null; round++) {
      Posterior posterior = NormalEquations.of(here, noise, state.point()).solve();
      if (posterior == null) {
        break;
      }
      double change = largest(posterior.step());
      if (round == MOST_ROUNDS || (round >= FEWEST_ROUNDS && change < SETTLED)) {
        return NeckEstimate.of(new Solution(model, noise, state, here, posterior));
      }
      here = step(here, posterior.step());
      here.countIn(loss.learn(round, here, posterior, state));
    }
    return Outcome.notSolved("no lie of the strings was found for these readings");
  }

  private @Nullable Linearized at(double[] point) {
    return Linearized.at(model, noise.readings(), point, state.sds());
  }

  /** Goes as far along the step as the fit gets better. */
  private Linearized step(Linearized here, double[] step) {
    double cost = NormalEquations.cost(here, noise, state.point());
    double length = 1;
    for (int halving = 0; halving <= MOST_HALVINGS; halving++, length /= 2) {
      double[] next = state.along(step, length);
      Linearized there = at(next);
      if (there != null && NormalEquations.cost(there, noise, next) <= cost * (1 + 1e-9) + 1e-9) {
        state.moveTo(next);
        return there;
      }
    }
    return here;
  }

  private static double largest(double[] step) {
    double largest = 0;
    for (double one : step) {
      largest = Math.max(largest, Math.abs(one));
    }
    return largest;
  }
}
