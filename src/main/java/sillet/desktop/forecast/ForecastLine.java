package sillet.desktop.forecast;

import java.util.List;

/**
 * What a change asks of one string, in words and figures.
 *
 * @param tensionNow newtons; empty where not known
 * @param tensionThen newtons
 * @param feel against now
 * @param breaking share of the breaking tension; empty where not known
 * @param leftAlone cents at fret 12 with the saddle where it stands
 * @param move size and direction of the saddle, or that it can be left
 * @param interval of the move; empty without one
 * @param nut move of the nut; empty where it stays
 * @param needsHand the string asks for a hand: drawn in pencil
 * @param notes further sentences
 */
record ForecastLine(
    String tensionNow,
    String tensionThen,
    String feel,
    String breaking,
    String leftAlone,
    String move,
    String interval,
    String nut,
    boolean needsHand,
    List<String> notes) {
  ForecastLine {
    notes = List.copyOf(notes);
  }
}
