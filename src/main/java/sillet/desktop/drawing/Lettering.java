package sillet.desktop.drawing;

import javafx.scene.paint.Color;
import javafx.scene.text.Font;
import javafx.scene.text.FontWeight;
import javafx.scene.text.Text;
import javafx.scene.text.TextAlignment;
import sillet.desktop.theme.Fonts;

/**
 * How a text is set on a drawing.
 *
 * @param sizeEm type size in em
 * @param bold heading, current place, figure to act on
 * @param colour fill
 * @param alignment which side of its point the text lies on
 */
public record Lettering(double sizeEm, boolean bold, Color colour, TextAlignment alignment) {
  /** Text that begins at its point. */
  public static Lettering plain(double sizeEm, Color colour) {
    return new Lettering(sizeEm, false, colour, TextAlignment.LEFT);
  }

  /** Bold text that begins at its point. */
  public static Lettering bold(double sizeEm, Color colour) {
    return new Lettering(sizeEm, true, colour, TextAlignment.LEFT);
  }

  /** The same, standing around its point. */
  public Lettering centred() {
    return new Lettering(sizeEm, bold, colour, TextAlignment.CENTER);
  }

  /** The same, ending at its point. */
  public Lettering endingThere() {
    return new Lettering(sizeEm, bold, colour, TextAlignment.RIGHT);
  }

  Font font(double emPx) {
    return Font.font(Fonts.FAMILY, bold ? FontWeight.BOLD : FontWeight.NORMAL, sizeEm * emPx);
  }

  /** Width of a text in px when one em is so many px. */
  public double width(String text, double emPx) {
    Text measured = new Text(text);
    measured.setFont(font(emPx));
    return measured.getLayoutBounds().getWidth();
  }
}
