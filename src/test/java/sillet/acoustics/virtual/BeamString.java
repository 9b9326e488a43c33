package sillet.acoustics.virtual;

import java.util.function.DoubleUnaryOperator;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;

/**
 * A tensioned beam, EI w'''' - T w'' = mu omega^2 w, between two ends that may turn and yield:
 * exact frequencies from the phase each end gives the wave.
 *
 * <p>Near an end w = sin(k2 x + phi) + c exp(-k1 x). Turning: EI w'' = K w'. Yielding: w = X (T w'
 * - EI w'''). The two near fields do not meet: exp(-k1 L) is below 1e-50 for every string here.
 */
final class BeamString {
  private static final int MOST_EVALUATIONS = 200;
  private static final double WIDTH = 0.08;

  private final double bending;
  private final StringEnd one;
  private final StringEnd other;

  BeamString(double bending, StringEnd one, StringEnd other) {
    this.bending = bending;
    this.one = one;
    this.other = other;
  }

  /** Hertz of mode q under a tension. */
  double hz(double tension, double unitMass, double length, int mode) {
    double ideal = mode * Math.PI / length * Math.sqrt(tension / unitMass);
    double omega =
        root(w -> misfit(w, tension, unitMass, length, mode), ideal * (1 - WIDTH), ideal * 1.5);
    return omega / (2 * Math.PI);
  }

  /** Tension under which the first mode has the frequency; unit mass as a function of tension. */
  double tension(double hz, DoubleUnaryOperator unitMass, double length) {
    double omega = 2 * Math.PI * hz;
    double speed = 2 * length * hz;
    double ideal = unitMass.applyAsDouble(0) * speed * speed;
    return root(
        t -> misfit(omega, t, unitMass.applyAsDouble(t), length, 1), ideal * 0.5, ideal * 1.2);
  }

  private double misfit(double omega, double tension, double unitMass, double length, int mode) {
    double inertia = unitMass * omega * omega;
    double k2squared =
        2 * inertia / (tension + Math.sqrt(tension * tension + 4 * bending * inertia));
    double k2 = Math.sqrt(k2squared);
    double k1 = Math.sqrt(k2squared + tension / bending);
    double reach = Math.sqrt(bending / tension);
    return k2 * length
        + phase(one, omega, k1, k2, reach)
        + phase(other, omega, k1, k2, reach)
        - mode * Math.PI;
  }

  /** The phase phi that an end gives; negative where the end shortens the string. */
  private double phase(StringEnd end, double omega, double k1, double k2, double reach) {
    double clamp = end.clamp();
    double give = end.give().at(omega) * bending;
    // c = fromCos cos(phi) + fromSin sin(phi), from the balance of moments
    double divisor = (1 - clamp) * reach * k1 * k1 + clamp * k1;
    double fromCos = clamp * k2 / divisor;
    double fromSin = (1 - clamp) * reach * k2 * k2 / divisor;
    // sin(phi) + c = X EI (k1^2 k2 cos(phi) + k1 k2^2 c), from the balance of forces
    double held = 1 - give * k1 * k2 * k2;
    return Math.atan((give * k1 * k1 * k2 - held * fromCos) / (1 + held * fromSin));
  }

  private static double root(DoubleUnaryOperator function, double low, double high) {
    return new BracketingNthOrderBrentSolver(1e-14, 1e-13, 5)
        .solve(MOST_EVALUATIONS, function::applyAsDouble, low, high);
  }
}
