package sillet.logbook.visits;

import java.time.Instant;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.readings.Reference;
import sillet.logbook.units.Tries;

/**
 * What the tuner said of one note; kept for ever, a newer one of the same note stands beside it.
 *
 * @param pass round it belongs to, from 1
 * @param string number
 * @param fret 0 for the open string itself, else 1 to 24
 * @param tries as typed; null takes back what was read before
 * @param against what the note was compared with
 * @param sdCents standard deviation of one reading
 * @param at when
 */
public record Reading(
    int pass,
    int string,
    int fret,
    @Nullable Tries tries,
    Reference against,
    double sdCents,
    Instant at) {}
