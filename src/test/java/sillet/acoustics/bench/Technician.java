package sillet.acoustics.bench;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.moves.SecondPass;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.virtual.Luck;
import sillet.acoustics.virtual.VirtualInstrument;
import sillet.acoustics.virtual.VirtualString;
import sillet.acoustics.wire.Construction;
import sillet.acoustics.wire.CoreShape;
import sillet.acoustics.wire.StringEstimate;
import sillet.acoustics.wire.StringSpec;

/** Types what can be known of a string, with the errors of rule and gauge, and reads the tuner. */
final class Technician {
  /** What the tuner shows, cents. */
  private static final double SHOWN_TO = 0.1;

  private final Luck luck;
  private final Habits habits;

  /**
   * How a technician works.
   *
   * @param scatter of one reading of the difference, standard deviation in cents
   * @param foundShare how far from its best place a saddle is found, standard deviation as a share
   *     of the scale
   */
  record Habits(double scatter, double foundShare) {
    /** Saddles are found 2 mm (sd) off on a scale of 648. */
    static Habits usual(double scatter) {
      return new Habits(scatter, 2.0 / 648);
    }
  }

  Technician(Luck luck, Habits habits) {
    this.luck = luck;
    this.habits = habits;
  }

  /** The strings of an instrument as chance has it: heights measured, harmonic or open string. */
  List<BenchString> takeIn(VirtualInstrument instrument) {
    boolean heights = luck.chance(0.5);
    Reference against = luck.chance(0.3) ? Reference.HARMONIC : Reference.OPEN;
    return takeIn(instrument, heights, against);
  }

  /** The strings of an instrument, its saddles standing where chance left them. */
  List<BenchString> takeIn(VirtualInstrument instrument, boolean heights, Reference against) {
    double true0 = instrument.neck().scale();
    double scale = Math.rint((true0 + luck.noise(3e-4)) / 5e-4) * 5e-4;
    List<BenchString> strings = new ArrayList<>();
    for (VirtualInstrument.Course course : instrument.strings()) {
      StringSpec spec = spec(course);
      Truth truth = new Truth(course.string(), true0);
      double found = truth.bestForOctave(against) + luck.noise(habits.foundShare() * true0);
      strings.add(
          new BenchString(
              instrument.kind(),
              truth,
              spec,
              lie(course, spec, scale, heights),
              heights,
              against,
              found));
    }
    return strings;
  }

  private StringLie lie(
      VirtualInstrument.Course course, StringSpec spec, double scale, boolean heights) {
    double hz = course.plan().hz();
    Clearances clearances =
        heights ? measured(course.string()) : Clearances.usual(spec.construction());
    return StringLie.nominal(StringEstimate.of(spec, hz, scale), hz, scale, clearances);
  }

  /** One try at a fret with the saddle as found, as the tuner shows it. */
  FretReading read(BenchString string, int fret) {
    return read(string, fret, string.found());
  }

  /** One try at a fret with the saddle elsewhere. */
  FretReading read(BenchString string, int fret, double setback) {
    double heard =
        string.truth().cents(fret, string.against(), setback) + luck.noise(habits.scatter());
    double shown = Math.rint(heard / SHOWN_TO) * SHOWN_TO;
    return new FretReading(fret, shown, Math.hypot(habits.scatter(), SHOWN_TO / Math.sqrt(12)));
  }

  /** Where a saddle comes to stand when it is set by hand. */
  double set(double setback) {
    return setback + luck.noise(SecondPass.HAND_SD);
  }

  /** Readings at several frets. */
  List<FretReading> read(BenchString string, int... frets) {
    List<FretReading> readings = new ArrayList<>();
    for (int fret : frets) {
      readings.add(read(string, fret));
    }
    return readings;
  }

  /** The packet; now and then a core or a unit mass is known. */
  StringSpec spec(VirtualInstrument.Course course) {
    Construction construction = Construction.valueOf(course.plan().construction().name());
    boolean core = construction.wound() && construction.steel() && luck.chance(0.25);
    boolean mass = luck.chance(0.15);
    @Nullable Double typedCore = core ? course.drawn().core() * (1 + luck.noise(0.01)) : null;
    @Nullable Double typedMass =
        mass ? course.drawn().wire().unitMass(0) * (1 + luck.noise(0.01)) : null;
    return new StringSpec(
        course.plan().diameter(), construction, CoreShape.ROUND, typedCore, typedMass);
  }

  /** Rule over fret 12, feelers over fret 1, a straightedge for the relief it finds there. */
  private Clearances measured(VirtualString string) {
    return new Clearances(
        string.clearance(12) + luck.noise(8e-5),
        string.clearance(1) + luck.noise(2.5e-5),
        Math.max(0, string.relief() + luck.noise(3e-5)));
  }
}
