package sillet.desktop.controls;

/**
 * Turns of a screw in eighths, as a hand can set them.
 *
 * @param whole full turns
 * @param above the fraction's upper figure, 0 where there is no fraction
 * @param below its lower figure: 2, 4 or 8
 */
public record Eighths(int whole, int above, int below) {
  private static final int PARTS = 8;
  private static final String[] SIGNS = {
    "", "\u215b", "\u00bc", "\u215c", "\u00bd", "\u215d", "\u00be", "\u215e"
  };

  /** The nearest eighth. */
  public static Eighths of(double turns) {
    int parts = (int) Math.round(Math.abs(turns) * PARTS);
    int above = parts % PARTS;
    int below = PARTS;
    while (above != 0 && above % 2 == 0) {
      above /= 2;
      below /= 2;
    }
    return new Eighths(parts / PARTS, above, below);
  }

  /** Less than half an eighth. */
  public boolean none() {
    return whole == 0 && above == 0;
  }

  public double turns() {
    return whole + (double) above / below;
  }

  /** As it is typed, as in {@code 3 3/4}. */
  public String written() {
    if (above == 0) {
      return Integer.toString(whole);
    }
    String fraction = above + "/" + below;
    return whole == 0 ? fraction : whole + " " + fraction;
  }

  /** As it is drawn on the page, with the sign of the fraction. */
  public String drawn() {
    String sign = SIGNS[above * PARTS / below];
    return whole == 0 && above != 0 ? sign : whole + sign;
  }
}
