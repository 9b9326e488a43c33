package sillet.acoustics.forecast;

import java.util.OptionalDouble;
import java.util.SortedMap;
import sillet.acoustics.estimate.Figure;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.StringSituation;
import sillet.acoustics.moves.Aim;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.Setbacks;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.solve.Outcome;

/** One string between now and then. */
final class StringPlan {
  private final NeckEstimate estimate;
  private final int string;
  private final StringChange change;
  private final StringSituation now;
  private final NotesThen aim;

  StringPlan(NeckEstimate estimate, int string, StringChange change, Aim aim) {
    this.estimate = estimate;
    this.string = string;
    this.change = change;
    this.now = estimate.situation(string);
    this.aim = notes(aim.weights());
  }

  /** Notes then; a single one is meant against the change's reference, several against the open. */
  NotesThen notes(SortedMap<Integer, Double> weights) {
    Reference against = weights.size() == 1 ? change.against() : Reference.OPEN;
    return new NotesThen(change, weights, against);
  }

  /** Where the string then wants its saddle, and its nut if that moves or is put there. */
  Outcome<BestPlace> best(boolean nutMoves, OptionalDouble nutThere) {
    StringSituation then = aim.then(now);
    double nut = nutThere.orElse(now.lie().nutSetback());
    Setbacks start = new Setbacks(now.lie().saddleSetback(), nut);
    return BestPlace.of(aim, NotesThen.at(then, start), nutMoves);
  }

  StringOutlook outlook(BestPlace best, OptionalDouble nutThere) {
    return new StringOutlook(estimate, string, aim, best, now, nutThere);
  }

  Outcome<StringLoad> loadNow() {
    StringLie lie = now.lie();
    return StringLoad.of(change.now(), lie.saddleSetback() + lie.nutSetback());
  }

  Outcome<StringLoad> loadThen(BestPlace best) {
    return StringLoad.of(change.then(), best.place().saddle() + best.place().nut());
  }

  Figure cents12Now() {
    Figure open = estimate.cents(string, 12);
    if (change.against() == Reference.OPEN) {
      return open;
    }
    double harmonic =
        FrettedPitch.of(now.lie(), now.fretting()).orElseThrow().harmonicAgainstTwiceOpen();
    return new Figure(open.value() - harmonic, open.sd());
  }
}
