/**
 * The window: opens and closes the logbook, shows one place after the other, keeps theme and text
 * size, and says what is saved. Knows every screen; nothing in the desktop knows it. Uses JavaFX,
 * the store, the logbook, theme, drawing and controls. Sizes come from the style sheets, in em.
 */
@NullMarked
package sillet.desktop.shell;

import org.jspecify.annotations.NullMarked;
