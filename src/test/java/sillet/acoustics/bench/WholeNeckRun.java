package sillet.acoustics.bench;

import java.util.List;
import java.util.stream.IntStream;

/**
 * Runs tasks on many instruments, the kinds in turn, on all cores; the same seed, the same score.
 */
record WholeNeckRun(int instruments, long seed, List<Task> tasks) {
  static List<Task> everything() {
    return List.of(new OctaveTask(), new NeckTask(), new FindingTask(), new ForecastTask());
  }

  Score run() {
    List<Score> scores =
        IntStream.range(0, instruments)
            .parallel()
            .mapToObj(number -> score(new Task.Case(seed, number)))
            .toList();
    Score all = new Score();
    scores.forEach(all::addAll);
    return all;
  }

  private Score score(Task.Case one) {
    Score score = new Score();
    tasks.forEach(task -> task.run(one, score));
    return score;
  }
}
