package sillet.sheets.bench;

import java.util.Comparator;
import java.util.List;

/** Finds what somebody most likely meant to write. */
final class Nearest {
  private static final int LONGEST = 40;
  private static final int A_BEGINNING = 3;

  private Nearest() {}

  /** The name that begins so, else the one that takes the fewest changes of letters. */
  static String of(String written, List<String> names) {
    String asked = written.length() > LONGEST ? written.substring(0, LONGEST) : written;
    return names.stream()
        .filter(name -> asked.length() >= A_BEGINNING && name.startsWith(asked))
        .findFirst()
        .or(() -> names.stream().min(Comparator.comparingInt(name -> changes(asked, name))))
        .orElseThrow();
  }

  /** Letters put in, left out or exchanged on the way from one word to the other (Levenshtein). */
  static int changes(String from, String to) {
    int[] row = new int[to.length() + 1];
    for (int j = 0; j <= to.length(); j++) {
      row[j] = j;
    }
    for (int i = 1; i <= from.length(); i++) {
      int diagonal = row[0];
      row[0] = i;
      for (int j = 1; j <= to.length(); j++) {
        int exchanged = diagonal + (from.charAt(i - 1) == to.charAt(j - 1) ? 0 : 1);
        diagonal = row[j];
        row[j] = Math.min(exchanged, 1 + Math.min(row[j], row[j - 1]));
      }
    }
    return row[to.length()];
  }
}
