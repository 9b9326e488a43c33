package sillet.acoustics.bench;

import java.util.Locale;
import sillet.acoustics.moves.NutFreedom;
import sillet.acoustics.virtual.Mishap;

/**
 * Prints how good the whole neck is on virtual instruments that are not the estimation model: task,
 * figure, bar, met or not.
 *
 * <p>Run with {@code mvn -q test-compile exec:java
 * -Dexec.mainClass=sillet.acoustics.bench.WholeNeckTable -Dexec.args="400 1"}; the arguments are
 * the number of instruments and the seed.
 */
public final class WholeNeckTable {
  private static final double NO_BAR = Double.NaN;

  private WholeNeckTable() {}

  /** Prints the table on standard output. */
  public static void main(String[] arguments) {
    int instruments = arguments.length > 0 ? Integer.parseInt(arguments[0]) : 400;
    long seed = arguments.length > 1 ? Long.parseLong(arguments[1]) : 1;
    long start = System.nanoTime();
    Score score = new WholeNeckRun(instruments, seed, WholeNeckRun.everything()).run();
    System.out.printf(
        Locale.ROOT,
        "%d instruments, %d strings a task, seed %d, %.0f s%n",
        instruments,
        score.of(OctaveTask.MODEL).size(),
        seed,
        (System.nanoTime() - start) / 1e9);
    Printout print = new Printout(System.out, score);
    print.head();
    octave(print);
    neck(print, NutFreedom.FIXED, 1.015);
    neck(print, NutFreedom.EACH, 1.16);
    neck(print, NutFreedom.WHOLE, NO_BAR);
    findings(print, true);
    findings(print, false);
    print.forecast(ForecastTask.MEASURED, true);
    print.forecast(ForecastTask.SAME_MAKE, false);
    print.forecast(ForecastTask.OTHER_MAKE, false);
    print.forecast(ForecastTask.NO_GUESS, false);
    print.forecast(ForecastTask.UNMEASURED, false);
    print.forecast(ForecastTask.OCTAVE_READ, false);
    print.forecast(ForecastTask.UNREAD, false);
  }

  private static void octave(Printout print) {
    print.octave(OctaveTask.MODEL, true);
    print.octave(OctaveTask.RULE, false);
    print.octave(OctaveTask.TWO_PASSES, false);
    print.share(OctaveTask.STRANGE, "%", NO_BAR, false);
    print.octave(OctaveTask.UNREAD, false);
    print.octave(OctaveTask.FAR, false);
    print.octave(OctaveTask.FAR_RULE, false);
    print.octave(OctaveTask.RAMP, false);
  }

  private static void neck(Printout print, NutFreedom nut, double bar) {
    print.neck(NeckTask.row(nut, NeckTask.MODEL), bar);
    print.neck(NeckTask.row(nut, NeckTask.ONE_BY_ONE), NO_BAR);
    print.neck(NeckTask.row(nut, NeckTask.LINEAR), NO_BAR);
    print.neck(NeckTask.row(nut, NeckTask.RULE), NO_BAR);
  }

  private static void findings(Printout print, boolean heights) {
    for (Mishap mishap : Mishap.values()) {
      print.share(
          FindingTask.row(heights, FindingTask.name(mishap)),
          "found, %",
          heights ? 90 : NO_BAR,
          true);
    }
    print.share(FindingTask.row(heights, FindingTask.CLEAN), "%", heights ? 5 : NO_BAR, false);
    print.share(FindingTask.row(heights, FindingTask.BESIDE), "%", NO_BAR, false);
  }
}
