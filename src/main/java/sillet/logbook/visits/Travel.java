package sillet.logbook.visits;

import org.jspecify.annotations.Nullable;

/**
 * Room at one saddle as the instrument came in.
 *
 * @param string number
 * @param backMm left away from the neck, millimetres, null if not measured
 * @param forwardMm left toward the neck, millimetres, null if not measured
 */
public record Travel(int string, @Nullable Double backMm, @Nullable Double forwardMm) {}
