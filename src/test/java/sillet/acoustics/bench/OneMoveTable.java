package sillet.acoustics.bench;

import java.io.PrintStream;
import java.util.List;
import java.util.Locale;
import sillet.acoustics.bench.Trial.Way;
import sillet.acoustics.virtual.Kind;

/**
 * Prints what one move leaves on virtual instruments, by the plain length rule and by the model:
 * for fret 12 the true cents left there, for the neck how much more rms is left than at the best
 * place; how often the 95 % interval of the saddle held the best place, and its median width.
 *
 * <p>Run with {@code mvn -q test-compile org.codehaus.mojo:exec-maven-plugin:3.6.4:java
 * -Dexec.classpathScope=test -Dexec.mainClass=sillet.acoustics.bench.OneMoveTable -Dexec.args="360
 * 1"}; the arguments are the number of instruments and the seed.
 */
public final class OneMoveTable {
  /** A third of a degree: a bridge plate that is not quite parallel to the frets. */
  private static final double RAMP = 0.006;

  private static final double NEAR = 2.0 / 648;
  private static final double FAR = 5.0 / 648;

  private OneMoveTable() {}

  /** Prints the table on standard output. */
  public static void main(String[] arguments) {
    int instruments = arguments.length > 0 ? Integer.parseInt(arguments[0]) : 360;
    long seed = arguments.length > 1 ? Long.parseLong(arguments[1]) : 1;
    Trial trial = Trial.run(Trial.Plan.usual(seed, instruments), List.of(Way.values()));
    System.out.printf(
        Locale.ROOT,
        "%d instruments, %d strings, seed %d; saddles found 2 mm (sd) of 648 off%n",
        trial.instruments(),
        trial.of(Way.OCTAVE).size(),
        seed);
    print(System.out, trial, List.of(Way.values()));
    System.out.printf("%d second passes not as predicted%n", trial.strangePasses());
    List<Way> octaves = List.of(Way.LENGTH_RULE, Way.OCTAVE);
    System.out.println("saddles found 5 mm (sd) of 648 off:");
    print(System.out, Trial.run(new Trial.Plan(seed, instruments, 0, FAR), octaves), octaves);
    System.out.println("bridge plates that slope by 0.3 degrees (sd) against the frets:");
    print(System.out, Trial.run(new Trial.Plan(seed, instruments, RAMP, NEAR), octaves), octaves);
  }

  private static void print(PrintStream out, Trial trial, List<Way> ways) {
    out.println("way            kind       strings  median    p95  held %  width mm");
    for (Way way : ways) {
      for (Kind kind : Kind.values()) {
        line(out, way, kind.name(), trial.of(way, kind));
      }
      line(out, way, "all", trial.of(way));
    }
  }

  private static void line(PrintStream out, Way way, String kind, Tally tally) {
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
