package sillet.logbook.visits;

import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.MoveAdvice;

/**
 * One string in one pass: what was read, what that asks for, what was done, and what came of it.
 *
 * @param pass round, from 1
 * @param string with its readings of this pass; no readings while it has not been read
 * @param advice what the readings ask for; null while it has not been read
 * @param madeMm what the saddle was really moved after this pass, positive away from the neck; null
 *     if it was not
 * @param predictedCents fret 12 after the move that was made, by the model; null where nothing was
 *     moved or read
 * @param proof what this pass says of the move before it; null in the first pass or where nothing
 *     was moved
 */
public record StringPass(
    int pass,
    BenchString string,
    @Nullable MoveAdvice advice,
    @Nullable Double madeMm,
    @Nullable Double predictedCents,
    @Nullable MoveProof proof) {}
