package sillet.sheets.csv;

import java.io.IOException;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Message;

/**
 * The lines of a file with their numbers. A line may end in a line feed, a carriage return or both.
 * A line that is too long is passed over without being held.
 */
final class Lines {
  /** Longest line, and longest row over several lines, in characters. */
  static final int LONGEST = 32_768;

  private final Characters characters;
  private final StringBuilder text = new StringBuilder(256);
  private boolean afterReturn;
  private long number;
  private boolean tooLong;
  private boolean ended;

  Lines(Characters characters) {
    this.characters = characters;
  }

  /** The number of the line read last. */
  long number() {
    return number;
  }

  /** Whether the line read last was too long, so that only its beginning was returned. */
  boolean tooLong() {
    return tooLong;
  }

  /** The next line without its end, or null after the last one. */
  @Nullable String next() throws IOException, Unreadable {
    if (ended) {
      return null;
    }
    number++;
    text.setLength(0);
    tooLong = false;
    for (long place = 1; ; place++) {
      int c = characters.read();
      if (c == '\n' && afterReturn) {
        afterReturn = false;
        place--;
        continue;
      }
      afterReturn = c == '\r';
      if (c == '\n' || c == '\r') {
        return text.toString();
      }
      if (c == Characters.END) {
        ended = true;
        return text.length() == 0 ? null : text.toString();
      }
      keep(c, place);
    }
  }

  private void keep(int c, long place) throws Unreadable {
    if (c == Characters.BAD || c == 0) {
      throw new Unreadable(new Remark(Place.character(number, place), notText(c)));
    }
    if (text.length() < LONGEST) {
      text.append((char) c);
    } else {
      tooLong = true;
    }
  }

  private Message notText(int c) {
    if (characters.unmarkedUtf16()) {
      return Message.of("sheet.utf16-unmarked");
    }
    return c == 0
        ? Message.of("sheet.no-text")
        : Message.of("sheet.not-utf8", characters.badBytes());
  }

  /** The limit as it stands in a sentence. */
  static String longest() {
    return String.format(Locale.ROOT, "%d", LONGEST);
  }
}
