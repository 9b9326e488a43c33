package sillet.logbook.visits;

import java.time.LocalDate;
import java.util.List;
import java.util.UUID;
import org.jspecify.annotations.Nullable;

/**
 * One stay of an instrument; its number is the ticket number.
 *
 * @param id identity
 * @param ticket number, unique in the logbook
 * @param instrumentId what came in
 * @param customerId whose it was then, null if nobody's
 * @param arrival how it came in
 * @param strings what is on it
 * @param travel room at the saddles as received, only where measured
 * @param handedOut day it left, null while it is on the bench
 */
public record Visit(
    UUID id,
    int ticket,
    UUID instrumentId,
    @Nullable UUID customerId,
    Arrival arrival,
    StringsOn strings,
    List<Travel> travel,
    @Nullable LocalDate handedOut) {

  /** Copies the list. */
  public Visit {
    travel = List.copyOf(travel);
  }
}
