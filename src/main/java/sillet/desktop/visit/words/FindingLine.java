package sillet.desktop.visit.words;

import java.util.List;

/**
 * Something a saddle does not cure, or that must be known before one is touched.
 *
 * @param strings numbers of the strings it is about, in order
 * @param head its name
 * @param sentence what was found
 * @param atSaddle it shows at the saddle, else at the notes that were read
 */
public record FindingLine(List<Integer> strings, String head, String sentence, boolean atSaddle) {
  public FindingLine {
    strings = List.copyOf(strings);
  }
}
