package sillet.desktop.drawing.strings;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * One string of the drawing.
 *
 * @param number string 1 is on the treble side
 * @param note as typed, {@code F#3}
 * @param gauge as printed on the packet, {@code .010}
 * @param gaugeIn the same in inches, above zero: the width of the line
 * @param course number of its course; strings next to each other with the same number lie close
 *     together; 0 where strings stand alone
 * @param scaleMm nominal scale of this string, from its own nut
 * @param startFret 0, or the fret of the neck at which a short string has its own nut
 * @param frets its marks, each fret once
 * @param saddle null where its place is not known
 */
public record StringRow(
    int number,
    String note,
    String gauge,
    double gaugeIn,
    int course,
    double scaleMm,
    int startFret,
    List<FretMark> frets,
    @Nullable SaddleMark saddle) {
  public StringRow {
    if (!(gaugeIn > 0) || !(scaleMm > 0) || startFret < 0) {
      throw new IllegalArgumentException(
          "String " + number + " needs a gauge, a scale and a nut: " + gaugeIn + ", " + scaleMm);
    }
    frets = List.copyOf(frets);
  }
}
