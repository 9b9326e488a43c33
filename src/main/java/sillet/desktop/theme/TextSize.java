package sillet.desktop.theme;

import java.util.Locale;
import javafx.scene.Scene;

/**
 * How large everything is drawn, in percent of the usual size. Style sheets and drawings measure in
 * em, so this one figure moves them all.
 *
 * @param percent 100 to 200
 */
public record TextSize(int percent) {
  public static final int SMALLEST_PERCENT = 100;
  public static final int LARGEST_PERCENT = 200;
  public static final TextSize USUAL = new TextSize(100);

  private static final double USUAL_EM_PX = 14;
  private static final int STEP_PERCENT = 10;

  public TextSize {
    if (percent < SMALLEST_PERCENT || percent > LARGEST_PERCENT) {
      throw new IllegalArgumentException("Text size must lie between 100 and 200 %: " + percent);
    }
  }

  /** The nearest allowed size to a stored or typed figure. */
  public static TextSize nearest(int percent) {
    return new TextSize(Math.max(SMALLEST_PERCENT, Math.min(LARGEST_PERCENT, percent)));
  }

  public TextSize larger() {
    return nearest(percent + STEP_PERCENT);
  }

  public TextSize smaller() {
    return nearest(percent - STEP_PERCENT);
  }

  /** One em in px. */
  public double emPx() {
    return USUAL_EM_PX * percent / 100;
  }

  /**
   * Sets the size at the root of a scene. The inline style of the root is this and nothing else.
   */
  public void applyTo(Scene scene) {
    scene.getRoot().setStyle(String.format(Locale.ROOT, "-fx-font-size: %.2fpx;", emPx()));
  }
}
