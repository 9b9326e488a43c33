package sillet.desktop.visit.words;

import java.util.List;

/**
 * Something a saddle does not cure, or that must be known before one is touched.
 *
 * @param strings numbers of the strings it is about, in order; empty for all of them
 * @param spot where it shows
 * @param head its name
 * @param sentence what was found
 * @param toDo what to do first; empty where the sentence says it
 * @param worth what its cure takes away; empty where that is not known
 * @param caution where the hand can hurt; empty for none
 */
public record FindingLine(
    List<Integer> strings,
    FindingSpot spot,
    String head,
    String sentence,
    String toDo,
    String worth,
    String caution) {
  public FindingLine {
    strings = List.copyOf(strings);
  }

  /** One of which only the sentence is known. */
  static FindingLine said(List<Integer> strings, FindingSpot spot, String head, String sentence) {
    return new FindingLine(strings, spot, head, sentence, "", "", "");
  }
}
