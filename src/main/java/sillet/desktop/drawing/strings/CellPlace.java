package sillet.desktop.drawing.strings;

/**
 * Where a cell belongs.
 *
 * @param row string, counted from 0
 * @param neckFret counted along the neck
 */
public record CellPlace(int row, int neckFret) {}
