package sillet.acoustics.forecast;

import sillet.acoustics.estimate.Figure;

/**
 * What a change makes of one string.
 *
 * @param now how hard it pulls
 * @param then how hard it will pull
 * @param feel against how it feels now
 * @param againstEqual against the mean tension of the set then: a set of equal tension is all
 *     {@link Feel#SAME}
 * @param cents12Now fret 12 now, against the change's reference, cents
 * @param cents12IfLeft fret 12 then if saddle and nut stay where they are, cents
 * @param saddleMove m from where the saddle stands now to where the string then wants it, positive
 *     away from the neck
 * @param nutMove m, positive toward the bridge; 0 where the nut stays
 * @param setbackThen m from the saddle's nominal place to where the string then wants it
 * @param cents12After what fret 12 may have once saddle and nut were moved: the aim's best value (0
 *     for an aim at fret 12), and how far off it may come out, cents
 */
public record StringForecast(
    StringLoad now,
    StringLoad then,
    Feel feel,
    Feel againstEqual,
    Figure cents12Now,
    Figure cents12IfLeft,
    Figure saddleMove,
    Figure nutMove,
    Figure setbackThen,
    Figure cents12After) {}
