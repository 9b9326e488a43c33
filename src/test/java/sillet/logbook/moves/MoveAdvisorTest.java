package sillet.logbook.moves;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.offset;

import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.Construction;
import sillet.logbook.text.Message;
import sillet.logbook.units.Tries;

class MoveAdvisorTest {
  private final MoveAdvisor advisor = new MoveAdvisor(75);

  /**
   * Figures of the full model for this program [D]; the plain length rule would say 1.87 mm for all
   * three (cents per mm = 1731.23/648, see physics of the saddle move).
   */
  @Test
  void sendsASharpStringAwayByTheModelsFigure() {
    assertThat(figures(BenchStrings.plain10("5.0")).saddleMm()).isCloseTo(1.86, offset(0.006));
    assertThat(figures(BenchStrings.plain17("5.0")).saddleMm()).isBetween(1.835, 1.855);
    assertThat(figures(BenchStrings.wound46("5.0")).saddleMm()).isBetween(1.835, 1.855);
  }

  @Test
  void countsTurnsOfTheScrew() {
    MoveFigures figures = figures(BenchStrings.plain10("5.0"));
    assertThat(Objects.requireNonNull(figures.turns()))
        .isEqualTo(figures.saddleMm() / BenchStrings.M3_PITCH_MM);
    assertThat(figures.direction()).isEqualTo(Direction.AWAY);
  }

  @Test
  void sendsAFlatStringTowardTheNeck() {
    MoveAdvice advice = advise(BenchStrings.plain10("-5.0"));
    assertThat(figures(advice).saddleMm()).isNegative();
    assertThat(figures(advice).direction()).isEqualTo(Direction.TOWARD);
    assertThat(Objects.requireNonNull(figures(advice).turns())).isPositive();
    assertThat(advice.verdict()).isEqualTo(Verdict.MOVE);
  }

  @Test
  void keepsTheBestEstimateWhenItSaysLeaveIt() {
    MoveAdvice advice = advise(BenchStrings.plain10("0.6"));
    assertThat(advice.verdict()).isEqualTo(Verdict.LEAVE);
    assertThat(figures(advice).saddleMm()).isCloseTo(0.22, offset(0.01));
    assertThat(keys(advice)).containsExactly("move.leave");
  }

  @Test
  void leavesAMoveThatWholeCentsCannotTell() {
    BenchString coarse = withSd(BenchStrings.plain10("0"), 0.01);
    assertThat(advise(coarse).verdict()).isEqualTo(Verdict.LEAVE);
  }

  @Test
  void widensTheIntervalByRounding() {
    double tenth = width(withSd(BenchStrings.plain10("5.0"), 0.1));
    double whole = width(withSd(BenchStrings.plain10("5"), 0.1));
    assertThat(whole).isGreaterThan(2.5 * tenth);
  }

  @Test
  void narrowsTheIntervalWithTries() {
    assertThat(width(BenchStrings.plain10("5.0 5.0 5.0 5.0")))
        .isLessThan(0.7 * width(BenchStrings.plain10("5.0")));
  }

  @Test
  void saysWhatTheTravelAllows() {
    MoveAdvice advice = advise(BenchStrings.plain10("5.0", BenchStrings.room(1.0, 1.0, false)));
    assertThat(advice.verdict()).isEqualTo(Verdict.NO_ROOM);
    assertThat(figures(advice).saddleMm()).isCloseTo(1.86, offset(0.006));
    Message note = advice.notes().get(0);
    assertThat(note.key()).isEqualTo("move.no-room-away");
    assertThat(note.values().subList(0, 2)).containsExactly("1.86", "1.00");
    assertThat(Double.parseDouble(note.values().get(2))).isCloseTo(2.3, offset(0.1));
  }

  @Test
  void callsForSlotWorkPastTheEdgeOfAOnePieceSaddle() {
    MoveAdvice advice = advise(BenchStrings.plain10("5.0", BenchStrings.room(0.7, 1.0, true)));
    assertThat(advice.verdict()).isEqualTo(Verdict.SLOT);
    assertThat(keys(advice)).containsExactly("move.slot-away");
    MoveAdvice filed = advise(BenchStrings.plain10("-1.8", BenchStrings.room(0.7, 1.0, true)));
    assertThat(filed.verdict()).isEqualTo(Verdict.MOVE);
    assertThat(keys(filed)).containsExactly("move.file-toward");
  }

  @Test
  void namesAWildTry() {
    MoveAdvice advice = advise(BenchStrings.plain10("5.0 5.1 4.9 15.0"));
    assertThat(advice.findings()).extracting(FindingReport::kind).containsExactly(Finding.READING);
    assertThat(advice.notes().get(0)).isEqualTo(Message.of("move.wild-try", "4", "12", "15.0"));
  }

  @Test
  void takesWhatTheOpenStringReadOff() {
    BenchString plain = BenchStrings.plain10("7.0");
    NoteReadings sharpOpen =
        new NoteReadings(plain.readings().frets(), Tries.parse("2.0"), Reference.OPEN, 0.5);
    assertThat(figures(withReadings(plain, sharpOpen)).saddleMm())
        .isCloseTo(figures(BenchStrings.plain10("5.0")).saddleMm(), offset(1e-9));
  }

  @Test
  void estimatesAnUnreadOctaveWidely() {
    BenchString seventh =
        withReadings(BenchStrings.plain10("0.0"), NoteReadings.of(Map.of(7, Tries.parse("2.5"))));
    MoveAdvice advice = advise(seventh);
    assertThat(keys(advice)).contains("move.unread-octave");
    assertThat(width(seventh)).isGreaterThan(2 * width(BenchStrings.plain10("5.0")));
  }

  @Test
  void flagsAStringNearItsBreakingTension() {
    // .010 steel at A4 on 648 mm: about 129 N of 137 N (wire strength by Shigley's table, [S2])
    BenchString high =
        BenchStrings.string(
            1, "A4", .010, Construction.PLAIN_STEEL, "0.1", BenchStrings.room(null, null, false));
    assertThat(keys(advise(high))).contains("move.strain");
    assertThat(keys(advise(BenchStrings.plain10("0.1")))).doesNotContain("move.strain");
    assertThat(new MoveAdvisor(40).strain(BenchStrings.plain10("0.1"))).isNotNull();
  }

  private MoveAdvice advise(BenchString string) {
    return advisor.advise(List.of(string), AimChoice.OCTAVE).strings().get(0);
  }

  private MoveFigures figures(BenchString string) {
    return figures(advise(string));
  }

  private static MoveFigures figures(MoveAdvice advice) {
    return Objects.requireNonNull(advice.figures(), () -> "not solved: " + advice.notes());
  }

  private double width(BenchString string) {
    MoveFigures figures = figures(string);
    return figures.highMm() - figures.lowMm();
  }

  private static List<String> keys(MoveAdvice advice) {
    return advice.notes().stream().map(Message::key).toList();
  }

  private static BenchString withSd(BenchString string, double sdCents) {
    NoteReadings readings = string.readings();
    return withReadings(
        string,
        new NoteReadings(
            new TreeMap<>(readings.frets()), readings.open(), readings.against(), sdCents));
  }

  private static BenchString withReadings(BenchString string, NoteReadings readings) {
    return new BenchString(
        string.instrument(), string.string(), string.heights(), string.room(), readings);
  }
}
