package sillet.desktop.drawing.strings;

/**
 * Where the parts of the words stand, in em from the left of their column. Holds no JavaFX types.
 *
 * @param figureRight right edge of turns and mm
 * @param unit begin of "turns"
 * @param direction begin of the direction words
 * @param verdict begin of a verdict's words
 * @param detail begin of interval or reason
 * @param turns type of the turns
 * @param words type of the direction words
 * @param line how the words are set
 */
public record WordColumns(
    double figureRight,
    double unit,
    double direction,
    double verdict,
    double detail,
    double turns,
    double words,
    Line line) {
  /** How the words are set. */
  public enum Line {
    /** Turns and direction above, mm, interval and travel below. */
    TWO,
    /** Everything on one line; the interval is only drawn. */
    ONE,
    /** Direction and place above, mm, interval and travel below. */
    PLACE
  }

  /** The columns for a window's shape and what is drawn. */
  public static WordColumns of(SheetShape shape, StringsPicture picture) {
    SheetMeasures sizes = SheetMeasures.of(shape, picture);
    double turns = sizes.turns();
    double words = sizes.direction();
    if (sizes.tight() && shape != SheetShape.NARROW) {
      return new WordColumns(5.07, 5.07, 5.86, 5.86, 0, turns, words, Line.ONE);
    }
    if (picture.isOnePiece()) {
      return new WordColumns(0, 0, 2.57, 2.57, 7.7, turns, words, Line.PLACE);
    }
    return switch (shape) {
      case NARROW -> new WordColumns(4.33, 4.33, 5.05, 5.05, 5.05, turns, words, Line.TWO);
      case USUAL -> new WordColumns(5, 5.43, 8.6, 2.57, 5.64, turns, words, Line.TWO);
      case WIDE -> new WordColumns(6.1, 6.6, 10.4, 10.4, 7.4, turns, words, Line.TWO);
    };
  }
}
