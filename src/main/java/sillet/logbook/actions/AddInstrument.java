package sillet.logbook.actions;

import sillet.logbook.instruments.Instrument;

/**
 * Enters an instrument.
 *
 * @param instrument the instrument
 */
public record AddInstrument(Instrument instrument) implements Action {

  @Override
  public String name() {
    return "add instrument";
  }
}
