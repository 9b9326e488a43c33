package sillet.sheets.csv;

import java.util.Locale;
import sillet.logbook.text.Message;
import sillet.logbook.text.Quoted;

/**
 * Where in a file something stands.
 *
 * @param kind how exactly the place is known
 * @param line as an editor counts it, from 1; 0 for the file as a whole
 * @param column of the cell, or character in the line, from 1; 0 for a whole line or file
 * @param header name of the cell's column, empty where there is none
 */
public record Place(Kind kind, long line, long column, String header) {
  /** How exactly a place is known. */
  public enum Kind {
    FILE,
    LINE,
    CHARACTER,
    CELL
  }

  public static Place file() {
    return new Place(Kind.FILE, 0, 0, "");
  }

  public static Place line(long line) {
    return new Place(Kind.LINE, line, 0, "");
  }

  public static Place character(long line, long character) {
    return new Place(Kind.CHARACTER, line, character, "");
  }

  public static Place cell(long line, long column, String header) {
    return new Place(Kind.CELL, line, column, header);
  }

  /** Says where a sentence belongs. */
  Message before(String sentence) {
    String lineNo = String.format(Locale.ROOT, "%d", line);
    String columnNo = String.format(Locale.ROOT, "%d", column);
    return switch (kind) {
      case FILE -> Message.of("sheet.at-file", sentence);
      case LINE -> Message.of("sheet.at-line", lineNo, sentence);
      case CHARACTER -> Message.of("sheet.at-character", lineNo, columnNo, sentence);
      case CELL ->
          header.isEmpty()
              ? Message.of("sheet.at-column", lineNo, columnNo, sentence)
              : Message.of("sheet.at-cell", lineNo, columnNo, Quoted.of(header), sentence);
    };
  }
}
