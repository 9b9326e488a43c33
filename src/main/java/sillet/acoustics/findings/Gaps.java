package sillet.acoustics.findings;

import java.util.Arrays;
import sillet.acoustics.estimate.Linear;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.Unknown;

/**
 * Clearances at fret 1 as they were typed: what the estimate counts its unknowns from, and whether
 * a feeler gauge stands behind them.
 */
final class Gaps {
  /** A string's own clearance known better than this was measured, m. */
  private static final double MEASURED = 3e-5;

  private final int[] unknowns;
  private final double[] typed;
  private final double[] sds;

  Gaps(NeckEstimate estimate, Linear linear) {
    int strings = estimate.strings();
    this.unknowns = new int[strings];
    this.typed = new double[strings];
    this.sds = new double[strings];
    double shared = 0;
    for (int k = 0; k < linear.unknowns().size(); k++) {
      Unknown unknown = linear.unknowns().get(k);
      if (unknown.kind() == Unknown.Kind.GAP) {
        if (unknown.string() == Unknown.SHARED) {
          shared += unknown.sd() * linear.point().get(k);
        } else {
          unknowns[unknown.string()] = k;
        }
      }
    }
    for (int string = 0; string < strings; string++) {
      Unknown own = linear.unknowns().get(unknowns[string]);
      double off = own.sd() * linear.point().get(unknowns[string]);
      sds[string] = own.sd();
      typed[string] =
          estimate.lie(string).clearances().atFirst() - off - (measured(string) ? 0 : shared);
    }
  }

  boolean measured(int string) {
    return sds[string] <= MEASURED;
  }

  double sd(int string) {
    return sds[string];
  }

  double typed(int string) {
    return typed[string];
  }

  /** Mean of what was typed; the line of the slots is counted from here. */
  double middle() {
    return Arrays.stream(typed).average().orElse(0);
  }

  /** Whether an unknown is a string's clearance as it was typed last. */
  boolean isLast(int unknown, int string) {
    return unknowns[string] == unknown;
  }

  int unknown(int string) {
    return unknowns[string];
  }
}
