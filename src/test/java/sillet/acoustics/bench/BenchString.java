package sillet.acoustics.bench;

import sillet.acoustics.moves.Reference;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.virtual.Kind;

/**
 * One string as it lies on the bench.
 *
 * @param kind of instrument
 * @param truth what only the instrument knows
 * @param typed what the technician typed, as a lie with the saddle at its nominal place
 * @param against what the technician reads against
 * @param found where the saddle stands, which nobody knows
 */
record BenchString(Kind kind, Truth truth, StringLie typed, Reference against, double found) {}
