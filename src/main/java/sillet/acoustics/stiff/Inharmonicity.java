package sillet.acoustics.stiff;

import sillet.acoustics.pitch.Cents;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.wire.StringConstants;

/**
 * How far the partials of a string stand above whole multiples of its fundamental.
 *
 * <p>Partial m of a string with the coefficient {@code inharmonicity} sounds at m f0 sqrt(1 +
 * inharmonicity m^2). Valid for pinned ends; clamping shifts all partials nearly alike and hardly
 * changes their distances. Arguments are expected finite and above zero; others give NaN or
 * infinity as the arithmetic has it.
 */
public final class Inharmonicity {

  private Inharmonicity() {}

  /**
   * pi^2 EI / (T L^2), for any string; for a round wire the same as {@link #fletcher}.
   *
   * @param tension in N
   * @param length in m
   */
  public static double of(StringConstants constants, double tension, double length) {
    return square(Math.PI) * constants.bendingStiffness() / (tension * square(length));
  }

  /**
   * pi^3 E d^4 / (64 T L^2): H. Fletcher, J. Acoust. Soc. Am. 36, 203 (1964), as quoted by public
   * texts.
   *
   * @param modulus in Pa
   * @param diameter of the wire, or of the core, in m
   */
  public static double fletcher(double modulus, double diameter, double tension, double length) {
    return Math.pow(Math.PI, 3) * modulus * Math.pow(diameter, 4) / (64 * tension * square(length));
  }

  /**
   * pi E A^2 mu f^2 / T^2, which needs neither length nor diameter: R. P. Feynman, letter of 1961,
   * in Physics Today 62(12), 46 (2009).
   *
   * @param area in m2
   * @param unitMass in kg/m
   * @param hz fundamental of the string without stiffness
   */
  public static double feynman(
      double modulus, double area, double unitMass, double hz, double tension) {
    return Math.PI * modulus * square(area) * unitMass * square(hz) / square(tension);
  }

  /**
   * Rossing's A = pi^3 r^4 E / (8 T L^2) in f_n = n f_1 (1 + (n^2 - 1) A), half of Fletcher's
   * coefficient.
   */
  public static double rossing(double modulus, double radius, double tension, double length) {
    return Math.pow(Math.PI, 3) * Math.pow(radius, 4) * modulus / (8 * tension * square(length));
  }

  /**
   * Young's constant (C / 2) pi^2 E / (64 density) in m2/s2: a plain wire's partial n stands
   * constant x n^2 d^2 / (f0^2 L^4) cents sharp. R. W. Young, J. Acoust. Soc. Am. 24, 267 (1952)
   * printed 3.4e13 for d and L in cm (from memory); cm2/s2 are 1e-4 m2/s2.
   */
  public static double youngConstant(double modulus, double density) {
    return Cents.PER_UNIT / 2 * square(Math.PI) * modulus / (64 * density);
  }

  /**
   * Cents by which partial {@code m} is sharp of m times the sounding fundamental: 600 log2((1 + B
   * m^2) / (1 + B)).
   */
  public static double partialSharpness(double inharmonicity, int m) {
    return Cents.ofRatio((1 + inharmonicity * m * m) / (1 + inharmonicity)) / 2;
  }

  /** The coefficient that makes partial {@code m} sharp by {@code cents}; m at least 2. */
  public static double fromSharpness(double cents, int m) {
    double ratio = square(Cents.toRatio(cents));
    return (ratio - 1) / ((double) m * m - ratio);
  }

  /**
   * Cents by which the harmonic over fret 12 is sharp of twice the open string, about 1.5 C B. Both
   * serve as references for a fretted note; they differ by this much.
   */
  public static double harmonicAgainstTwiceOpen(double inharmonicity) {
    return partialSharpness(inharmonicity, 2);
  }

  /**
   * Coefficient of the same string at fret {@code fret}: it grows as 2^(n/6). I. Barbancho et al.,
   * IEEE TASLP 20 (2012), as quoted by J. M. Hjerrild, M. G. Christensen, ICASSP 2019.
   */
  public static double atFret(double openInharmonicity, int fret) {
    return openInharmonicity * EqualTemperament.ratio(2 * fret);
  }

  /**
   * Thickness in m of the round core that a measured coefficient speaks of: (64 T L^2 B / (pi^3
   * E))^(1/4).
   */
  public static double coreFrom(
      double inharmonicity, double modulus, double tension, double length) {
    double fourth =
        64 * tension * square(length) * inharmonicity / (Math.pow(Math.PI, 3) * modulus);
    return Math.sqrt(Math.sqrt(fourth));
  }

  private static double square(double x) {
    return x * x;
  }
}
