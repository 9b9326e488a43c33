package sillet.acoustics.estimate;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import sillet.acoustics.readings.FretReading;

/** The unknowns of an instrument, each once. */
final class Unknowns {
  private final List<Unknown> all = new ArrayList<>();
  private final Map<List<Object>, Integer> places = new HashMap<>();
  private final int[] frets = new int[FretReading.LAST_FRET + 1];

  Unknowns() {
    Arrays.fill(frets, -1);
  }

  /**
   * Place of the unknown, which is made where there is none for this kind, string and circumstance.
   */
  int place(Unknown.Kind kind, int string, Object circumstance, double sd) {
    return places.computeIfAbsent(
        List.of(kind, string, circumstance),
        unused -> {
          all.add(new Unknown(kind, string, 0, sd));
          return all.size() - 1;
        });
  }

  int fret(int fret) {
    if (frets[fret] < 0) {
      frets[fret] = all.size();
      all.add(new Unknown(Unknown.Kind.FRET, Unknown.SHARED, fret, Expectations.FRET_PLACE));
    }
    return frets[fret];
  }

  /** Place of a fret's unknown, -1 where it was never read. */
  int placeOfFret(int fret) {
    return fret < frets.length ? frets[fret] : -1;
  }

  int placeOf(Unknown.Kind kind, int string, Object circumstance) {
    return places.getOrDefault(List.of(kind, string, circumstance), -1);
  }

  Unknown at(int place) {
    return all.get(place);
  }

  int count() {
    return all.size();
  }

  List<Unknown> all() {
    return List.copyOf(all);
  }

  double[] sds() {
    return all.stream().mapToDouble(Unknown::sd).toArray();
  }
}
