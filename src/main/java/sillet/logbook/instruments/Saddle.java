package sillet.logbook.instruments;

import org.jspecify.annotations.Nullable;

/**
 * The saddles of an instrument.
 *
 * @param kind how the strings end at the bridge
 * @param screwPitchMm way of a saddle per turn, millimetres; null where there is no screw or it was
 *     not measured
 * @param screwSense what clockwise does
 * @param thicknessMm of a one-piece saddle, millimetres; null otherwise
 */
public record Saddle(
    SaddleKind kind,
    @Nullable Double screwPitchMm,
    ScrewSense screwSense,
    @Nullable Double thicknessMm) {}
