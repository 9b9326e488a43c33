package sillet.desktop.shell;

import java.util.ArrayDeque;
import java.util.Deque;

/** Where one was before, so that one key leads back. The first place is the bench. */
final class Trail {
  private static final int LONGEST = 50;

  private final Deque<Place> before = new ArrayDeque<>();
  private Place here = new Place.Bench();

  Place here() {
    return here;
  }

  /** Goes on; going where one is adds no step. */
  void to(Place place) {
    if (place.equals(here)) {
      return;
    }
    // taking in is a task and no place: once it is left one does not come back into it
    if (!(here instanceof Place.TakeIn)) {
      before.push(here);
    }
    while (before.size() > LONGEST) {
      before.removeLast();
    }
    here = place;
  }

  /** One step back; stays at the bench where there is none. */
  Place back() {
    here = before.isEmpty() ? new Place.Bench() : before.pop();
    return here;
  }
}
