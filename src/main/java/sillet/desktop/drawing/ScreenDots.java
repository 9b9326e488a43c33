package sillet.desktop.drawing;

import javafx.stage.Screen;

/** How many px of a drawing make an inch, so that drawings can state their scale. */
public final class ScreenDots {
  /** Taken where a screen does not say. */
  public static final double USUAL_PER_INCH = 96;

  private static final double LEAST = 60;
  private static final double MOST = 400;

  private ScreenDots() {}

  /** Px of an inch on the first screen; 96 where it gives no believable figure. */
  public static double perInch() {
    Screen screen = Screen.getPrimary();
    return believable(screen.getDpi() / screen.getOutputScaleX());
  }

  static double believable(double perInch) {
    return perInch >= LEAST && perInch <= MOST ? perInch : USUAL_PER_INCH;
  }
}
