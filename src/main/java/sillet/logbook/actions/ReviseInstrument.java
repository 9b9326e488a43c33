package sillet.logbook.actions;

import sillet.logbook.instruments.Instrument;

/**
 * Changes what is known of an instrument.
 *
 * @param instrument the instrument, whole
 * @param version the version of the row that was read before
 */
public record ReviseInstrument(Instrument instrument, int version) implements Action {

  @Override
  public String name() {
    return "revise instrument";
  }
}
