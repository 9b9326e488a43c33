package sillet.acoustics.bench;

import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.virtual.Kind;
import sillet.acoustics.wire.StringSpec;

/**
 * One string as it lies on the bench.
 *
 * @param kind of instrument
 * @param truth what only the instrument knows
 * @param spec what is known from the packet
 * @param typed what the technician typed, as a lie with the saddle at its nominal place
 * @param heightsMeasured whether the clearances in it were measured or are the usual ones
 * @param against what the technician reads against
 * @param found where the saddle stands, which nobody knows
 */
record BenchString(
    Kind kind,
    Truth truth,
    StringSpec spec,
    StringLie typed,
    boolean heightsMeasured,
    Reference against,
    double found) {}
