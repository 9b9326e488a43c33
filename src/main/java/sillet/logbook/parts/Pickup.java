package sillet.logbook.parts;

import org.jspecify.annotations.Nullable;

/**
 * A pickup where it stands, and how high.
 *
 * @param name what the shop calls it, neck or bridge for example
 * @param fromBridgeMm from the saddle to the middle of the pickup along the string, millimetres
 * @param trebleMm gap from string 1 to the pickup with the last fret pressed, millimetres; null if
 *     not measured
 * @param bassMm the same at the lowest string
 */
public record Pickup(
    String name, double fromBridgeMm, @Nullable Double trebleMm, @Nullable Double bassMm) {}
