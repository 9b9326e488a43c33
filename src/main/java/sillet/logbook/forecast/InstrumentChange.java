package sillet.logbook.forecast;

import java.util.List;

/**
 * What an instrument will be.
 *
 * @param strings the strings that change; one that is not named stays as it is
 * @param capoFret fret of a capo that will be played with, 1 to 12; 0 for none
 */
public record InstrumentChange(List<StringChange> strings, int capoFret) {

  /** Copies the list. */
  public InstrumentChange {
    strings = List.copyOf(strings);
  }

  /**
   * What becomes of one string.
   *
   * @param number of the string
   * @return its change, or none
   */
  public StringChange of(int number) {
    return strings.stream()
        .filter(one -> one.string() == number)
        .findFirst()
        .orElseGet(() -> StringChange.none(number));
  }
}
