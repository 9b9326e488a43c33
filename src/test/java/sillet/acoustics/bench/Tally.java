package sillet.acoustics.bench;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/** True errors after moves, whether intervals held, what was found, counted together. */
final class Tally {
  private final List<Double> errors = new ArrayList<>();
  private final List<Double> widths = new ArrayList<>();
  private double after;
  private double best;
  private int held;
  private int found;
  private int asked;

  /** What a move left, in cents. */
  void error(double left) {
    errors.add(Math.abs(left));
  }

  /** Root mean square over the neck after a move, and after the best possible one. */
  void rms(double left, double atBest) {
    error(left);
    after += left;
    best += atBest;
  }

  /** An interval and what it was to hold. */
  void interval(double low, double truth, double high) {
    widths.add(high - low);
    if (low <= truth && truth <= high) {
      held++;
    }
  }

  /** One question and whether the answer was yes. */
  void ask(boolean yes) {
    asked++;
    if (yes) {
      found++;
    }
  }

  void addAll(Tally other) {
    errors.addAll(other.errors);
    widths.addAll(other.widths);
    after += other.after;
    best += other.best;
    held += other.held;
    found += other.found;
    asked += other.asked;
  }

  int size() {
    return Math.max(errors.size(), asked);
  }

  int intervals() {
    return widths.size();
  }

  double median() {
    return quantile(errors, 0.5);
  }

  double ninetyFifth() {
    return quantile(errors, 0.95);
  }

  /** Mean rms after the moves over mean rms at the best ones. */
  double ratio() {
    return after / best;
  }

  /** Mean rms at the best moves, cents. */
  double meanBest() {
    return best / errors.size();
  }

  /** Median width of the interval. */
  double width() {
    return quantile(widths, 0.5);
  }

  /** Share of intervals that held the truth. */
  double coverage() {
    return held / (double) widths.size();
  }

  /** Share of questions answered yes. */
  double share() {
    return found / (double) asked;
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
