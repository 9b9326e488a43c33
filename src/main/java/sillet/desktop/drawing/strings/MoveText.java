package sillet.desktop.drawing.strings;

import sillet.desktop.drawing.MarkShape;

/**
 * The words of one string's move or verdict, all handed in; blank where there is none.
 *
 * @param mark arrow or the mark of the verdict
 * @param figure turns as {@code 3¾}, or mm on a sliding saddle
 * @param unit "turns"; blank where the head of the column says it
 * @param words the direction, or the verdict
 * @param mm the move in mm with its unit
 * @param detail the interval, or the reason of the verdict
 * @param left travel left
 * @param place "at" and the place on a one-piece saddle
 * @param needsHand words in pencil: must be read again, cannot be reached
 */
public record MoveText(
    MarkShape mark,
    String figure,
    String unit,
    String words,
    String mm,
    String detail,
    String left,
    Place place,
    boolean needsHand) {
  /**
   * A place measured from the front edge.
   *
   * @param at the word that keeps the place from being read as a distance
   * @param figure mm from the front edge; blank for none
   */
  public record Place(String at, String figure) {
    static final Place NONE = new Place("", "");
  }

  /** A move: arrow, turns, direction. */
  public static MoveText move(MarkShape arrow, String figure, String unit, String direction) {
    return new MoveText(arrow, figure, unit, direction, "", "", "", Place.NONE, false);
  }

  /** A verdict without a move: mark and word. */
  public static MoveText verdict(MarkShape mark, String word) {
    return move(mark, "", "", word);
  }

  /** The same with the line below: mm, interval or reason, travel left. */
  public MoveText below(String mmText, String detailText, String leftText) {
    return new MoveText(mark, figure, unit, words, mmText, detailText, leftText, place, needsHand);
  }

  /** The same with the place from the front edge. */
  public MoveText at(String word, String mmFromFront) {
    return new MoveText(
        mark, figure, unit, words, mm, detail, left, new Place(word, mmFromFront), needsHand);
  }

  /** The same in pencil. */
  public MoveText inPencil() {
    return new MoveText(mark, figure, unit, words, mm, detail, left, place, true);
  }

  boolean isMove() {
    return mark == MarkShape.ARROW_LEFT || mark == MarkShape.ARROW_RIGHT;
  }

  /** All of it as one sentence for screen readers. */
  String aloud() {
    return String.join(" ", words, figure, unit, place.at(), place.figure(), mm, detail, left)
        .replaceAll("\\s+", " ")
        .trim();
  }
}
