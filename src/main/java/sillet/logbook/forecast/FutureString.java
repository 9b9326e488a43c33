package sillet.logbook.forecast;

import java.util.List;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.estimate.Figure;
import sillet.acoustics.forecast.Feel;
import sillet.acoustics.forecast.StringLoad;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.FretCents;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.moves.Verdict;
import sillet.logbook.strings.FittedString;

/**
 * One string now and then.
 *
 * @param now as it is
 * @param then what will be on the instrument
 * @param outlook what is forecast of it; null if it could not be solved
 * @param because why it could not; empty where it could
 */
record FutureString(BenchString now, FittedString then, @Nullable Outlook outlook, String because) {
  private static final double MM_PER_M = 1e3;

  static FutureString notSolved(BenchString now, FittedString then, String because) {
    return new FutureString(now, then, null, because);
  }

  @Nullable Double tensionThenN() {
    return outlook == null ? null : Double.valueOf(outlook.forecast().then().tension());
  }

  /** Tensions and feel; the set's mean tension then is what a string is compared with. */
  @Nullable StringTension tension(double meanN) {
    if (outlook == null) {
      return null;
    }
    StringLoad before = outlook.forecast().now();
    StringLoad after = outlook.forecast().then();
    OptionalDouble share = after.shareOfBreaking();
    return new StringTension(
        before.tension(),
        after.tension(),
        after.tensionSd(),
        feel(Feel.of(after.tension(), before.tension())),
        feel(Feel.of(after.tension(), meanN)),
        share.isPresent() ? Double.valueOf(share.getAsDouble()) : null);
  }

  private static StringFeel feel(Feel feel) {
    return switch (feel) {
      case LIGHTER -> StringFeel.LIGHTER;
      case SAME -> StringFeel.SAME;
      case HEAVIER -> StringFeel.HEAVIER;
    };
  }

  @Nullable MoveFigures figures() {
    if (outlook == null) {
      return null;
    }
    var forecast = outlook.forecast();
    Figure move = forecast.saddleMove();
    Figure left = forecast.cents12IfLeft();
    double saddleMm = move.value() * MM_PER_M;
    double reachMm = MoveFigures.SDS_IN_INTERVAL * move.sd() * MM_PER_M;
    Double screw = now.room().screwMm();
    return new MoveFigures(
        saddleMm,
        saddleMm - reachMm,
        saddleMm + reachMm,
        screw == null ? null : Math.abs(saddleMm) / screw,
        now.room().nut() == NutMovable.NO ? null : forecast.nutMove().value() * MM_PER_M,
        left.value(),
        left.sd(),
        forecast.cents12After().value(),
        Outlook.rms(outlook.leftAlone()),
        Outlook.rms(outlook.moved()),
        -MoveAdvisor.CENTS_PER_SCALE / now.string().scaleMm(),
        (forecast.setbackThen().value() - move.value()) * MM_PER_M);
  }

  /** Whether the string would break before it is tuned. */
  boolean breaks() {
    return outlook != null && outlook.forecast().then().shareOfBreaking().orElse(0) >= 1;
  }

  /**
   * Leave it where zero lies in the interval, and where the string breaks; otherwise it must fit
   * into the travel.
   */
  Verdict verdict() {
    MoveFigures figures = figures();
    return figures == null || breaks()
        ? Verdict.LEAVE
        : MoveAdvisor.forecastVerdict(now.room(), figures);
  }

  List<FretCents> neck() {
    return outlook == null ? List.of() : outlook.neck();
  }
}
