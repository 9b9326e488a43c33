package sillet.logbook.learned;

/**
 * A fret that is not quite in its place.
 *
 * @param fret number
 * @param offMm positive toward the bridge, millimetres
 */
public record LearnedFret(int fret, LearnedFigure offMm) {}
