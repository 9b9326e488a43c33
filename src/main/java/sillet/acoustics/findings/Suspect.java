package sillet.acoustics.findings;

import java.util.Arrays;
import java.util.List;

/**
 * A cause that the readings speak for.
 *
 * @param kind what is suspected
 * @param string from 0; {@link #NONE} = all strings
 * @param fret {@link #NONE} = no fret
 * @param slanted whether a fret's error turns its sign over across the board
 * @param amount m, or cents
 * @param sd standard deviation of the amount, same unit
 * @param gain what the cause takes off chi-square
 * @param enough the gain from which it is believed
 * @param effect how it enters the problem
 */
record Suspect(
    Kind kind,
    int string,
    int fret,
    boolean slanted,
    double amount,
    double sd,
    double gain,
    double enough,
    Effect effect) {
  static final int NONE = -1;

  /** How far the gain goes beyond what is asked. */
  double excess() {
    return gain - enough;
  }

  boolean sameAs(Suspect other) {
    return kind == other.kind && string == other.string && fret == other.fret;
  }

  /** How a cause enters the problem once it is believed. */
  sealed interface Effect {
    LinearNeck in(LinearNeck neck);
  }

  /** Of known shape and any amount. */
  record Shapes(List<double[]> shapes) implements Effect {
    static Shapes of(double[]... shapes) {
      return new Shapes(Arrays.asList(shapes));
    }

    @Override
    public LinearNeck in(LinearNeck neck) {
      LinearNeck with = neck;
      for (double[] shape : shapes) {
        with = with.with(shape);
      }
      return with;
    }
  }

  /** Without a shape: these rows are trusted so many times less. */
  static final class Doubt implements Effect {
    private final boolean[] rows;
    private final double times;

    Doubt(boolean[] rows, double times) {
      this.rows = rows;
      this.times = times;
    }

    @Override
    public LinearNeck in(LinearNeck neck) {
      double[] sd = new double[rows.length];
      for (int i = 0; i < sd.length; i++) {
        sd[i] = rows[i] ? times * neck.sd(i) : neck.sd(i);
      }
      return neck.withSd(sd);
    }
  }
}
