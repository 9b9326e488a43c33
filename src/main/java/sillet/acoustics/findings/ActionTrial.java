package sillet.acoustics.findings;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import sillet.acoustics.estimate.Figure;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.StringSituation;
import sillet.acoustics.findings.Evidence.Measure;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.pitch.EqualTemperament;

/**
 * Action beyond the shop's target, when the stretch it adds explains a good part of a string's
 * error as the saddle stands: a saddle would cure it too, but heights come first.
 */
final class ActionTrial {
  /** Above the target from which it counts, m; what a rule over fret 12 tells for sure. */
  private static final double HIGH = 2.5e-4;

  private static final double SIGNIFICANT = 2;

  /** Share of the squared error that it must explain; common practice, no source. */
  private static final double EXPLAINS = 0.3;

  /** Root mean square that it must take off, cents. */
  private static final double WORTH = 0.5;

  /** Raising the saddle raises the string over fret 1 by this share of the change at fret 12. */
  private static final double AT_FIRST = 2 * (1 - 1 / EqualTemperament.ratio(1));

  private ActionTrial() {}

  static Optional<NeckFinding> of(
      NeckEstimate estimate, NeckCurves curves, int string, double target) {
    Figure action = estimate.actionAtTwelve(string);
    double high = action.value() - target;
    if (high < HIGH || high < SIGNIFICANT * action.sd()) {
      return Optional.empty();
    }
    StringSituation now = curves.situation(string);
    Clearances typed = now.lie().clearances();
    Clearances low = new Clearances(target, typed.atFirst() - AT_FIRST * high, typed.relief());
    double[] adds = NeckCurves.less(now, now.withClearances(low));
    double[] cents = curves.cents(string);
    double before = Worth.rms(cents);
    double after = Worth.rms(Worth.without(cents, adds));
    double share = before == 0 ? 0 : 1 - after * after / (before * before);
    if (share < EXPLAINS || before - after < WORTH) {
      return Optional.empty();
    }
    return Optional.of(
        new NeckFinding(
            Kind.ACTION,
            OptionalInt.of(string),
            OptionalInt.empty(),
            false,
            high,
            action.sd(),
            before - after,
            List.of(
                new Evidence(Measure.ACTION, 12, action.value()),
                new Evidence(Measure.TARGET, 12, target),
                new Evidence(Measure.CENTS, 12, adds[12]),
                new Evidence(Measure.SHARE_EXPLAINED, 0, share))));
  }
}
