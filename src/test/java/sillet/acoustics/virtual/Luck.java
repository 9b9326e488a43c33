package sillet.acoustics.virtual;

import java.util.Random;

/** Seeded chance: the same seed makes the same instruments. */
public final class Luck {
  private static final double MOST_SD = 3;

  private final Random random;

  public Luck(long seed) {
    this.random = new Random(seed);
  }

  /** Normal, cut at three standard deviations. */
  public double normal(double mean, double sd) {
    double draw = random.nextGaussian();
    while (Math.abs(draw) > MOST_SD) {
      draw = random.nextGaussian();
    }
    return mean + sd * draw;
  }

  /** Normal without a cut, for readings. */
  public double noise(double sd) {
    return sd * random.nextGaussian();
  }

  public double between(double least, double most) {
    return least + (most - least) * random.nextDouble();
  }

  /** Millimetres of a range, in metres. */
  double millimetres(Kind.Range range) {
    return between(range.least(), range.most()) / 1000;
  }

  public boolean chance(double probability) {
    return random.nextDouble() < probability;
  }

  double[] normals(int count, double sd) {
    double[] drawn = new double[count];
    for (int i = 0; i < count; i++) {
      drawn[i] = normal(0, sd);
    }
    return drawn;
  }
}
