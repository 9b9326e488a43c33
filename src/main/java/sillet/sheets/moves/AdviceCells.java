package sillet.sheets.moves;

import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.Set;
import java.util.stream.Collectors;
import sillet.logbook.moves.Direction;
import sillet.logbook.moves.Finding;
import sillet.logbook.moves.FindingReport;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;

/** How an advice stands in the cells of a sheet. */
public final class AdviceCells {
  /** Decimals of a move: finer than a hand can set. */
  public static final int MM_DECIMALS = 3;

  /** Decimals of cents and of turns. */
  public static final int CENTS_DECIMALS = 2;

  private AdviceCells() {}

  /** The way a move goes, as it is written: one that is written as zero goes nowhere. */
  public static String direction(double saddleMm) {
    String written = Figures.fixed(saddleMm, MM_DECIMALS);
    Direction direction =
        Double.parseDouble(written) == 0
            ? Direction.STAY
            : saddleMm > 0 ? Direction.AWAY : Direction.TOWARD;
    return direction.word();
  }

  /** Causes, in an order that never changes. */
  public static String findings(MoveAdvice advice) {
    return advice.findings().stream()
        .sorted(Comparator.comparing(FindingReport::kind))
        .map(FindingReport::word)
        .distinct()
        .collect(Collectors.joining(";"));
  }

  /**
   * The sentences for people, one after the other: what puts the move itself in doubt, the move,
   * then what else was found.
   */
  public static String note(MoveAdvice advice, Texts texts) {
    Set<Message> said = new LinkedHashSet<>();
    advice.findings().stream().filter(AdviceCells::doubtful).forEach(one -> say(one, said));
    said.addAll(advice.notes());
    advice.findings().forEach(one -> say(one, said));
    return sentences(said, texts);
  }

  /** A suspect reading or string is looked at before anything is moved. */
  private static boolean doubtful(FindingReport finding) {
    return finding.kind() == Finding.READING || finding.kind() == Finding.STRING;
  }

  private static void say(FindingReport finding, Set<Message> said) {
    said.add(finding.evidence());
    said.add(finding.whatToDo());
    Message caution = finding.caution();
    if (caution != null) {
      said.add(caution);
    }
  }

  /** Sentences one after the other, in the signs of a file: no true minus. */
  public static String sentences(Collection<Message> said, Texts texts) {
    return said.stream().map(texts::say).collect(Collectors.joining(" ")).replace('\u2212', '-');
  }
}
