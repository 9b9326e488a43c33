/**
 * What every drawing of Sillet is made with: the pen, the colours and the em that the style sheets
 * hand to a canvas, and the marks that stand beside words. Pure drawing from plain values: JavaFX
 * and the names of the style classes, nothing of the shop and no text of its own. Sizes are em
 * where a name says so, else px; lengths on an instrument are millimetres.
 */
@NullMarked
package sillet.desktop.drawing;

import org.jspecify.annotations.NullMarked;
