package sillet.acoustics.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.openjdk.jmh.infra.Blackhole;
import sillet.acoustics.estimate.HeightSds;
import sillet.acoustics.estimate.InstrumentEvidence;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.NeckEstimator;
import sillet.acoustics.estimate.Occasion;
import sillet.acoustics.estimate.StringHistory;
import sillet.acoustics.findings.FindingOptions;
import sillet.acoustics.findings.NeckFindings;
import sillet.acoustics.forecast.StringChange;
import sillet.acoustics.forecast.Stringing;
import sillet.acoustics.moves.Aim;
import sillet.acoustics.moves.MoveSolver;
import sillet.acoustics.moves.NutFreedom;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.virtual.Kind;
import sillet.acoustics.virtual.Luck;
import sillet.acoustics.virtual.Workshop;

/**
 * What an instrument costs once the machine is warm, milliseconds. Nothing is asserted: a test that
 * measures time fails on a busy machine. The command is in DEVELOPERS.md.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class NeckTiming {
  private static final int FRETS = 22;
  private static final int VISITS = 5;
  private static final int PASSES = 2;
  private static final int[] READ_AT_A_VISIT = {1, 2, 3, 5, 7, 9, 12, 15, 17};

  private List<BenchString> strings;
  private List<List<FretReading>> readings;
  private List<StringChange> changes;
  private InstrumentEvidence visits;

  /** Six strings, read at every fret; the same instrument over five visits of two passes. */
  @Setup
  public void takeIn() {
    Technician technician = new Technician(new Luck(2), Technician.Habits.usual(0.4));
    strings =
        technician.takeIn(new Workshop(new Luck(1), 0).build(Kind.ELECTRIC), true, Reference.OPEN);
    readings = new ArrayList<>();
    changes = new ArrayList<>();
    List<StringHistory> histories = new ArrayList<>();
    for (BenchString string : strings) {
      List<FretReading> read = new ArrayList<>();
      for (int fret = 1; fret <= FRETS; fret++) {
        read.add(technician.read(string, fret));
      }
      readings.add(read);
      StringLie lie = string.typed();
      Stringing now = new Stringing(string.spec(), lie.openHz(), lie.scale());
      changes.add(
          new StringChange(now, now.tunedBy(-2), OptionalDouble.of(1.5e-3), string.against()));
      histories.add(history(string, technician));
    }
    visits = new InstrumentEvidence(histories);
  }

  /** A new string at every visit, a known move between its passes. */
  private static StringHistory history(BenchString string, Technician technician) {
    List<Occasion> occasions = new ArrayList<>();
    for (int visit = 0; visit < VISITS; visit++) {
      for (int pass = 0; pass < PASSES; pass++) {
        double moved = 1e-3 * pass;
        List<FretReading> read = new ArrayList<>();
        for (int fret : READ_AT_A_VISIT) {
          read.add(technician.read(string, fret, string.found() + moved));
        }
        occasions.add(
            new Occasion(
                PASSES * visit + pass + 1,
                visit,
                string.typed(),
                HeightSds.measured(),
                pass == 0 ? OptionalDouble.empty() : OptionalDouble.of(moved),
                0,
                string.against(),
                read));
      }
    }
    return new StringHistory(occasions);
  }

  /** All of it: estimate, moves for both aims, findings, forecast. Bar: 20 ms. */
  @Benchmark
  public void wholeNeck(Blackhole hole) {
    NeckEstimate estimate = Solver.estimate(strings, readings);
    hole.consume(MoveSolver.solve(estimate, Aim.OCTAVE, NutFreedom.FIXED));
    hole.consume(MoveSolver.solve(estimate, Aim.NECK, NutFreedom.EACH));
    hole.consume(NeckFindings.of(estimate, FindingOptions.NONE));
    hole.consume(Solver.forecast(estimate, changes));
  }

  /** The estimate alone. */
  @Benchmark
  public NeckEstimate estimate() {
    return Solver.estimate(strings, readings);
  }

  /** All visits of one instrument, the strings new each time. Bar: 100 ms. */
  @Benchmark
  public NeckEstimate allVisits() {
    return NeckEstimator.estimate(visits).orElseThrow();
  }
}
