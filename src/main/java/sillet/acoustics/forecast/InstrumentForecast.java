package sillet.acoustics.forecast;

import java.util.List;

/**
 * What a change makes of an instrument.
 *
 * @param strings in the order of the changes
 * @param pull on the neck
 */
public record InstrumentForecast(List<StringForecast> strings, NeckPull pull) {
  /** Copies. */
  public InstrumentForecast {
    strings = List.copyOf(strings);
  }
}
