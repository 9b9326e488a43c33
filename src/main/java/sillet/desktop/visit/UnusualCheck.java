package sillet.desktop.visit;

import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import sillet.logbook.plausible.Plausibility;
import sillet.logbook.text.Message;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.CheckKind;

/** Asks about a check that is out of the ordinary. */
final class UnusualCheck implements BiFunction<CheckKind, Length, List<Message>> {
  private final Plausibility plausibility;

  UnusualCheck(LengthUnit unit) {
    this.plausibility = new Plausibility(unit);
  }

  @Override
  public List<Message> apply(CheckKind kind, Length length) {
    double mm = length.mm();
    Optional<Message> asked =
        switch (kind) {
          case RELIEF -> plausibility.reliefMm(mm);
          case ACTION -> plausibility.actionMm(mm);
          case FIRST_FRET_CLEARANCE -> plausibility.clearanceMm(mm);
          case PICKUP_HEIGHT, SADDLE_HEIGHT -> Optional.empty();
        };
    return asked.stream().toList();
  }
}
