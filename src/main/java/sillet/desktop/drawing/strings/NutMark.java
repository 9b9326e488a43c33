package sillet.desktop.drawing.strings;

/**
 * A nut edge that shall move. The way is too short for the scale of the strip: an arrow of one
 * length shows where to, the figure says how far.
 *
 * @param row the string, counted from 0; for a nut that moves as one, any in the middle
 * @param figure millimetres without sign, as written
 * @param towardBridge else away from it
 */
public record NutMark(int row, String figure, boolean towardBridge) {}
