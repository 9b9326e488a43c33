package sillet.acoustics.frets;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.FretPositions;

/**
 * How far measured frets stand from where they belong, and what that costs.
 *
 * <p>A fret that stands e nearer to the bridge leaves a string of X0 2^(-n/12) - e, sharp by 1200
 * log2 of the ratio of the lengths: to first order C 2^(n/12) e / X0, 0.28 cents per 0.1 mm at fret
 * 1 and 0.95 at fret 22 of 648 mm [D]. Height, stiffness and stretch do not enter.
 *
 * @param lines by fret
 */
public record FretErrors(List<Line> lines) {

  /** Copies the lines. */
  public FretErrors {
    lines = List.copyOf(lines);
  }

  /**
   * One measured fret.
   *
   * @param fret its number
   * @param measured from the nut's edge in m, as read
   * @param error how much nearer to the bridge it stands than it should, in m
   * @param cents what that does to its notes on every string; positive is sharp
   */
  public record Line(int fret, double measured, double error, double cents) {}

  /**
   * Errors against a scale and a nut.
   *
   * @param scale in m, finite and above zero
   * @param nutFar how much farther from the frets the measuring edge is than the scale's own zero,
   *     in m; 0 measures against the nut as it stands
   * @param places measured, m from the nut's edge, by fret from 1 on
   * @throws IllegalArgumentException where the scale or a fret is out of range, or a place lies at
   *     or behind the bridge
   */
  public static FretErrors of(double scale, double nutFar, Map<Integer, Double> places) {
    List<Line> lines = new ArrayList<>();
    for (Map.Entry<Integer, Double> one : new TreeMap<>(places).entrySet()) {
      int fret = one.getKey();
      double should = FretPositions.toSaddle(scale, fret);
      double error = one.getValue() - nutFar - FretPositions.fromNut(scale, fret);
      if (!(should - error > 0)) {
        throw new IllegalArgumentException("fret " + fret + " lies at or behind the bridge");
      }
      lines.add(new Line(fret, one.getValue(), error, cents(should, should - error)));
    }
    return new FretErrors(lines);
  }

  /** Cents that a string of length {@code is} is sharp of one of length {@code should}. */
  static double cents(double should, double is) {
    return Cents.ofRatio(should / is);
  }
}
