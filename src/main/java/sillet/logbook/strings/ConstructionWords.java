package sillet.logbook.strings;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import sillet.acoustics.wire.Construction;

/** The words of the files for how a string is made, as in {@code plain-steel}. */
public final class ConstructionWords {
  private ConstructionWords() {}

  /**
   * The word for a construction.
   *
   * @param construction how a string is made
   * @return stable word of files and logbook
   */
  public static String of(Construction construction) {
    return construction.name().toLowerCase(Locale.ROOT).replace('_', '-');
  }

  /**
   * The construction for a word.
   *
   * @param word as of {@link #of}, case does not matter
   * @return the construction, or nothing if there is no such word
   */
  public static Optional<Construction> find(String word) {
    String asked = word.strip().toLowerCase(Locale.ROOT);
    return Arrays.stream(Construction.values()).filter(c -> of(c).equals(asked)).findFirst();
  }

  /**
   * Tells whether a string has a wrap around a core.
   *
   * @param construction how it is made
   * @return true if it is wound
   */
  public static boolean wound(Construction construction) {
    return switch (construction) {
      case WOUND_STEEL, WOUND_NICKEL, WOUND_BRONZE, WOUND_NYLON -> true;
      case PLAIN_STEEL, PLAIN_NYLON, PLAIN_FLUOROCARBON, PLAIN_GUT -> false;
    };
  }
}
