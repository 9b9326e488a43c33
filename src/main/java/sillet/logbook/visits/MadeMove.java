package sillet.logbook.visits;

import java.time.Instant;
import org.jspecify.annotations.Nullable;

/**
 * What was really done to a saddle after a pass.
 *
 * @param pass the round whose readings asked for it
 * @param string number
 * @param saddleMm positive away from the neck
 * @param turns of the screw as made, without sign, null where none was turned
 * @param nutMm positive toward the bridge, null where the nut was left alone
 * @param at when
 */
public record MadeMove(
    int pass,
    int string,
    double saddleMm,
    @Nullable Double turns,
    @Nullable Double nutMm,
    Instant at) {}
