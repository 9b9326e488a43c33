package sillet.acoustics.estimate;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import sillet.acoustics.readings.FretReading;

/** All readings of an instrument in a row, and which of them were of the same note. */
final class Readings {
  /** One reading. */
  record One(int occasion, int fret, double cents, double sd) {}

  private final List<One> all = new ArrayList<>();
  private final List<int[]> notes;

  Readings(List<OccasionModel> occasions) {
    Map<List<Object>, List<Integer>> byNote = new LinkedHashMap<>();
    for (int i = 0; i < occasions.size(); i++) {
      OccasionModel model = occasions.get(i);
      double hz = model.occasion().lie().openHz();
      for (FretReading reading : model.occasion().readings()) {
        byNote
            .computeIfAbsent(
                List.of(model.string(), reading.fret(), hz), unused -> new ArrayList<>())
            .add(all.size());
        all.add(new One(i, reading.fret(), reading.cents(), reading.sd()));
      }
    }
    notes =
        byNote.values().stream()
            .map(rows -> rows.stream().mapToInt(Integer::intValue).toArray())
            .toList();
  }

  int count() {
    return all.size();
  }

  One at(int row) {
    return all.get(row);
  }

  List<One> all() {
    return all;
  }

  /** Rows of the same note of the same string, read on several occasions. */
  List<int[]> notes() {
    return notes;
  }
}
