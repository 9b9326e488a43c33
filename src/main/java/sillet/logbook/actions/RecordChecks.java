package sillet.logbook.actions;

import java.util.List;
import java.util.UUID;
import sillet.logbook.visits.BenchCheck;

/**
 * Writes down checks; a newer check of the same thing and moment replaces the older one.
 *
 * @param visitId the stay
 * @param checks at least one
 */
public record RecordChecks(UUID visitId, List<BenchCheck> checks) implements Action {

  /** Copies the list. */
  public RecordChecks {
    checks = List.copyOf(checks);
  }

  @Override
  public String name() {
    return "record checks";
  }
}
