package sillet.logbook.visits;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.BenchHistory;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.FindingReport;
import sillet.logbook.moves.InstrumentAdvice;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.moves.MoveFigures;

/**
 * A whole visit reckoned through: every pass, every string, each pass proving the moves of the one
 * before.
 */
public final class VisitMoves {
  private final StringChains chains;
  private final AimChoice aim;
  private final MoveAdvisor advisor;

  private VisitMoves(StringChains chains, AimChoice aim, MoveAdvisor advisor) {
    this.chains = chains;
    this.aim = aim;
    this.advisor = advisor;
  }

  /**
   * Reckons a visit by itself, for what was chosen to become true.
   *
   * @param record everything the logbook holds of it
   * @param advisor with the shop's own limits
   * @return the passes in order, at least one; in each the strings in order, string 1 first
   */
  public static List<List<StringPass>> of(VisitRecord record, MoveAdvisor advisor) {
    return passes(record, InstrumentPast.NONE, advisor).stream().map(VisitPass::strings).toList();
  }

  /**
   * Reckons a visit with what earlier ones have taught of the instrument.
   *
   * @param record everything the logbook holds of it
   * @param past what came before
   * @param advisor with the shop's own limits
   * @return the passes in order, at least one
   */
  public static List<VisitPass> passes(
      VisitRecord record, InstrumentPast past, MoveAdvisor advisor) {
    return new VisitMoves(new StringChains(past, record), record.aim().aim(), advisor).passes();
  }

  /**
   * Every string with all that was read of it up to the last pass of a visit, as it stands now.
   *
   * @param record everything the logbook holds of the visit
   * @param past what came before
   * @return a history for each string, string 1 first
   */
  public static List<BenchHistory> histories(VisitRecord record, InstrumentPast past) {
    StringChains chains = new StringChains(past, record);
    return chains.upTo(chains.visit().lastPass());
  }

  /**
   * From how many visits the histories come.
   *
   * @param record everything the logbook holds of the visit
   * @param past what came before
   * @return visits with a reading that still teaches
   */
  public static int visitsRead(VisitRecord record, InstrumentPast past) {
    return new StringChains(past, record).visitsRead();
  }

  /**
   * The frets at which a visit was read.
   *
   * @param record everything the logbook holds of it
   * @return 1 to 24 in order, the open string left out
   */
  public static List<Integer> fretsRead(VisitRecord record) {
    return new PassReadings(record.readings()).fretsRead();
  }

  private List<VisitPass> passes() {
    List<VisitPass> passes = new ArrayList<>();
    for (int pass = 1; pass <= chains.visit().lastPass(); pass++) {
      VisitPass before = passes.isEmpty() ? null : passes.get(passes.size() - 1);
      passes.add(pass(pass, before == null ? null : before.strings()));
    }
    return passes;
  }

  private VisitPass pass(int pass, @Nullable List<StringPass> before) {
    List<BenchString> bench = chains.visit().in(pass);
    if (bench.stream().allMatch(string -> string.readings().frets().isEmpty())) {
      InstrumentAdvice none = new InstrumentAdvice(List.of(), List.of(), null);
      return new VisitPass(strings(pass, bench, none, before), List.of(), null);
    }
    InstrumentAdvice advice = advisor.adviseOn(chains.upTo(pass), aim);
    List<StringPass> strings = strings(pass, bench, advice, before);
    return new VisitPass(strings, findings(advice, strings), advice.bridge());
  }

  /** Those of the instrument, and what the proofs add. */
  private static List<FindingReport> findings(InstrumentAdvice advice, List<StringPass> strings) {
    List<FindingReport> found = new ArrayList<>(advice.findings());
    for (StringPass string : strings) {
      MoveAdvice said = string.advice();
      if (said != null) {
        said.findings().stream().filter(f -> !found.contains(f)).forEach(found::add);
      }
    }
    return found;
  }

  private List<StringPass> strings(
      int pass,
      List<BenchString> bench,
      InstrumentAdvice advice,
      @Nullable List<StringPass> before) {
    Map<Integer, MoveAdvice> byNumber = new HashMap<>();
    advice.strings().forEach(one -> byNumber.put(one.string().string().number(), one));
    List<StringPass> result = new ArrayList<>();
    for (int i = 0; i < bench.size(); i++) {
      BenchString string = bench.get(i);
      int number = string.string().number();
      StringPass earlier = before == null ? null : before.get(i);
      MoveAdvice first = string.readings().frets().isEmpty() ? null : byNumber.get(number);
      boolean nutMoved = chains.visit().nutMovedMm(number, pass - 1, pass) != 0;
      ProvedAdvice proved = ProvedAdvice.of(first, nutMoved ? null : earlier, aim);
      Double made = chains.visit().madeMm(pass, number);
      MoveAdvice last = proved.advice();
      result.add(new StringPass(pass, string, last, made, predicted(last, made), proved.proof()));
    }
    return result;
  }

  private static @Nullable Double predicted(@Nullable MoveAdvice advice, @Nullable Double made) {
    MoveFigures figures = advice == null ? null : advice.figures();
    return figures == null || made == null
        ? null
        : Double.valueOf(figures.cents12Before() + made * figures.centsPerMm());
  }
}
