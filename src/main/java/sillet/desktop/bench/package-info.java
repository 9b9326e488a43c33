/**
 * The open visits by promised day: what is on the bench and what each of them waits for. Uses
 * controls, drawing and theme, the store and the logbook. Cents are positive for sharp; sizes come
 * from the style sheets, in em.
 */
@NullMarked
package sillet.desktop.bench;

import org.jspecify.annotations.NullMarked;
