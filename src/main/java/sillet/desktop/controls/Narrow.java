package sillet.desktop.controls;

import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.css.PseudoClass;
import javafx.scene.control.Label;
import javafx.scene.layout.Region;

/**
 * Whether a page is narrow, counted in em and not in pixels: a large text on a small screen is the
 * same as a usual text on half of it.
 */
public final class Narrow {
  /** Below this width a page drops what it can do without. */
  public static final double BELOW_EM = 80;

  /** Below this width only what cannot be left out stays. */
  public static final double TIGHT_BELOW_EM = 56;

  private static final PseudoClass NARROW = PseudoClass.getPseudoClass("narrow");
  private static final PseudoClass TIGHT = PseudoClass.getPseudoClass("tight");

  private final ReadOnlyBooleanWrapper narrow = new ReadOnlyBooleanWrapper(this, "narrow", false);
  private final ReadOnlyBooleanWrapper tight = new ReadOnlyBooleanWrapper(this, "tight", false);
  private final Region page;
  private final Label measure = new Label();

  /**
   * Watches a page; it carries the states {@code narrow} and {@code tight} for the style sheets
   * too.
   */
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

  public ReadOnlyBooleanProperty tightProperty() {
    return tight.getReadOnlyProperty();
  }

  private void judge() {
    double widthEm = page.getWidth() / measure.getFont().getSize();
    boolean laidOut = widthEm > 0;
    narrow.set(laidOut && widthEm < BELOW_EM);
    tight.set(laidOut && widthEm < TIGHT_BELOW_EM);
    page.pseudoClassStateChanged(NARROW, narrow.get());
    page.pseudoClassStateChanged(TIGHT, tight.get());
  }
}
