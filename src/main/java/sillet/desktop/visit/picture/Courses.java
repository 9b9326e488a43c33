package sillet.desktop.visit.picture;

import java.util.ArrayList;
import java.util.List;
import sillet.logbook.strings.FittedString;

/**
 * Finds out which strings lie in pairs: on an instrument with many strings, when each two
 * neighbours are tuned in unison or in octaves.
 */
final class Courses {
  private static final int FEWEST_STRINGS = 8;

  /** How far from a whole number of octaves still counts, in octaves: half a semitone. */
  private static final double NEAR_OCTAVES = 1 / 24.0;

  private Courses() {}

  /** The course of each string, from 1; all 0 where strings stand alone. */
  static List<Integer> of(List<FittedString> strings) {
    boolean paired = strings.size() >= FEWEST_STRINGS && strings.size() % 2 == 0;
    for (int i = 0; paired && i < strings.size(); i += 2) {
      paired = together(strings.get(i), strings.get(i + 1));
    }
    List<Integer> courses = new ArrayList<>();
    for (int i = 0; i < strings.size(); i++) {
      courses.add(paired ? i / 2 + 1 : 0);
    }
    return courses;
  }

  private static boolean together(FittedString one, FittedString other) {
    double octaves = Math.log(one.pitch().hz() / other.pitch().hz()) / Math.log(2);
    return Math.abs(octaves) < 1 + NEAR_OCTAVES
        && Math.abs(octaves - Math.rint(octaves)) < NEAR_OCTAVES;
  }
}
