package sillet.desktop.drawing;

/** Bars at the left edge of a reading cell, one a try; a wild try's bar is long and pencil. */
public final class Tries extends Glyph {
  private static final int MOST = 5;
  private static final double WIDTH_EM = 0.86;
  private static final double BAR_EM = 0.43;
  private static final double STEP_EM = 0.43;

  private int count;
  private int wild;

  /**
   * Bars for so many tries.
   *
   * @param count tries of this reading; under two nothing is drawn
   * @param wild place of the odd try, from 0; negative for none
   * @param says the tries in words, for screen readers
   */
  public Tries(int count, int wild, String says) {
    super(says);
    this.count = count;
    this.wild = wild;
  }

  /** Shows other tries. */
  public void show(int newCount, int newWild, String says) {
    count = newCount;
    wild = newWild;
    changed(says);
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    int bars = Math.min(MOST, count);
    if (bars < 2) {
      return;
    }
    double step = Math.min(pen.em(STEP_EM), height / bars);
    double top = height / 2 - (bars - 1) * step / 2;
    int odd = Math.min(wild, bars - 1);
    for (int bar = 0; bar < bars; bar++) {
      boolean isOdd = bar == odd;
      Stroke stroke =
          new Stroke(isOdd ? pen.inks().pencil() : pen.inks().ink(), pen.atLeast(2, 0.14));
      pen.level(0, isOdd ? width : pen.em(BAR_EM), top + bar * step, stroke);
    }
  }

  @Override
  protected double widthPx() {
    return em() * (wild >= 0 ? WIDTH_EM : BAR_EM);
  }

  @Override
  protected double heightPx() {
    return em() * 1.43;
  }
}
