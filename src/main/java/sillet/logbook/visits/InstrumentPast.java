package sillet.logbook.visits;

import java.time.Instant;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * What the logbook knows of an instrument from before a visit.
 *
 * @param earlier its earlier visits, the oldest first
 * @param learnedFrom readings before this moment teach nothing, because learning was reset; null if
 *     it never was
 */
public record InstrumentPast(List<VisitRecord> earlier, @Nullable Instant learnedFrom) {
  /** An instrument that comes for the first time. */
  public static final InstrumentPast NONE = new InstrumentPast(List.of(), null);

  /** Copies the list. */
  public InstrumentPast {
    earlier = List.copyOf(earlier);
  }
}
