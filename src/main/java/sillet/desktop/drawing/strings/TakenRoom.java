package sillet.desktop.drawing.strings;

import java.util.ArrayList;
import java.util.List;

/** Which stretches of a line hold text already, so that nothing is written over. */
final class TakenRoom {
  private record Stretch(double from, double to) {}

  private final List<Stretch> taken = new ArrayList<>();

  void take(double middle, double width) {
    taken.add(new Stretch(middle - width / 2, middle + width / 2));
  }

  boolean takeIfFree(double middle, double width, double margin) {
    double from = middle - width / 2;
    double to = middle + width / 2;
    if (taken.stream().anyMatch(s -> from < s.to() + margin && to > s.from() - margin)) {
      return false;
    }
    take(middle, width);
    return true;
  }
}
