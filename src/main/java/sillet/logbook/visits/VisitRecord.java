package sillet.logbook.visits;

import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.shop.Customer;

/**
 * Everything the logbook holds of one visit.
 *
 * @param visit the stay itself
 * @param instrument what came in
 * @param customer whose it was then, null if nobody's or forgotten
 * @param checks in the order they were made
 * @param readings in the order they were read, older ones of the same note included
 * @param moves in the order they were made
 * @param work in the order it was done
 * @param notes in the order they were written
 * @param aim what shall become true, and whether the nut can move
 */
public record VisitRecord(
    Visit visit,
    Instrument instrument,
    @Nullable Customer customer,
    List<BenchCheck> checks,
    List<Reading> readings,
    List<MadeMove> moves,
    List<WorkLine> work,
    List<VisitNote> notes,
    VisitAim aim) {

  /** Copies the lists. */
  public VisitRecord {
    checks = List.copyOf(checks);
    readings = List.copyOf(readings);
    moves = List.copyOf(moves);
    work = List.copyOf(work);
    notes = List.copyOf(notes);
  }

  /**
   * The same visit with other readings.
   *
   * @param others in the order they were read
   * @return the record with them
   */
  public VisitRecord withReadings(List<Reading> others) {
    return new VisitRecord(visit, instrument, customer, checks, others, moves, work, notes, aim);
  }
}
