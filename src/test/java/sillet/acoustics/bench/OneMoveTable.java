package sillet.acoustics.bench;

import java.io.PrintStream;
import java.util.List;
import java.util.Locale;
import sillet.acoustics.virtual.Kind;

/**
 * Prints what one move leaves on virtual instruments, by the plain length rule and by the model.
 *
 * <p>Run with {@code mvn -q test-compile exec:java -Dexec.classpathScope=test
 * -Dexec.mainClass=sillet.acoustics.bench.OneMoveTable -Dexec.args="360 1"}; the arguments are the
 * number of instruments and the seed.
 */
public final class OneMoveTable {
  /** A third of a degree: a bridge plate that is not quite parallel to the frets. */
  private static final double RAMP = 0.006;

  private OneMoveTable() {}

  /** Prints the table on standard output. */
  public static void main(String[] arguments) {
    int instruments = arguments.length > 0 ? Integer.parseInt(arguments[0]) : 360;
    long seed = arguments.length > 1 ? Long.parseLong(arguments[1]) : 1;
    Trial trial = Trial.run(seed, instruments, 0, List.of(Trial.Way.values()));
    System.out.printf(
        Locale.ROOT,
        "%d instruments, %d strings, seed %d%n",
        trial.instruments(),
        trial.of(Trial.Way.OCTAVE).size(),
        seed);
    print(System.out, trial, List.of(Trial.Way.values()));
    System.out.println("bridge plates that slope by 0.3 degrees (sd) against the frets:");
    List<Trial.Way> ways = List.of(Trial.Way.LENGTH_RULE, Trial.Way.OCTAVE);
    print(System.out, Trial.run(seed, instruments, RAMP, ways), ways);
  }

  private static void print(PrintStream out, Trial trial, List<Trial.Way> ways) {
    out.println("way            kind       strings  median   p95  held %  width mm");
    for (Trial.Way way : ways) {
      for (Kind kind : Kind.values()) {
        line(out, way, kind.name(), trial.of(way, kind));
      }
      line(out, way, "all", trial.of(way));
    }
  }

  private static void line(PrintStream out, Trial.Way way, String kind, Tally tally) {
    out.printf(
        Locale.ROOT,
        "%-14s %-10s %7d  %6.3f %6.3f  %5.1f  %6.3f%n",
        way.name(),
        kind,
        tally.size(),
        tally.median(),
        tally.ninetyFifth(),
        100 * tally.coverage(),
        1000 * tally.width());
  }
}
