package sillet.logbook.visits;

/**
 * One figure measured, with what makes it comparable.
 *
 * @param kind what was measured
 * @param string number, or 0 where it concerns the whole neck
 * @param fret where, or 0 where no fret is meant
 * @param method how
 * @param moment as received or as left
 * @param valueMm millimetres
 * @param typed what was typed, kept because rounding would show
 */
public record BenchCheck(
    CheckKind kind,
    int string,
    int fret,
    CheckMethod method,
    Moment moment,
    double valueMm,
    String typed) {

  /** The whole neck instead of one string. */
  public static final int WHOLE_NECK = 0;
}
