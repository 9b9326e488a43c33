/**
 * What a screen is handed and what it may ask for: work off the window's thread, another place, a
 * question to the technician, the sign that says what is saved; and the fields people type in. Uses
 * the logbook, the theme and JavaFX; no screen and no shell. Sizes come from the style sheets, in
 * em.
 */
@NullMarked
package sillet.desktop.controls;

import org.jspecify.annotations.NullMarked;
