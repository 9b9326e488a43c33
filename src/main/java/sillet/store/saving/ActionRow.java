package sillet.store.saving;

import java.time.Instant;

/**
 * An action as it is recorded; enough to do it again.
 *
 * @param sequence its number, from 1 without gaps
 * @param at when it was saved
 * @param technician who did it
 * @param name what kind of action
 * @param form version of how the values are written
 * @param values JSON
 */
public record ActionRow(
    long sequence, Instant at, String technician, String name, int form, String values) {}
