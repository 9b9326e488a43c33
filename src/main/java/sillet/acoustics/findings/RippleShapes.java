package sillet.acoustics.findings;

import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.EqualTemperament;

/**
 * What an uneven string does to its notes: unit mass times 1 + e sin(2 pi z / wave + phase), z from
 * the saddle, moves the pitch of a sounding length L by -e/2 times the mean of that sine weighted
 * with the shape of the motion, 2 sin^2(pi z / L): first-order perturbation (Rayleigh). Cents are
 * those of the fretted note less those of the open string.
 */
final class RippleShapes {
  /** Waves tried, as shares of the scale, a step of a fifth apart. */
  private static final double[] WAVES = {
    0.15, 0.18, 0.22, 0.26, 0.31, 0.37, 0.45, 0.54, 0.65, 0.78, 0.93
  };

  private RippleShapes() {}

  static int count() {
    return WAVES.length;
  }

  /** Cents at a fret for a swing e = 1 that is a sine (or a cosine) at the saddle. */
  static double cents(int wave, boolean cosine, int fret) {
    double sounding = 1 / EqualTemperament.ratio(fret);
    return -Cents.PER_UNIT / 2 * (mean(wave, cosine, sounding) - mean(wave, cosine, 1));
  }

  private static double mean(int wave, boolean cosine, double length) {
    double swing = 2 * Math.PI / WAVES[wave];
    double shape = 2 * Math.PI / length;
    return plain(swing * length, cosine)
        - 0.5 * plain((swing + shape) * length, cosine)
        - 0.5 * plain((swing - shape) * length, cosine);
  }

  /** Mean of sin or cos from 0 to an angle. */
  private static double plain(double angle, boolean cosine) {
    if (Math.abs(angle) < 1e-6) {
      return cosine ? 1 : 0;
    }
    return cosine ? Math.sin(angle) / angle : (1 - Math.cos(angle)) / angle;
  }
}
