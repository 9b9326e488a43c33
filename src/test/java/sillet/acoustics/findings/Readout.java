package sillet.acoustics.findings;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.estimate.HeightSds;
import sillet.acoustics.estimate.InstrumentEvidence;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.NeckEstimator;
import sillet.acoustics.estimate.Occasion;
import sillet.acoustics.estimate.StringHistory;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.virtual.Kind;
import sillet.acoustics.virtual.Luck;
import sillet.acoustics.virtual.VirtualInstrument;
import sillet.acoustics.virtual.VirtualString;
import sillet.acoustics.virtual.Workshop;
import sillet.acoustics.wire.Construction;
import sillet.acoustics.wire.StringEstimate;
import sillet.acoustics.wire.StringSpec;

/** An instrument measured and read through with a little scatter. */
final class Readout {
  static final int[] ALL = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 15, 17};
  private static final double SCATTER = 0.4;

  private final Luck luck;
  private final VirtualInstrument instrument;

  Readout(VirtualInstrument instrument, long seed) {
    this.instrument = instrument;
    this.luck = new Luck(seed);
  }

  static VirtualInstrument build(Kind kind, long seed) {
    return new Workshop(new Luck(seed), 0).build(kind);
  }

  NeckEstimate estimate(int... frets) {
    return NeckEstimator.estimate(new InstrumentEvidence(histories(frets))).orElseThrow();
  }

  List<StringHistory> histories(int... frets) {
    List<StringHistory> strings = new ArrayList<>();
    for (VirtualInstrument.Course course : instrument.strings()) {
      List<FretReading> readings = new ArrayList<>();
      for (int fret : frets) {
        double cents = course.string().centsAgainstOpen(fret, 2.5e-3, 0) + luck.noise(SCATTER);
        readings.add(new FretReading(fret, cents, SCATTER));
      }
      strings.add(history(course, readings));
    }
    return strings;
  }

  StringHistory history(VirtualInstrument.Course course, List<FretReading> readings) {
    return StringHistory.of(
        Occasion.first(lie(course), HeightSds.measured(), Reference.OPEN, readings));
  }

  private StringLie lie(VirtualInstrument.Course course) {
    Construction construction = Construction.valueOf(course.plan().construction().name());
    StringSpec spec = StringSpec.of(course.plan().diameter(), construction);
    double hz = course.plan().hz();
    double scale = instrument.neck().scale();
    VirtualString string = course.string();
    Clearances measured =
        new Clearances(
            string.clearance(12) + luck.noise(8e-5),
            string.clearance(1) + luck.noise(2.5e-5),
            string.relief());
    return StringLie.nominal(StringEstimate.of(spec, hz, scale), hz, scale, measured);
  }
}
