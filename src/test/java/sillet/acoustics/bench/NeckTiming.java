package sillet.acoustics.bench;

import java.util.ArrayList;
import java.util.List;
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
import sillet.acoustics.moves.NutFreedom;
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

  private List<BenchString> strings;
  private List<List<FretReading>> readings;

  /** Six strings, read at every fret. */
  @Setup
  public void takeIn() {
    Technician technician = new Technician(new Luck(2), Technician.Habits.usual(0.4));
    strings =
        technician.takeIn(new Workshop(new Luck(1), 0).build(Kind.ELECTRIC), true, Reference.OPEN);
    readings = new ArrayList<>();
    for (BenchString string : strings) {
      List<FretReading> read = new ArrayList<>();
      for (int fret = 1; fret <= FRETS; fret++) {
        read.add(technician.read(string, fret));
      }
      readings.add(read);
    }
  }

  /** Estimate of all strings and the best moves for the neck. */
  @Benchmark
  public List<Move> moves() {
    return Solver.neck(Solver.estimate(strings, readings), NutFreedom.EACH);
  }
}
