package sillet.acoustics.bench;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/** True errors after a move and whether the interval held, counted together. */
final class Tally {
  private final List<Double> errors = new ArrayList<>();
  private final List<Double> widths = new ArrayList<>();
  private int held;

  void add(double error, double low, double best, double high) {
    errors.add(Math.abs(error));
    widths.add(high - low);
    if (low <= best && best <= high) {
      held++;
    }
  }

  void addAll(Tally other) {
    errors.addAll(other.errors);
    widths.addAll(other.widths);
    held += other.held;
  }

  int size() {
    return errors.size();
  }

  double median() {
    return quantile(errors, 0.5);
  }

  double ninetyFifth() {
    return quantile(errors, 0.95);
  }

  /** Median width of the interval, metres. */
  double width() {
    return quantile(widths, 0.5);
  }

  /** Share of intervals that held the best place. */
  double coverage() {
    return held / (double) errors.size();
  }

  private static double quantile(List<Double> values, double share) {
    List<Double> sorted = new ArrayList<>(values);
    Collections.sort(sorted);
    double place = share * (sorted.size() - 1);
    int below = (int) place;
    int above = Math.min(below + 1, sorted.size() - 1);
    return sorted.get(below) + (place - below) * (sorted.get(above) - sorted.get(below));
  }
}
