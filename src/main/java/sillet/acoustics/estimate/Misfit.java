package sillet.acoustics.estimate;

/**
 * How one reading agrees with the estimate.
 *
 * @param string index of the string, 0 first
 * @param pass of the occasion
 * @param fret that was read
 * @param residual reading minus the estimated curve (fret places included, the note's own straying
 *     not), cents
 * @param sd of that residual by reading and by the curve's own error, cents
 * @param weight the robust loss gave it: 1 = as believed as its sd says, near 0 = wild
 */
public record Misfit(int string, int pass, int fret, double residual, double sd, double weight) {}
