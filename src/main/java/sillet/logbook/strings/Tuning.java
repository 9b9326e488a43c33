package sillet.logbook.strings;

import java.util.ArrayList;
import java.util.List;
import sillet.logbook.units.Pitch;

/**
 * A tuning: a pitch for each string, string 1 first, with the reference it is meant at. Strings may
 * be re-entrant.
 *
 * @param name the shop's name for it
 * @param pitches notes with octave or hertz, string 1 first
 * @param offsetCents small offsets on purpose, one for each string, positive is sharp
 */
public record Tuning(String name, List<String> pitches, List<Double> offsetCents) {

  /** Copies the lists and checks that they go together. */
  public Tuning {
    pitches = List.copyOf(pitches);
    offsetCents = List.copyOf(offsetCents);
    if (pitches.size() != offsetCents.size()) {
      throw new IllegalArgumentException("one offset for each pitch");
    }
  }

  /**
   * A tuning without offsets.
   *
   * @param name the shop's name for it
   * @param pitches notes with octave, string 1 first
   * @return the tuning
   */
  public static Tuning of(String name, List<String> pitches) {
    return new Tuning(name, pitches, pitches.stream().map(p -> 0.0).toList());
  }

  /**
   * The pitches at a reference.
   *
   * @param referenceHz what A4 is, hertz
   * @return one for each string, offsets in their frequencies
   */
  public List<Pitch> at(double referenceHz) {
    List<Pitch> result = new ArrayList<>();
    for (int i = 0; i < pitches.size(); i++) {
      result.add(Pitch.parse(pitches.get(i), referenceHz).shifted(offsetCents.get(i)));
    }
    return result;
  }
}
