package sillet.logbook.moves;

import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Message;

/**
 * One cause, with what speaks for it and what to do first.
 *
 * @param kind what it is
 * @param string number of the string it concerns; null where it concerns all
 * @param fret the fret it concerns; null where no single one is meant
 * @param slanted true for a fret that is off one way on the treble and the other way on the bass
 *     side
 * @param worthCents root mean square over frets 1 to 12 that its cure would take away, cents
 * @param evidence one sentence with the figures that speak for it
 * @param whatToDo one sentence: what to do first
 * @param caution where the cure is a one-way cut or a string is under tension; null where nothing
 *     can be hurt
 */
public record FindingReport(
    Finding kind,
    @Nullable Integer string,
    @Nullable Integer fret,
    boolean slanted,
    double worthCents,
    Message evidence,
    Message whatToDo,
    @Nullable Message caution) {

  /**
   * The word of the files.
   *
   * @return for instance {@code nut-high}, a fret with its number as in {@code fret-7}
   */
  public String word() {
    return kind == Finding.FRET && fret != null ? kind.word() + "-" + fret : kind.word();
  }

  /**
   * Tells whether it stands in the row of a string.
   *
   * @param number of the string
   * @return true for its own string, and for every string where it concerns all
   */
  public boolean concerns(int number) {
    return string == null || string == number;
  }
}
