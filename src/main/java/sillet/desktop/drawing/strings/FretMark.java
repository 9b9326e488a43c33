package sillet.desktop.drawing.strings;

import org.jspecify.annotations.Nullable;

/**
 * What stands on one string at one read fret. Cents are fretted minus open, positive sharp.
 *
 * @param fret counted from the string's own nut
 * @param cents as read; null where not read yet
 * @param predicted what stays after the move; null where nothing is forecast
 * @param before as read in the pass before; null in the first pass
 * @param stale must be read again
 * @param estimated by the model, not read: drawn thin
 */
public record FretMark(
    int fret,
    @Nullable Double cents,
    @Nullable Double predicted,
    @Nullable Double before,
    boolean stale,
    boolean estimated) {
  /** Cents within which a note counts as true, the width of a line on a tuner. */
  static final double TRUE_CENTS = 1;

  /** A fret that was read, or not read at all. */
  public FretMark(
      int fret,
      @Nullable Double cents,
      @Nullable Double predicted,
      @Nullable Double before,
      boolean stale) {
    this(fret, cents, predicted, before, stale, false);
  }

  /** What the model says of a fret nobody has read. */
  public static FretMark estimate(int fret, double cents, @Nullable Double predicted) {
    return new FretMark(fret, cents, predicted, null, false, true);
  }

  /** A fret nobody has read. */
  public static FretMark unread(int fret) {
    return new FretMark(fret, null, null, null, false);
  }

  /** A reading. */
  public static FretMark read(int fret, double cents) {
    return new FretMark(fret, cents, null, null, false);
  }

  /** The same with what is expected after the move. */
  public FretMark expecting(double cents12) {
    return new FretMark(fret, cents, cents12, before, stale, estimated);
  }

  /** The same with the reading of the pass before. */
  public FretMark after(double centsBefore) {
    return new FretMark(fret, cents, predicted, centsBefore, stale, estimated);
  }

  /** The same, to be read again. */
  public FretMark gone() {
    return new FretMark(fret, cents, predicted, before, true, estimated);
  }

  static boolean isTrue(@Nullable Double cents) {
    return cents != null && Math.abs(cents) <= TRUE_CENTS;
  }
}
