package sillet.desktop.drawing.strings;

import org.jspecify.annotations.Nullable;

/**
 * Millimetres at the bridge to px, to scale: so many times life size along the string. Holds no
 * JavaFX types.
 */
public final class BridgePlanGeometry {
  private static final double MM_PER_INCH = 25.4;

  /** How far beyond the travel a place or an interval is still drawn. */
  private static final double BEYOND_MM = 2;

  private static final double USUAL_LOW_MM = -1;
  private static final double USUAL_HIGH_MM = 7;

  private final double lowMm;
  private final double highMm;
  private final double factor;
  private final double pxPerMm;
  private final double zeroX;
  private final double leastMm;
  private final double mostMm;

  /**
   * Where the plan is drawn.
   *
   * @param fromX px of the end toward the neck
   * @param toX px of the end away from the neck; left of the other when mirrored
   * @param marginPx room on either side that an interval may still use
   * @param dotsPerInch px of an inch on this screen
   * @param wanted times life size, if there is room
   */
  public record Frame(
      double fromX, double toX, double marginPx, double dotsPerInch, double wanted) {}

  /** A plan of the saddles of a picture. */
  public BridgePlanGeometry(StringsPicture picture, Frame frame) {
    double[] reach = reach(picture);
    this.lowMm = reach[0];
    this.highMm = reach[1];
    double room = Math.abs(frame.toX() - frame.fromX());
    double lifeSize = frame.dotsPerInch() / MM_PER_INCH;
    this.factor = Math.min(frame.wanted(), stepDown(room / ((highMm - lowMm) * lifeSize)));
    double side = Math.signum(frame.toX() - frame.fromX());
    this.pxPerMm = side * factor * lifeSize;
    double left = picture.isOnePiece() ? 0 : (room - Math.abs(pxPerMm) * (highMm - lowMm)) / 2;
    this.zeroX = frame.fromX() + side * left - lowMm * pxPerMm;
    this.leastMm = (frame.fromX() - side * frame.marginPx() - zeroX) / pxPerMm;
    this.mostMm = (frame.toX() + side * frame.marginPx() - zeroX) / pxPerMm;
  }

  /** The next half or, under one, tenth below: a scale that can be said in words. */
  private static double stepDown(double fits) {
    double step = fits >= 1 ? 0.5 : 0.1;
    return Math.max(0.1, Math.floor(fits / step) * step);
  }

  private static double[] reach(StringsPicture picture) {
    if (picture.bridge() instanceof Bridge.OnePiece onePiece) {
      return new double[] {0, onePiece.widthMm()};
    }
    double low = 0;
    double high = 0;
    for (StringRow row : picture.rows()) {
      SaddleMark saddle = row.saddle();
      if (saddle != null) {
        low = Math.min(low, firmLow(saddle));
        high = Math.max(high, firmHigh(saddle));
      }
    }
    double firmLow = low;
    double firmHigh = high;
    for (StringRow row : picture.rows()) {
      SaddleMark saddle = row.saddle();
      if (saddle != null) {
        low =
            Math.min(low, Math.max(firmLow - BEYOND_MM, least(saddle.lowMm(), saddle.targetMm())));
        high =
            Math.max(
                high, Math.min(firmHigh + BEYOND_MM, most(saddle.highMm(), saddle.targetMm())));
      }
    }
    return high > low ? new double[] {low, high} : new double[] {USUAL_LOW_MM, USUAL_HIGH_MM};
  }

  private static double firmLow(SaddleMark saddle) {
    return Math.min(saddle.nowMm(), least(saddle.travelNeckMm(), saddle.beforeMm()));
  }

  private static double firmHigh(SaddleMark saddle) {
    return Math.max(saddle.nowMm(), most(saddle.travelAwayMm(), saddle.beforeMm()));
  }

  private static double least(@Nullable Double one, @Nullable Double other) {
    return Math.min(
        one == null ? Double.POSITIVE_INFINITY : one,
        other == null ? Double.POSITIVE_INFINITY : other);
  }

  private static double most(@Nullable Double one, @Nullable Double other) {
    return Math.max(
        one == null ? Double.NEGATIVE_INFINITY : one,
        other == null ? Double.NEGATIVE_INFINITY : other);
  }

  /** Px of a place in mm, growing away from the neck. */
  public double x(double mm) {
    return zeroX + mm * pxPerMm;
  }

  /** A place brought within the room there is. */
  public double drawn(double mm) {
    return Math.max(leastMm, Math.min(mostMm, mm));
  }

  /** Px of one mm, below zero where the plan is mirrored. */
  public double pxPerMm() {
    return pxPerMm;
  }

  /** Times life size along the string. */
  public double factor() {
    return factor;
  }

  /** The end of the plan toward the neck. */
  public double lowMm() {
    return lowMm;
  }

  /** The end of the plan away from the neck. */
  public double highMm() {
    return highMm;
  }
}
