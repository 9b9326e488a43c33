package sillet.acoustics.estimate;

import java.util.List;

/**
 * Everything known of one instrument.
 *
 * @param strings by place, string 1 first; at least one
 */
public record InstrumentEvidence(List<StringHistory> strings) {
  /**
   * Checks and copies.
   *
   * @throws IllegalArgumentException if there is no string
   */
  public InstrumentEvidence {
    strings = List.copyOf(strings);
    if (strings.isEmpty()) {
      throw new IllegalArgumentException("an instrument without a string");
    }
  }
}
