package sillet.acoustics.bench;

import java.util.List;
import java.util.SplittableRandom;
import sillet.acoustics.virtual.Kind;
import sillet.acoustics.virtual.Luck;

/** One line of work on one instrument. */
interface Task {
  void run(Case one, Score score);

  /**
   * The instrument a task builds for itself.
   *
   * @param seed of the whole run
   * @param number of the instrument in it
   */
  record Case(long seed, int number) {
    private static final List<Kind> KINDS = List.of(Kind.values());

    Kind kind() {
      return KINDS.get(number % KINDS.size());
    }

    /** Chance of one purpose, the same whatever other tasks draw. */
    Luck luck(Task task, int purpose) {
      long mixed = seed;
      for (long part : new long[] {number, task.getClass().getSimpleName().hashCode(), purpose}) {
        mixed = new SplittableRandom(mixed * 31 + part).nextLong();
      }
      return new Luck(mixed);
    }
  }
}
