package sillet.acoustics.forecast;

import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.Fretting;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.solve.Outcome;

/**
 * What a change of action at the saddle does to intonation while everything else stays, so that
 * heights can be settled first.
 *
 * <p>The nut slot stays where it is: a saddle raised by twice the change at fret 12 turns the
 * string about the nut, which raises it over fret n by 2 (1 - 2^(-n/12)) times that change, at fret
 * 1 by 11 %. Plane geometry; the rule of twice is common in the trade.
 */
public final class ActionChange {
  private static final double AT_FIRST = 2 * (1 - 1 / EqualTemperament.ratio(1));

  private ActionChange() {}

  /**
   * The clearances once the saddle has been raised or lowered.
   *
   * @param now as they are
   * @param atTwelve wanted clearance over fret 12 in m, finite
   */
  public static Clearances to(Clearances now, double atTwelve) {
    double raised = atTwelve - now.atTwelve();
    return new Clearances(atTwelve, now.atFirst() + AT_FIRST * raised, now.relief());
  }

  /** Way in m by which the saddle goes up (below zero: down): twice the change at fret 12. */
  public static double saddleRaised(Clearances now, double atTwelve) {
    return 2 * (atTwelve - now.atTwelve());
  }

  /**
   * Cents by which a note changes against the retuned open string; positive = sharper.
   *
   * @param lie the string as it lies now
   * @param fretting how it is pressed
   * @param atTwelve wanted clearance over fret 12 in m, finite
   * @param fret 1 to 48
   */
  public static Outcome<Double> shift(StringLie lie, Fretting fretting, double atTwelve, int fret) {
    StringLie then = lie.withClearances(to(lie.clearances(), atTwelve));
    return FrettedPitch.of(lie, fretting)
        .flatMap(
            before ->
                FrettedPitch.of(then, fretting)
                    .map(after -> after.centsAgainstOpen(fret) - before.centsAgainstOpen(fret)));
  }
}
