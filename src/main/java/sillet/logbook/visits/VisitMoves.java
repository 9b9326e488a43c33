package sillet.logbook.visits;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.FindingReport;
import sillet.logbook.moves.InstrumentAdvice;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.moves.SaddleRoom;
import sillet.logbook.strings.FittedString;

/**
 * A whole visit reckoned through: every pass, every string, each pass proving the moves of the one
 * before.
 */
public final class VisitMoves {
  private final VisitRecord record;
  private final MoveAdvisor advisor;
  private final PassReadings readings;

  private VisitMoves(VisitRecord record, MoveAdvisor advisor) {
    this.record = record;
    this.advisor = advisor;
    this.readings = new PassReadings(record.readings());
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
    return new VisitMoves(record, advisor).passes();
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
    int last = readings.lastPass(record.moves());
    for (int pass = 1; pass <= last; pass++) {
      passes.add(pass(pass, passes.isEmpty() ? null : passes.get(passes.size() - 1).strings()));
    }
    return passes;
  }

  private VisitPass pass(int pass, @Nullable List<StringPass> before) {
    List<BenchString> bench = bench(pass);
    List<BenchString> read = bench.stream().filter(s -> !s.readings().frets().isEmpty()).toList();
    InstrumentAdvice advice = advisor.advise(read, record.aim().aim());
    List<StringPass> strings = strings(pass, bench, byNumber(advice), before);
    List<FindingReport> found = new ArrayList<>(advice.findings());
    for (StringPass string : strings) {
      MoveAdvice said = string.advice();
      if (said != null) {
        said.findings().stream().filter(f -> !found.contains(f)).forEach(found::add);
      }
    }
    return new VisitPass(strings, found, advice.bridge());
  }

  private List<StringPass> strings(
      int pass,
      List<BenchString> bench,
      Map<Integer, MoveAdvice> advice,
      @Nullable List<StringPass> before) {
    List<StringPass> result = new ArrayList<>();
    for (int i = 0; i < bench.size(); i++) {
      BenchString string = bench.get(i);
      StringPass earlier = before == null ? null : before.get(i);
      MoveAdvice first = advice.get(string.string().number());
      ProvedAdvice proved = ProvedAdvice.of(first, earlier);
      Double made = madeMm(pass, string.string().number());
      MoveAdvice last = proved.advice();
      result.add(new StringPass(pass, string, last, made, predicted(last, made), proved.proof()));
    }
    return result;
  }

  private static Map<Integer, MoveAdvice> byNumber(InstrumentAdvice advice) {
    Map<Integer, MoveAdvice> result = new HashMap<>();
    for (MoveAdvice one : advice.strings()) {
      result.put(one.string().string().number(), one);
    }
    return result;
  }

  private List<BenchString> bench(int pass) {
    StringHeights heights =
        pass == 1 ? StringHeights.received(record.checks()) : StringHeights.left(record.checks());
    List<BenchString> bench = new ArrayList<>();
    for (FittedString string : record.visit().strings().strings()) {
      int number = string.number();
      bench.add(
          new BenchString(
              record.instrument().name(),
              string,
              heights.of(number),
              room(pass, number),
              readings.of(pass, number)));
    }
    return bench;
  }

  private SaddleRoom room(int pass, int string) {
    double movedMm = 0;
    for (MadeMove move : record.moves()) {
      if (move.pass() < pass && move.string() == string) {
        movedMm += move.saddleMm();
      }
    }
    var saddle = record.instrument().saddle();
    NutMovable nut = record.aim().nut();
    Double screw = saddle.screwPitchMm();
    for (Travel travel : record.visit().travel()) {
      if (travel.string() == string) {
        return new SaddleRoom(
            screw,
            shifted(travel.backMm(), -movedMm),
            shifted(travel.forwardMm(), movedMm),
            saddle.kind(),
            saddle.thicknessMm(),
            nut);
      }
    }
    return new SaddleRoom(screw, null, null, saddle.kind(), saddle.thicknessMm(), nut);
  }

  private static @Nullable Double shifted(@Nullable Double room, double byMm) {
    return room == null ? null : Math.max(0, room + byMm);
  }

  private @Nullable Double madeMm(int pass, int string) {
    Double made = null;
    for (MadeMove move : record.moves()) {
      if (move.pass() == pass && move.string() == string) {
        made = move.saddleMm() + (made == null ? 0 : made);
      }
    }
    return made;
  }

  private static @Nullable Double predicted(@Nullable MoveAdvice advice, @Nullable Double made) {
    MoveFigures figures = advice == null ? null : advice.figures();
    return figures == null || made == null
        ? null
        : Double.valueOf(figures.cents12Before() + made * figures.centsPerMm());
  }
}
