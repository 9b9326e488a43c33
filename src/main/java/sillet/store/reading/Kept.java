package sillet.store.reading;

/**
 * A record as it is kept, with the version that a change has to name.
 *
 * @param what the record
 * @param version how often it was written
 * @param <T> its type
 */
public record Kept<T>(T what, int version) {}
