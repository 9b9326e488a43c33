package sillet.acoustics.estimate;

import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.Fretting;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.solve.Solved;
import sillet.acoustics.wire.StringConstants;

/**
 * One string as it may lie: what a figure is reckoned from.
 *
 * @param lie the string on its neck
 * @param fretting how it is pressed
 * @param fretPlaces where the frets lie
 */
public record StringSituation(StringLie lie, Fretting fretting, FretPlaces fretPlaces) {

  /** Cents at a fret against the open string; NaN where no tension brings the string to pitch. */
  public double cents(int fret) {
    return FrettedPitch.of(lie, fretting) instanceof Solved<FrettedPitch> solved
        ? solved.value().centsAgainstOpen(fret) + placeCents(fret)
        : Double.NaN;
  }

  /** Cents against the harmonic over fret 12; NaN where no tension brings the string to pitch. */
  public double centsAgainstHarmonic(int fret) {
    return FrettedPitch.of(lie, fretting) instanceof Solved<FrettedPitch> solved
        ? solved.value().centsAgainstHarmonic(fret) + placeCents(fret)
        : Double.NaN;
  }

  /** What the fret's own place adds, cents: a fret toward the bridge shortens the note. */
  public double placeCents(int fret) {
    double length = lie.scale() / EqualTemperament.ratio(fret) + lie.saddleSetback();
    return -Cents.ofRatio(1 - fretPlaces.at(fret) / length);
  }

  /** What a metre toward the bridge adds at a fret that lies true, cents. */
  double centsPerMetreOfPlace(int fret) {
    return Cents.ofSmallShare(
        1 / (lie.scale() / EqualTemperament.ratio(fret) + lie.saddleSetback()));
  }

  /** The same place with the string lying otherwise. */
  public StringSituation withLie(StringLie other) {
    return new StringSituation(other, fretting, fretPlaces);
  }

  /** The saddle elsewhere. */
  public StringSituation withSaddleSetback(double setback) {
    return withLie(lie.withSaddleSetback(setback));
  }

  /** Another string in this place. */
  public StringSituation withConstants(StringConstants constants) {
    return withLie(lie.withConstants(constants));
  }

  /** Other heights. */
  public StringSituation withClearances(Clearances clearances) {
    return withLie(lie.withClearances(clearances));
  }

  /** Tuned to another pitch. */
  public StringSituation withOpenHz(double hz) {
    return withLie(
        new StringLie(
            lie.constants(),
            hz,
            lie.scale(),
            lie.saddleSetback(),
            lie.nutSetback(),
            lie.clearances(),
            lie.ends()));
  }
}
