package sillet.desktop.intake;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import sillet.acoustics.wire.ScrewThread;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.Figures;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;

/**
 * The way of a saddle per turn: a thread as stamped on its tap, {@code M3} or {@code #6-32}, or the
 * way as measured, {@code 0.5} or {@code 0.031in}.
 */
public final class ScrewText {
  private static final double MM_PER_M = 1e3;

  private ScrewText() {}

  /**
   * Reads a screw.
   *
   * @param usual the unit of a number without a suffix
   * @return millimetres per turn
   * @throws Rejection if it is neither a thread nor a way above zero
   */
  public static double parse(String typed, LengthUnit usual) {
    String text = typed.strip().toUpperCase(Locale.ROOT);
    for (ScrewThread thread : ScrewThread.values()) {
      if (thread.designation().equals(text) || thread.designation().equals("#" + text)) {
        return thread.pitch() * MM_PER_M;
      }
    }
    double mm = Length.parse(typed, usual).mm();
    if (mm <= 0) {
      throw Rejection.of("intake.screw.none", typed.strip());
    }
    return mm;
  }

  /** Threads on offer, as stamped. */
  public static List<String> threads() {
    return Arrays.stream(ScrewThread.values()).map(ScrewThread::designation).toList();
  }

  /** Says the way of one turn. */
  public static String said(double mm) {
    return Figures.fixed(mm, 3) + " mm = " + Figures.fixed(mm / LengthUnit.MM_PER_INCH, 4) + " in";
  }
}
