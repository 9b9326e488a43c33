package sillet.logbook.visits;

import java.time.Instant;

/**
 * Something done.
 *
 * @param at when
 * @param technician who
 * @param text what, in the shop's words
 */
public record WorkLine(Instant at, String technician, String text) {}
