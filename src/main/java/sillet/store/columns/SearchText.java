package sillet.store.columns;

import java.text.Normalizer;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.regex.Pattern;

/**
 * What people look for, made comparable: small letters without accents, space made single. The same
 * is done to what they type, so that both meet.
 */
public final class SearchText {
  private static final Pattern MARKS = Pattern.compile("\\p{M}+");
  private static final Pattern SPACE = Pattern.compile("\\s+");
  private static final Pattern NO_DIGIT = Pattern.compile("\\D+");
  private static final Pattern PHONE = Pattern.compile("[+()/.\\-\\d\\s]{3,}");
  private static final int SHORTEST_PHONE = 3;
  private static final String[] LETTERS = {
    "\u00df", "ss", "\u00e6", "ae", "\u0153", "oe", "\u00f8", "o", "\u0142", "l", "\u0111", "d",
    "\u00f0", "d", "\u00fe", "th", "\u0131", "i"
  };

  private SearchText() {}

  /**
   * Folds texts into one key.
   *
   * @param texts in any letters
   * @return small letters without accents, one space between words
   */
  public static String fold(String... texts) {
    String joined = Normalizer.normalize(String.join(" ", texts), Normalizer.Form.NFKD);
    String small = MARKS.matcher(joined).replaceAll("").toLowerCase(Locale.ROOT);
    for (int i = 0; i < LETTERS.length; i += 2) {
      small = small.replace(LETTERS[i], LETTERS[i + 1]);
    }
    return SPACE.matcher(small).replaceAll(" ").strip();
  }

  /**
   * The words of what was typed, each of which has to be found.
   *
   * @param typed any text
   * @return folded words, none for a blank text
   */
  public static List<String> words(String typed) {
    String folded = fold(typed);
    return folded.isEmpty() ? List.of() : Arrays.asList(folded.split(" ", -1));
  }

  /**
   * The bare digits of a text.
   *
   * @param text a telephone number as people write it
   * @return its digits
   */
  public static String digits(String text) {
    return NO_DIGIT.matcher(text).replaceAll("");
  }

  /**
   * Tells whether a text could be a telephone number, however it is divided.
   *
   * @param typed any text
   * @return true for digits and the signs between them only
   */
  public static boolean phone(String typed) {
    return PHONE.matcher(typed.strip()).matches() && digits(typed).length() >= SHORTEST_PHONE;
  }

  /**
   * A pattern that finds a text anywhere, to be used with {@code ESCAPE '!'}.
   *
   * @param text what to find, its signs taken as they are
   * @return the pattern
   */
  public static String anywhere(String text) {
    return "%" + text.replace("!", "!!").replace("%", "!%").replace("_", "!_") + "%";
  }
}
