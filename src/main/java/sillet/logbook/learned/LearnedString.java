package sillet.logbook.learned;

/**
 * What has been learned of one string.
 *
 * @param string number
 * @param stretchFactor how much stiffer in stretch it is than the packet lets expect; 1 is as
 *     expected
 * @param gapAtFirstMm its gap over fret 1, as the readings and the checks have it together,
 *     millimetres
 * @param passes how often it has been read through
 */
public record LearnedString(
    int string, LearnedFigure stretchFactor, LearnedFigure gapAtFirstMm, int passes) {}
