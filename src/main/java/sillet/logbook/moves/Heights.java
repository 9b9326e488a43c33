package sillet.logbook.moves;

import org.jspecify.annotations.Nullable;

/**
 * How high a string lies, as measured with the string open; what is not known is null.
 *
 * @param action12Mm gap over fret 12, relief already in it, millimetres
 * @param nutgap1Mm gap over fret 1, relief already in it, millimetres
 * @param reliefMm by straightedge, millimetres
 * @param between true where the gaps were measured at the strings on either side only
 */
public record Heights(
    @Nullable Double action12Mm,
    @Nullable Double nutgap1Mm,
    @Nullable Double reliefMm,
    boolean between) {
  /** Nothing measured. */
  public static final Heights NOT_KNOWN = new Heights(null, null, null);

  /**
   * Heights measured at this very string.
   *
   * @param action12Mm gap over fret 12, millimetres
   * @param nutgap1Mm gap over fret 1, millimetres
   * @param reliefMm by straightedge, millimetres
   */
  public Heights(
      @Nullable Double action12Mm, @Nullable Double nutgap1Mm, @Nullable Double reliefMm) {
    this(action12Mm, nutgap1Mm, reliefMm, false);
  }
}
