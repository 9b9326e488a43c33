package sillet.desktop.drawing;

/** Rounding to whole px, the same way everywhere, so that like things stand alike in every row. */
public final class Snap {
  private Snap() {}

  /** The nearest whole px; halves go up. */
  public static double px(double at) {
    return Math.floor(at + 0.5);
  }

  /** The nearest odd number of px: a size that stands evenly about the middle of a pixel. */
  public static double odd(double size) {
    return 2 * Math.floor(size / 2) + 1;
  }
}
