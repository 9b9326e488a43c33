package sillet.logbook.learned;

import java.time.Instant;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * What has been learned of an instrument.
 *
 * @param strings string 1 first
 * @param nutMm place of the nut all strings share: positive toward the bridge of its nominal place
 * @param frets frets worth naming, in order
 * @param heldEnds how firmly the ends hold the strings: 0 free to turn, 1 usual, 2 clamped
 * @param passes how many rounds of reading it comes from
 * @param visits from how many visits these are
 * @param learnedFrom learning was reset at this moment; null if never
 */
public record LearnedInstrument(
    List<LearnedString> strings,
    LearnedFigure nutMm,
    List<LearnedFret> frets,
    LearnedFigure heldEnds,
    int passes,
    int visits,
    @Nullable Instant learnedFrom) {

  /** Copies the lists. */
  public LearnedInstrument {
    strings = List.copyOf(strings);
    frets = List.copyOf(frets);
  }
}
