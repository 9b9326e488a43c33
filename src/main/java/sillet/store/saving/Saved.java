package sillet.store.saving;

import java.time.Instant;

/**
 * An action that is on the disk.
 *
 * @param sequence its number, from 1 without gaps
 * @param at when it was saved, to the microsecond
 */
public record Saved(long sequence, Instant at) {}
