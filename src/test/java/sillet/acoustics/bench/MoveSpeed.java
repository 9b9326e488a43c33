package sillet.acoustics.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import sillet.acoustics.moves.Aim;
import sillet.acoustics.moves.MoveEstimate;
import sillet.acoustics.moves.MoveSolver;
import sillet.acoustics.moves.MoveTask;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;
import sillet.acoustics.wire.Construction;
import sillet.acoustics.wire.StringEstimate;
import sillet.acoustics.wire.StringSpec;

/**
 * Prints how long one string takes, on one thread, once the machine is warm. Nothing is asserted: a
 * test that measures time fails on a busy machine.
 *
 * <p>Run with {@code mvn -q test-compile org.codehaus.mojo:exec-maven-plugin:3.6.4:java
 * -Dexec.classpathScope=test -Dexec.mainClass=sillet.acoustics.bench.MoveSpeed}.
 */
public final class MoveSpeed {
  private static final double INCH = 0.0254;
  private static final int ROUNDS = 5;

  private MoveSpeed() {}

  /** Prints microseconds per string for each aim. */
  public static void main(String[] arguments) {
    time("octave, fret 12 read", Aim.OCTAVE, 200_000, 12);
    time("octave, frets 5, 7, 12", Aim.OCTAVE, 200_000, 5, 7, 12);
    time("octave, fret 12 unread", Aim.OCTAVE, 20_000, 3, 5, 7);
    time("neck, frets 1, 5, 12", Aim.NECK, 10_000, 1, 5, 12);
  }

  private static void time(String what, Aim aim, int strings, int... frets) {
    List<MoveTask> tasks = tasks(aim, frets);
    double best = Double.POSITIVE_INFINITY;
    double check = 0;
    for (int round = 0; round < ROUNDS; round++) {
      long start = System.nanoTime();
      for (int i = 0; i < strings; i++) {
        Outcome<MoveEstimate> outcome = MoveSolver.solve(tasks.get(i % tasks.size()));
        check += outcome instanceof Solved<MoveEstimate> solved ? solved.value().saddleMove() : 1e9;
      }
      best = Math.min(best, (System.nanoTime() - start) / 1e3 / strings);
    }
    System.out.printf(
        Locale.ROOT,
        "%-24s %7.2f microseconds a string (sum of moves %.3f m)%n",
        what,
        best,
        check);
  }

  private static List<MoveTask> tasks(Aim aim, int... frets) {
    double[] gauges = {.010, .013, .017, .026, .036, .046};
    double[] hertz = {329.6276, 246.9417, 195.9977, 146.8324, 110, 82.4069};
    List<MoveTask> tasks = new ArrayList<>();
    for (int i = 0; i < 600; i++) {
      int string = i % gauges.length;
      Construction construction = string < 3 ? Construction.PLAIN_STEEL : Construction.WOUND_NICKEL;
      double scale = 0.62 + 0.0001 * (i % 97);
      StringLie lie =
          StringLie.nominal(
              StringEstimate.of(
                  StringSpec.of(gauges[string] * INCH, construction), hertz[string], scale),
              hertz[string],
              scale,
              Clearances.usual(construction));
      List<FretReading> readings = new ArrayList<>();
      for (int fret : frets) {
        readings.add(new FretReading(fret, -8 + 0.1 * (i % 161), 0.5));
      }
      tasks.add(new MoveTask(lie, readings, Reference.OPEN, aim, true, 0.005));
    }
    return tasks;
  }
}
