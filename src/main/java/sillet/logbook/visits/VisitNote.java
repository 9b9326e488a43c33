package sillet.logbook.visits;

import java.time.Instant;

/**
 * Something written down.
 *
 * @param at when
 * @param kind what it is for
 * @param text the words
 */
public record VisitNote(Instant at, NoteKind kind, String text) {}
