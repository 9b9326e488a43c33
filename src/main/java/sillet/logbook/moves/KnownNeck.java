package sillet.logbook.moves;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.NeckEstimator;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;

/**
 * An instrument as its readings tell it, all strings together. A string that no tension brings to
 * its pitch is left out and says why; it does not stop the others.
 */
public final class KnownNeck {
  private final List<BenchHistory> strings;
  private final List<Integer> places;
  private final List<String> reasons;
  private final @Nullable NeckEstimate estimate;

  private KnownNeck(
      List<BenchHistory> strings,
      List<Integer> places,
      List<String> reasons,
      @Nullable NeckEstimate estimate) {
    this.strings = strings;
    this.places = places;
    this.reasons = reasons;
    this.estimate = estimate;
  }

  /**
   * Estimates an instrument.
   *
   * @param strings all of the same instrument, string 1 first; at least one
   * @return what is known of it
   */
  public static KnownNeck of(List<BenchHistory> strings) {
    if (NeckEstimator.estimate(BenchEvidence.of(strings)) instanceof Solved<NeckEstimate> solved) {
      List<Integer> places = new ArrayList<>();
      List<String> reasons = new ArrayList<>();
      for (int i = 0; i < strings.size(); i++) {
        places.add(i);
        reasons.add("");
      }
      return new KnownNeck(strings, places, reasons, solved.value());
    }
    return withoutThoseThatFail(strings);
  }

  private static KnownNeck withoutThoseThatFail(List<BenchHistory> strings) {
    List<BenchHistory> sound = new ArrayList<>();
    List<Integer> places = new ArrayList<>();
    List<String> reasons = new ArrayList<>();
    for (BenchHistory string : strings) {
      String because = because(NeckEstimator.estimate(BenchEvidence.of(List.of(string))));
      reasons.add(because);
      places.add(because.isEmpty() ? sound.size() : -1);
      if (because.isEmpty()) {
        sound.add(string);
      }
    }
    if (sound.isEmpty()) {
      return new KnownNeck(strings, places, reasons, null);
    }
    Outcome<NeckEstimate> together = NeckEstimator.estimate(BenchEvidence.of(sound));
    String because = because(together);
    NeckEstimate estimate = together instanceof Solved<NeckEstimate> s ? s.value() : null;
    return new KnownNeck(
        strings,
        estimate == null ? strings.stream().map(s -> -1).toList() : places,
        reasons.stream().map(r -> r.isEmpty() ? because : r).toList(),
        estimate);
  }

  private static String because(Outcome<NeckEstimate> outcome) {
    return outcome instanceof NotSolved<NeckEstimate> not ? not.because() : "";
  }

  /**
   * The strings, also those that could not be estimated.
   *
   * @return string 1 first
   */
  public List<BenchHistory> strings() {
    return strings;
  }

  /**
   * The estimate.
   *
   * @return of the strings that have a place in it; null if there is none
   */
  public @Nullable NeckEstimate estimate() {
    return estimate;
  }

  /**
   * Where a string stands in the estimate.
   *
   * @param index of the string in {@link #strings}
   * @return its place from 0, or -1 if it could not be estimated
   */
  public int place(int index) {
    return places.get(index);
  }

  /**
   * Why a string could not be estimated.
   *
   * @param index of the string in {@link #strings}
   * @return a reason in words, empty where it could
   */
  public String because(int index) {
    return reasons.get(index);
  }

  /**
   * The number of the string that has a place in the estimate.
   *
   * @param place from 0
   * @return string number
   */
  public int number(int place) {
    return strings.get(places.indexOf(place)).now().string().number();
  }
}
