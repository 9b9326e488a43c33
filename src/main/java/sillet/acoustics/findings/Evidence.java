package sillet.acoustics.findings;

/**
 * One number that speaks for a finding.
 *
 * @param measure what it is, with its unit
 * @param fret the fret it belongs to; 0 = none
 * @param value in the measure's unit
 */
public record Evidence(Measure measure, int fret, double value) {

  /** What a number of evidence is. */
  public enum Measure {
    /** How many standard deviations the cause stands out of what is usual. */
    SIGNIFICANCE,
    /** Cents that the cause adds to the note at the fret. */
    CENTS,
    /** Cents by which the reading lies off what all the other readings say. */
    CENTS_OFF,
    /** Standard deviation in cents that such a reading should have about them. */
    CENTS_SD,
    /** The tries of the note disagree: 1. */
    TRIES_DISAGREE,
    /** How many times wider the string's errors are than its readings'. */
    TIMES_WIDER,
    /** Share by which the string's mass seems to swing along its length. */
    MASS_SWING,
    /** Clearance over fret 1 of this string, m. */
    GAP,
    /** Clearance over fret 1 that the other strings let expect here, m. */
    GAP_OF_NEIGHBOURS,
    /** How many strings err to the same side at the fret. */
    STRINGS_AGREEING,
    /** On how many strings the fret was read. */
    STRINGS_READ,
    /** Place of the fret under the first string, m toward the bridge. */
    PLACE_AT_FIRST,
    /** Place of the fret under the last string, m toward the bridge. */
    PLACE_AT_LAST,
    /** Mean cents by which the two frets beside it are off. */
    CENTS_BESIDE,
    /** Clearance over fret 12, m. */
    ACTION,
    /** The shop's target for it, m. */
    TARGET,
    /** Share of the squared error over frets 1 to 12 that the cause explains. */
    SHARE_EXPLAINED
  }
}
