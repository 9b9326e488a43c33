package sillet.desktop.drawing;

/** A drawing that takes the width there is and keeps a height of its own, in em. */
public abstract class DrawnBand extends Drawn {
  private final double usualEm;
  private final double leastEm;
  private final double heightEm;

  /**
   * A band.
   *
   * @param usualEm width it asks for
   * @param leastEm width it does not go under
   * @param heightEm its height
   */
  protected DrawnBand(double usualEm, double leastEm, double heightEm) {
    this.usualEm = usualEm;
    this.leastEm = leastEm;
    this.heightEm = heightEm;
    setMouseTransparent(true);
  }

  @Override
  protected double computePrefWidth(double height) {
    return em() * usualEm;
  }

  @Override
  protected double computeMinWidth(double height) {
    return em() * leastEm;
  }

  @Override
  protected double computePrefHeight(double width) {
    return Math.round(em() * heightEm);
  }

  @Override
  protected double computeMinHeight(double width) {
    return computePrefHeight(width);
  }
}
