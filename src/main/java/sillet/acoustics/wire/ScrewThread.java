package sillet.acoustics.wire;

import java.util.Optional;

/**
 * Threads that saddle screws are cut with, and how far one turn of each moves the saddle.
 *
 * <p>Metric coarse pitches: ISO 261 as an open table of threads cites it (M3.5 from a maker's tap
 * table). Unified: ASME B1.1 likewise, by threads per inch, pitch = 25.4 mm / number exactly.
 */
public enum ScrewThread {
  /** M1.6, 0.35 mm. */
  M1_6("M1.6", 0.35e-3),
  /** M2, 0.40 mm. */
  M2("M2", 0.40e-3),
  /** M2.5, 0.45 mm. */
  M2_5("M2.5", 0.45e-3),
  /** M2.2, 0.45 mm. */
  M2_2("M2.2", 0.45e-3),
  /** M3, 0.50 mm. */
  M3("M3", 0.50e-3),
  /** M3.5, 0.60 mm. */
  M3_5("M3.5", 0.60e-3),
  /** M4, 0.70 mm. */
  M4("M4", 0.70e-3),
  /** M5, 0.80 mm. */
  M5("M5", 0.80e-3),
  /** M6, 1.00 mm. */
  M6("M6", 1.00e-3),
  /** #2-56 UNC. */
  UNC_2_56("#2-56", 0.0254 / 56),
  /** #4-40 UNC. */
  UNC_4_40("#4-40", 0.0254 / 40),
  /** #5-40 UNC. */
  UNC_5_40("#5-40", 0.0254 / 40),
  /** #6-32 UNC. */
  UNC_6_32("#6-32", 0.0254 / 32),
  /** #8-32 UNC. */
  UNC_8_32("#8-32", 0.0254 / 32),
  /** #10-24 UNC. */
  UNC_10_24("#10-24", 0.0254 / 24),
  /** #4-48 UNF. */
  UNF_4_48("#4-48", 0.0254 / 48),
  /** #6-40 UNF. */
  UNF_6_40("#6-40", 0.0254 / 40),
  /** #8-36 UNF. */
  UNF_8_36("#8-36", 0.0254 / 36),
  /** #10-32 UNF. */
  UNF_10_32("#10-32", 0.0254 / 32);

  private final String designation;
  private final double pitch;

  ScrewThread(String designation, double pitch) {
    this.designation = designation;
    this.pitch = pitch;
  }

  /** What is stamped on the tap: {@code M3}, {@code #6-32}. */
  public String designation() {
    return designation;
  }

  /** Move along the axis in one turn, in m. */
  public double pitch() {
    return pitch;
  }

  /** The thread of that designation, exactly as {@link #designation()} writes it. */
  public static Optional<ScrewThread> named(String designation) {
    for (ScrewThread thread : values()) {
      if (thread.designation.equals(designation)) {
        return Optional.of(thread);
      }
    }
    return Optional.empty();
  }

  /**
   * The thread whose pitch is nearest; of several with that pitch the first in the list above
   * (M2.5, #4-40, #6-32), since the pitch alone cannot tell a #6-32 from a #8-32.
   *
   * @param pitch move per turn in m, above zero
   * @throws IllegalArgumentException unless the pitch is finite and above zero
   */
  public static ScrewThread nearest(double pitch) {
    requirePitch(pitch);
    ScrewThread best = M1_6;
    for (ScrewThread thread : values()) {
      if (Math.abs(thread.pitch - pitch) < Math.abs(best.pitch - pitch)) {
        best = thread;
      }
    }
    return best;
  }

  /**
   * Turns of a screw for a move.
   *
   * @param move in m, either sign; the turns carry the sign of the move
   * @param pitch move per turn in m, above zero
   */
  public static double turns(double move, double pitch) {
    requirePitch(pitch);
    return move / pitch;
  }

  private static void requirePitch(double pitch) {
    if (!(pitch > 0) || Double.isInfinite(pitch)) {
      throw new IllegalArgumentException("pitch of a screw must be above zero, is " + pitch);
    }
  }
}
