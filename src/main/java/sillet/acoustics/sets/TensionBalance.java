package sillet.acoustics.sets;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.forecast.StringLoad;
import sillet.acoustics.forecast.Stringing;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;

/**
 * How evenly the strings of a set pull.
 *
 * <p>Equal tension is one way to balance a set and no rule: T = mu (2 L f)^2 for a string without
 * stiffness, and the mean of the set is what every string would pull if all pulled alike with the
 * same load on the neck.
 *
 * @param loads of the strings, string 1 first, at least one
 */
public record TensionBalance(List<StringLoad> loads) {

  /** Copies the loads and refuses, as the caller's bug, none at all. */
  public TensionBalance {
    loads = List.copyOf(loads);
    if (loads.isEmpty()) {
      throw new IllegalArgumentException("a set has at least one string");
    }
  }

  /**
   * The balance of a set at its tuning and scale.
   *
   * @param strings string 1 first, at least one
   * @return not solved where a string cannot be brought to its pitch; the reason names the string
   */
  public static Outcome<TensionBalance> of(List<Stringing> strings) {
    List<StringLoad> loads = new ArrayList<>();
    for (Stringing string : strings) {
      Outcome<StringLoad> load = StringLoad.of(string);
      if (load instanceof Solved<StringLoad> solved) {
        loads.add(solved.value());
      } else if (load instanceof NotSolved<StringLoad> not) {
        return Outcome.notSolved("string " + (loads.size() + 1) + ": " + not.because());
      }
    }
    return Outcome.solved(new TensionBalance(loads));
  }

  /** Sum of the tensions in N: the load on the neck. */
  public double total() {
    return loads.stream().mapToDouble(StringLoad::tension).sum();
  }

  /** Standard deviation of the sum in N, the strings' own deviations taken as independent. */
  public double totalSd() {
    return Math.sqrt(loads.stream().mapToDouble(load -> load.tensionSd() * load.tensionSd()).sum());
  }

  /** Equal tension: the mean in N. */
  public double mean() {
    return total() / loads.size();
  }

  /**
   * How far a string is from equal tension.
   *
   * @param string place in the list, 0 for string 1
   * @return as a share of the mean: 0.1 pulls a tenth more than the mean
   */
  public double deviation(int string) {
    return loads.get(string).tension() / mean() - 1;
  }
}
