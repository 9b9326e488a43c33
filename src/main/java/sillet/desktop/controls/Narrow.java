package sillet.desktop.controls;

import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.css.PseudoClass;
import javafx.scene.control.Label;
import javafx.scene.layout.Region;
import javafx.scene.text.Font;

/**
 * Whether a page is narrow, counted in em and not in pixels: a large text on a small screen is the
 * same as a usual text on half of it.
 */
public final class Narrow {
  /** Below this width a page drops what it can do without. */
  public static final double BELOW_EM = 80;

  private static final PseudoClass NARROW = PseudoClass.getPseudoClass("narrow");

  private final ReadOnlyBooleanWrapper narrow = new ReadOnlyBooleanWrapper(this, "narrow", false);
  private final Region page;
  private final Label measure = new Label();

  /** Watches a page; it carries the state {@code narrow} for the style sheets too. */
  public Narrow(Region page) {
    this.page = page;
    page.widthProperty().addListener((property, before, now) -> judge());
    measure.fontProperty().addListener((property, before, now) -> judge());
  }

  /** A label without words that must stand somewhere in the page: it knows how large an em is. */
  public Label measure() {
    measure.setManaged(false);
    measure.setVisible(false);
    return measure;
  }

  public ReadOnlyBooleanProperty narrowProperty() {
    return narrow.getReadOnlyProperty();
  }

  private void judge() {
    Font font = measure.getFont();
    boolean now = page.getWidth() > 0 && page.getWidth() < BELOW_EM * font.getSize();
    narrow.set(now);
    page.pseudoClassStateChanged(NARROW, now);
  }
}
