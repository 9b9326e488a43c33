package sillet.desktop.intake;

import sillet.acoustics.wire.Construction;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.SaddleKind;

/**
 * What an instrument of a kind usually is: a start to type over (common practice, no source).
 *
 * @param kind which kind
 * @param strings how many
 * @param frets how many
 * @param saddle how the strings end at the bridge
 * @param plain construction of a thin string
 * @param wound construction of a thick one
 * @param woundFromIn gauge from which a string is wound, inches
 */
public record UsualKind(
    InstrumentKind kind,
    int strings,
    int frets,
    SaddleKind saddle,
    Construction plain,
    Construction wound,
    double woundFromIn) {

  /** What a string of a gauge usually is on this kind. */
  public Construction construction(double gaugeIn) {
    return gaugeIn < woundFromIn ? plain : wound;
  }
}
