/**
 * The look of the window: themes, type, text size and the names of the style classes. Uses JavaFX
 * and the AtlantaFX style sheets, nothing of the shop. Sizes in style sheets are em; one em is 14
 * px at a text size of 100 %.
 */
@NullMarked
package sillet.desktop.theme;

import org.jspecify.annotations.NullMarked;
