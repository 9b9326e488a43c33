package sillet.logbook.moves;

import org.jspecify.annotations.Nullable;

/**
 * How high a string lies, as measured with the string open; what is not known is null.
 *
 * @param action12Mm gap over fret 12, relief already in it, millimetres
 * @param nutgap1Mm gap over fret 1, relief already in it, millimetres
 * @param reliefMm by straightedge, millimetres
 */
public record Heights(
    @Nullable Double action12Mm, @Nullable Double nutgap1Mm, @Nullable Double reliefMm) {
  /** Nothing measured. */
  public static final Heights NOT_KNOWN = new Heights(null, null, null);
}
