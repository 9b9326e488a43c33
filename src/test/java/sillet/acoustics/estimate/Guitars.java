package sillet.acoustics.estimate;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.FrettedPitch;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.StringConstants;

/** A guitar of three strings whose readings are the model's: strings of physics table 2.8 [D]. */
final class Guitars {
  static final int[] FRETS = {1, 2, 3, 5, 7, 9, 12, 15, 17};
  static final double SD = 0.4;

  private static final Clearances HEIGHTS = new Clearances(1.75e-3, 0.45e-3, 0.15e-3);

  private Guitars() {}

  static List<StringLie> strings() {
    return List.of(
        lie(new StringConstants(3.977654e-4, 10134.15, 4.086342e-5, 0.03), 329.6276),
        lie(new StringConstants(1.149542e-3, 29287.69, 3.412954e-4, 0.03), 195.9977),
        lie(new StringConstants(7.635858e-3, 32834.64, 4.289679e-4, 0.24), 82.4069));
  }

  static StringLie lie(StringConstants constants, double hz) {
    return StringLie.nominal(constants, hz, 0.648, HEIGHTS);
  }

  /** What the model reads with the saddle there, and how far every note is off besides. */
  static List<FretReading> readings(StringLie lie, double setback, double off) {
    FrettedPitch pitch = FrettedPitch.of(lie.withSaddleSetback(setback)).orElseThrow();
    List<FretReading> readings = new ArrayList<>();
    for (int fret : FRETS) {
      readings.add(new FretReading(fret, pitch.centsAgainstOpen(fret) + off, SD));
    }
    return readings;
  }

  static List<FretReading> changed(List<FretReading> readings, int fret, double by) {
    return readings.stream()
        .map(one -> one.fret() == fret ? new FretReading(fret, one.cents() + by, one.sd()) : one)
        .toList();
  }

  static Occasion occasion(StringLie lie, List<FretReading> readings) {
    return Occasion.first(lie, HeightSds.measured(), Reference.OPEN, readings);
  }

  static Occasion later(
      Occasion before, int wire, OptionalDouble saddleMoved, List<FretReading> readings) {
    return new Occasion(
        before.pass() + 1,
        wire,
        before.lie(),
        before.heights(),
        saddleMoved,
        0,
        before.against(),
        readings);
  }

  static NeckEstimate estimate(List<Occasion> strings) {
    return histories(strings.stream().map(StringHistory::of).toList());
  }

  static NeckEstimate histories(List<StringHistory> strings) {
    return NeckEstimator.estimate(new InstrumentEvidence(strings)).orElseThrow();
  }

  /** Every string read at every fret of {@link #FRETS}, the saddles 1 mm back. */
  static List<Occasion> readThrough(double off) {
    return strings().stream().map(lie -> occasion(lie, readings(lie, 1e-3, off))).toList();
  }
}
