package sillet.logbook.parts;

/**
 * A fret where it was measured.
 *
 * @param fret its number, from 1
 * @param fromNutMm from the nut's edge to the middle of the fret, millimetres
 * @param typed what was typed, kept because rounding would show
 */
public record FretPlace(int fret, double fromNutMm, String typed) {}
