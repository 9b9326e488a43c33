package sillet.desktop.drawing;

import javafx.scene.paint.Color;

/**
 * The colours a drawing has at hand, by meaning.
 *
 * @param ink everything known
 * @param soft second text, scales, travel ends
 * @param line frets, past values
 * @param hair ornament only
 * @param pencil what still needs a hand
 * @param sheet the ground of a panel
 * @param field the ground where one types
 * @param bench the ground of the window
 * @param lamp the ground of what is lit: focus and selection
 */
public record Inks(
    Color ink,
    Color soft,
    Color line,
    Color hair,
    Color pencil,
    Color sheet,
    Color field,
    Color bench,
    Color lamp) {}
