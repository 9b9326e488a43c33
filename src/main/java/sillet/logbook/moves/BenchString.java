package sillet.logbook.moves;

import sillet.logbook.strings.FittedString;

/**
 * One string of one instrument with everything the bench knows of it: what the moves are reckoned
 * from.
 *
 * @param instrument grouping text; strings with the same text share a nut
 * @param string the string on its instrument
 * @param heights how high it lies
 * @param room what saddle and nut can do
 * @param readings what the tuner said
 */
public record BenchString(
    String instrument,
    FittedString string,
    Heights heights,
    SaddleRoom room,
    NoteReadings readings) {}
