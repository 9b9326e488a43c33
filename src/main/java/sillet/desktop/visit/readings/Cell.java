package sillet.desktop.visit.readings;

/**
 * One place of the entry grid.
 *
 * @param string 1 on the treble side
 * @param fret 0 for the open string
 */
public record Cell(int string, int fret) {}
