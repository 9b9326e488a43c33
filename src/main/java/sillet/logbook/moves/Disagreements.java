package sillet.logbook.moves;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import sillet.acoustics.readings.TrySpread;
import sillet.logbook.text.Message;
import sillet.logbook.units.Figures;
import sillet.logbook.units.Tries;

/** Notes whose tries do not agree with each other. */
final class Disagreements {
  /**
   * Tries of one note that lie so many standard deviations apart are not of one note: 1 in 2000.
   */
  private static final double APART = 5;

  private Disagreements() {}

  /** A note and the sentence that says what is odd about its tries. */
  record Odd(int fret, Message said) {}

  static List<Odd> of(BenchString string) {
    List<Odd> odd = new ArrayList<>();
    for (Map.Entry<Integer, Tries> entry : string.readings().frets().entrySet()) {
      Tries tries = entry.getValue();
      TrySpread spread = BenchEvidence.spread(tries, string.readings());
      String fret = Integer.toString(entry.getKey());
      OptionalInt wild = spread.wildTry();
      if (wild.isPresent()) {
        odd.add(new Odd(entry.getKey(), wild(tries, wild.getAsInt(), fret)));
      } else if (range(tries) > APART * Math.max(string.readings().sdCents(), tries.roundingSd())) {
        String apart = Figures.fixed(range(tries), 1);
        odd.add(new Odd(entry.getKey(), Message.of("move.tries-apart", fret, apart)));
      }
    }
    return odd;
  }

  private static Message wild(Tries tries, int index, String fret) {
    var one = tries.cents().get(index);
    return Message.of(
        "move.wild-try",
        Integer.toString(index + 1),
        fret,
        Figures.fixed(one.value(), one.decimals()));
  }

  private static double range(Tries tries) {
    double[] cents = tries.values();
    return Arrays.stream(cents).max().orElseThrow() - Arrays.stream(cents).min().orElseThrow();
  }
}
