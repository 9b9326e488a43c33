package sillet.acoustics.findings;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * Finds causes one after the other, strongest first, each taken into account before the next is
 * looked for, so that one fault does not hide another or make it seem to be there; at the end each
 * is tried again beside all the others.
 */
final class Search {
  private static final int MOST = 8;

  private static final List<CauseTrial> TRIALS =
      List.of(
          new ReadingTrial(),
          new StringTrial(),
          new SlotTrial(),
          new NutPlaceTrial(),
          new FretTrial());

  private Search() {}

  /** What stands, in no order. */
  static List<Suspect> of(NeckCase notes) {
    List<Suspect> found = new ArrayList<>();
    LinearNeck neck = notes.linear();
    while (found.size() < MOST) {
      Optional<Suspect> next = strongest(notes, neck, found);
      if (next.isEmpty()) {
        break;
      }
      found.add(next.get());
      neck = next.get().effect().in(neck);
    }
    return found.size() < 2 ? found : again(notes, found);
  }

  private static Optional<Suspect> strongest(
      NeckCase notes, LinearNeck neck, List<Suspect> besides) {
    return TRIALS.stream()
        .flatMap(trial -> trial.look(notes, neck).stream())
        .filter(one -> besides.stream().noneMatch(one::sameAs))
        .max(Comparator.comparingDouble(Suspect::excess));
  }

  /** Each cause beside all the others: with its amount there, or dropped. */
  private static List<Suspect> again(NeckCase notes, List<Suspect> found) {
    List<Suspect> standing = new ArrayList<>(found);
    for (int i = standing.size() - 1; i >= 0; i--) {
      Suspect one = standing.get(i);
      LinearNeck others = notes.linear();
      for (Suspect other : standing) {
        others = other.sameAs(one) ? others : other.effect().in(others);
      }
      Optional<Suspect> still = again(notes, others, one);
      if (still.isPresent()) {
        standing.set(i, still.get());
      } else {
        standing.remove(i);
      }
    }
    return standing;
  }

  private static Optional<Suspect> again(NeckCase notes, LinearNeck others, Suspect one) {
    return TRIALS.stream()
        .flatMap(trial -> trial.look(notes, others).stream())
        .filter(one::sameAs)
        .max(Comparator.comparingDouble(Suspect::excess));
  }
}
