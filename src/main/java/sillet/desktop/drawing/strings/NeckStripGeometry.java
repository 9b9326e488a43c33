package sillet.desktop.drawing.strings;

import java.util.List;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.pitch.FretPositions;

/**
 * Millimetres of the neck to px of the screen. Fret n stands at L(1 - 2^(-n/12)) from the nut.
 * Where strings differ in scale, the straight fret stands at a right angle and nut and other frets
 * slant. Holds no JavaFX types.
 */
public final class NeckStripGeometry {
  private final List<StringRow> strings;
  private final StringsPicture.Board board;
  private final StringRows rows;
  private final double zeroX;
  private final double pxPerMm;
  private final double longestMm;

  /**
   * A strip that fills a span.
   *
   * @param picture strings and frets
   * @param rows where the rows lie
   * @param zeroX px of the nut of the longest string, the zero of the rule
   * @param lastFretX px of the farthest point of the last fret; left of the nut when mirrored
   */
  public NeckStripGeometry(
      StringsPicture picture, StringRows rows, double zeroX, double lastFretX) {
    this.strings = picture.rows();
    this.board = picture.board();
    this.rows = rows;
    this.zeroX = zeroX;
    this.longestMm = strings.stream().mapToDouble(NeckStripGeometry::neckScaleMm).max().orElse(1);
    this.pxPerMm = (lastFretX - zeroX) / lengthMm();
  }

  /** Where the last read fret stands, as a share of the way to the last fret; 0 for none. */
  static double shareOfLastReadFret(StringsPicture picture) {
    var readFrets = picture.board().readFrets();
    if (readFrets.isEmpty()) {
      return 0;
    }
    StringRows anyRows = new StringRows(picture, SheetMeasures.of(SheetShape.USUAL, picture), 0, 1);
    NeckStripGeometry plain = new NeckStripGeometry(picture, anyRows, 0, 1);
    return plain.farthestMm(readFrets.get(readFrets.size() - 1)) / plain.lengthMm();
  }

  /** The scale a string would have from the nut of the whole neck. */
  private static double neckScaleMm(StringRow string) {
    return string.scaleMm() * EqualTemperament.ratio(string.startFret());
  }

  /** Distance of a fret of the neck from the zero of the rule, along one string. */
  private double neckMm(int row, int neckFret) {
    double scale = neckScaleMm(strings.get(row));
    int straight = board.straightFret();
    double nut = fromNut(longestMm, straight) - fromNut(scale, straight);
    return nut + fromNut(scale, neckFret);
  }

  private static double fromNut(double scaleMm, int fret) {
    return FretPositions.fromNut(scaleMm, fret);
  }

  /** Px of one mm, below zero where the strip is mirrored. */
  public double pxPerMm() {
    return pxPerMm;
  }

  /** Px of a place so many mm from the zero of the rule. */
  public double x(double mm) {
    return zeroX + mm * pxPerMm;
  }

  /** Px of a fret on one string, counted from the string's own nut; 0 is that nut. */
  public double fretX(int row, int fret) {
    return neckFretX(row, fret + strings.get(row).startFret());
  }

  /** Px of a fret of the neck on one string; 0 is the nut of the neck. */
  public double neckFretX(int row, int neckFret) {
    return x(neckMm(row, neckFret));
  }

  /**
   * Px of a fret of the neck at any height: the straight line through the outer strings, on to the
   * edges of the board.
   */
  public double neckFretXAt(int neckFret, double y) {
    int upper = rows.uppermost();
    int lower = rows.lowermost();
    double upperX = neckFretX(upper, neckFret);
    double height = rows.y(lower) - rows.y(upper);
    if (height == 0) {
      return upperX;
    }
    double slant = (neckFretX(lower, neckFret) - upperX) / height;
    return upperX + slant * (y - rows.y(upper));
  }

  /** Whether frets stand at a right angle to the strings. */
  public boolean square() {
    return strings.stream().allMatch(s -> Math.abs(neckScaleMm(s) - longestMm) < 1e-6);
  }

  /** Length of the strip, from the zero of the rule to its last fret. */
  public double lengthMm() {
    return farthestMm(board.frets());
  }

  private double farthestMm(int neckFret) {
    double farthest = 0;
    for (int row = 0; row < strings.size(); row++) {
      farthest = Math.max(farthest, neckMm(row, neckFret));
    }
    return farthest;
  }
}
