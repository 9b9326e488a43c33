package sillet.sheets.job;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.visits.StringPass;

/**
 * One string through all passes of a visit.
 *
 * @param passes the first one first
 */
public record StringPasses(List<StringPass> passes) {
  private static final int OCTAVE = 12;

  /** Copies the list. */
  public StringPasses {
    passes = List.copyOf(passes);
  }

  /**
   * Turns passes of strings into strings with passes.
   *
   * @param passes in each the same strings in the same order
   */
  public static List<StringPasses> of(List<List<StringPass>> passes) {
    int strings = passes.isEmpty() ? 0 : passes.get(0).size();
    List<StringPasses> result = new ArrayList<>();
    for (int i = 0; i < strings; i++) {
      int place = i;
      result.add(new StringPasses(passes.stream().map(pass -> pass.get(place)).toList()));
    }
    return result;
  }

  /** What fret 12 read in a pass, against its reference; null if it was not read. */
  public @Nullable Double cents12(int pass) {
    StringPass one = passes.get(pass);
    MoveAdvice advice = one.advice();
    MoveFigures figures = advice == null ? null : advice.figures();
    boolean read = one.string().readings().frets().containsKey(OCTAVE);
    return figures == null || !read ? null : Double.valueOf(figures.cents12Before());
  }

  /** What fret 12 read after a pass and its move; null if nobody has read it since. */
  public @Nullable Double leftAfter(int pass) {
    for (int later = pass + 1; later < passes.size(); later++) {
      Double cents = cents12(later);
      if (cents != null) {
        return cents;
      }
    }
    boolean moved = IntStream.range(pass, passes.size()).anyMatch(i -> wasMoved(i));
    return moved ? null : cents12(pass);
  }

  /** What fret 12 read first; null if it never was. */
  public @Nullable Double received() {
    for (int pass = 0; pass < passes.size(); pass++) {
      if (cents12(pass) != null) {
        return cents12(pass);
      }
    }
    return null;
  }

  /** What fret 12 read last, if nothing was moved since. */
  public @Nullable Double left() {
    for (int pass = passes.size() - 1; pass >= 0; pass--) {
      if (wasMoved(pass)) {
        return null;
      }
      if (cents12(pass) != null) {
        return cents12(pass);
      }
    }
    return null;
  }

  /** How far the saddle was moved in all, positive away from the neck; null if it was not. */
  public @Nullable Double movedMm() {
    return passes.stream()
        .map(StringPass::madeMm)
        .filter(mm -> mm != null)
        .reduce(Double::sum)
        .orElse(null);
  }

  /** In how many passes anything of it was read. */
  public int passesRead() {
    return (int) passes.stream().filter(p -> !p.string().readings().frets().isEmpty()).count();
  }

  /** Whether anything was read or moved in a pass. */
  public boolean wasWorkedOn(int pass) {
    return wasMoved(pass) || !passes.get(pass).string().readings().frets().isEmpty();
  }

  private boolean wasMoved(int pass) {
    return passes.get(pass).madeMm() != null;
  }
}
