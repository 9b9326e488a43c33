package sillet.acoustics.tables;

import sillet.acoustics.pitch.EqualTemperament;

/** Pitches by MIDI number (E2 40, G3 55, E4 64, A4 69), A4 = 440 Hz. */
public final class Notes {

  private static final int MIDI_A4 = 69;

  private Notes() {}

  public static double hz(int midi) {
    return EqualTemperament.frequency(midi - MIDI_A4, EqualTemperament.STANDARD_A4);
  }
}
