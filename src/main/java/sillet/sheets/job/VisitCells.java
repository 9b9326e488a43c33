package sillet.sheets.job;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.strings.FittedString;
import sillet.logbook.units.Figures;
import sillet.logbook.units.Pitch;

/** How things of a visit are written in a sheet. */
public final class VisitCells {
  private static final double SAME_PITCH = 1e-9;
  private static final int HERTZ_DECIMALS = 4;

  private VisitCells() {}

  /** What an instrument is called; by whatever is known of it, since rows are grouped by it. */
  public static String instrument(Instrument instrument) {
    if (!instrument.name().isEmpty()) {
      return instrument.name();
    }
    return instrument.tag().isEmpty() ? instrument.serial() : instrument.tag();
  }

  /** A day, blank while there is none. */
  public static String day(@Nullable LocalDate day) {
    return day == null ? "" : day.toString();
  }

  /**
   * A pitch that means the same to whoever reads the sheet: a note only where A4 is 440 Hz and
   * nothing was tuned off it on purpose, else hertz.
   */
  public static String pitch(FittedString string) {
    Pitch pitch = string.pitch();
    double concertHz = Pitch.parse(pitch.typed(), Pitch.CONCERT_A4_HZ).hz();
    boolean same = Math.abs(pitch.hz() / concertHz - 1) < SAME_PITCH;
    return same ? pitch.typed() : Figures.fixed(pitch.hz(), HERTZ_DECIMALS);
  }

  /** A gauge in inches with its thousandths, as a number. */
  public static String gauge(FittedString string) {
    String printed = Figures.gauge(string.make().gaugeIn());
    return printed.startsWith(".") ? "0" + printed : printed;
  }
}
