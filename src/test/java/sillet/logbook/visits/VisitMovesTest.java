package sillet.logbook.visits;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.offset;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.UUID;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.Construction;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.Neck;
import sillet.logbook.instruments.Saddle;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.moves.Finding;
import sillet.logbook.moves.FindingReport;
import sillet.logbook.moves.Heights;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.Verdict;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.text.Message;
import sillet.logbook.units.Pitch;
import sillet.logbook.units.Tries;

class VisitMovesTest {
  private static final Instant NOW = Instant.parse("2026-01-15T09:00:00Z");

  private final List<BenchCheck> checks = new ArrayList<>();
  private final List<Reading> readings = new ArrayList<>();
  private final List<MadeMove> moves = new ArrayList<>();

  @Test
  void hasOneEmptyPassBeforeAnythingIsRead() {
    List<List<StringPass>> passes = reckon();
    assertThat(passes).hasSize(1);
    assertThat(passes.get(0)).extracting(StringPass::advice).containsExactly(null, null);
  }

  @Test
  void countsTheNewestReadingOfANote() {
    read(1, "9.0");
    read(1, "5.0");
    assertThat(figures(reckon().get(0).get(0)).cents12Before()).isCloseTo(5.0, offset(1e-6));
    read(1, null);
    assertThat(reckon().get(0).get(0).advice()).isNull();
  }

  @Test
  void opensASecondPassWhenAMoveWasMade() {
    read(1, "5.0");
    moves.add(new MadeMove(1, 1, 1.86, 3.72, null, NOW));
    List<List<StringPass>> passes = reckon();
    assertThat(passes).hasSize(2);
    assertThat(passes.get(0).get(0).madeMm()).isEqualTo(1.86);
    assertThat(Objects.requireNonNull(passes.get(0).get(0).predictedCents()))
        .isCloseTo(0, offset(0.05));
    assertThat(passes.get(1).get(0).advice()).isNull();
  }

  @Test
  void saysWithinOneCentWhenThePassProvesTheMove() {
    read(1, "5.0");
    moves.add(new MadeMove(1, 1, 1.86, null, null, NOW));
    read(2, "0.3");
    StringPass second = reckon().get(1).get(0);
    MoveProof proof = Objects.requireNonNull(second.proof());
    assertThat(proof.withinOneCent()).isTrue();
    assertThat(proof.asPredicted()).isTrue();
    MoveAdvice advice = Objects.requireNonNull(second.advice());
    assertThat(advice.verdict()).isEqualTo(Verdict.LEAVE);
    assertThat(advice.notes()).containsExactly(Message.of("move.within-one-cent", "+5.0", "+0.3"));
  }

  @Test
  void proposesTheNextMoveFromWhatTheFirstOneDid() {
    read(1, "8.0");
    moves.add(new MadeMove(1, 1, 2.0, null, null, NOW));
    read(2, "2.7");
    StringPass second = reckon().get(1).get(0);
    MoveFigures figures = figures(second);
    assertThat(figures.saddleMm()).isCloseTo(1.0, offset(0.03));
    assertThat(Objects.requireNonNull(second.advice()).verdict()).isEqualTo(Verdict.MOVE);
    assertThat(Objects.requireNonNull(figures.turns())).isCloseTo(2.0, offset(0.06));
  }

  @Test
  void findsASlippedSaddle() {
    read(1, "8.0");
    moves.add(new MadeMove(1, 1, 2.98, null, null, NOW));
    read(2, "6.0");
    StringPass second = reckon().get(1).get(0);
    MoveAdvice advice = Objects.requireNonNull(second.advice());
    assertThat(advice.findings()).extracting(FindingReport::kind).containsExactly(Finding.READING);
    assertThat(advice.notes().get(0))
        .isEqualTo(Message.of("move.not-as-predicted", "+8.0", "+6.0"));
  }

  @Test
  void takesTravelUpByMovesMade() {
    read(1, "5.0");
    moves.add(new MadeMove(1, 1, 1.5, null, null, NOW));
    var passes = reckon();
    assertThat(passes.get(0).get(0).string().room().backMm()).isEqualTo(4.0);
    assertThat(passes.get(1).get(0).string().room().backMm()).isEqualTo(2.5);
    assertThat(passes.get(1).get(0).string().room().forwardMm()).isEqualTo(3.5);
  }

  @Test
  void putsHeightsOfTheStringsBetweenOnALine() {
    for (int string : new int[] {1, 3}) {
      checks.add(
          new BenchCheck(
              CheckKind.ACTION, string, 12, CheckMethod.OPEN, Moment.RECEIVED, string, ""));
    }
    checks.add(
        new BenchCheck(CheckKind.RELIEF, 0, 8, CheckMethod.STRAIGHTEDGE, Moment.RECEIVED, 0.2, ""));
    StringHeights heights = StringHeights.received(checks);
    assertThat(heights.of(1)).isEqualTo(new Heights(1.0, null, 0.2));
    assertThat(heights.of(2)).isEqualTo(new Heights(2.0, null, 0.2, true));
    assertThat(heights.of(4).action12Mm()).isNull();
  }

  @Test
  void forgetsAHeightThatWasMeasuredAtAnotherFretAfterAll() {
    for (int fret : new int[] {12, 15}) {
      checks.add(
          new BenchCheck(CheckKind.ACTION, 1, fret, CheckMethod.OPEN, Moment.RECEIVED, 1.6, "1.6"));
    }
    assertThat(StringHeights.received(checks).of(1).action12Mm()).isNull();
  }

  @Test
  void keepsTheTermsOfTheOctaveWhateverIsTakenBackBeside() {
    read(1, "5.0");
    readings.add(new Reading(1, 1, 5, null, Reference.HARMONIC, 2.0, NOW));
    var terms = reckon().get(0).get(0).string().readings();
    assertThat(terms.against()).isEqualTo(Reference.OPEN);
    assertThat(terms.sdCents()).isEqualTo(0.3);
  }

  @Test
  void provesNothingAcrossTwoReferences() {
    read(1, "5.0");
    moves.add(new MadeMove(1, 1, 1.86, null, null, NOW));
    readings.add(new Reading(2, 1, 12, Tries.parse("0.3"), Reference.HARMONIC, 0.3, NOW));
    assertThat(reckon().get(1).get(0).proof()).isNull();
  }

  @Test
  void keepsNamingAWildTryInALaterPass() {
    read(1, "5.0");
    moves.add(new MadeMove(1, 1, 1.86, null, null, NOW));
    read(2, "0.2 0.3 9.0 0.2");
    MoveAdvice advice = Objects.requireNonNull(reckon().get(1).get(0).advice());
    assertThat(advice.notes())
        .extracting(Message::key)
        .containsExactly("move.wild-try", "move.within-one-cent");
  }

  private void read(int pass, @Nullable String cents) {
    Tries tries = cents == null ? null : Tries.parse(cents);
    readings.add(new Reading(pass, 1, 12, tries, Reference.OPEN, 0.3, NOW));
  }

  private List<List<StringPass>> reckon() {
    UUID id = new UUID(0, 1);
    Saddle saddle = new Saddle(SaddleKind.SCREW, 0.5, ScrewSense.NOT_KNOWN, null);
    Neck neck = new Neck(2, 648, 648, 22, null, false);
    Instrument instrument =
        new Instrument(id, null, InstrumentKind.OTHER, "Test", "", "", "", neck, saddle);
    List<FittedString> strings = List.of(fitted(1, "E4", .010), fitted(2, "B3", .013));
    Visit visit =
        new Visit(
            id,
            1,
            id,
            null,
            new Arrival(LocalDate.EPOCH, "", null, "", "", null, null),
            new StringsOn("", null, "", 440, strings),
            List.of(new Travel(1, 4.0, 2.0)),
            null);
    VisitRecord record =
        new VisitRecord(
            visit, instrument, null, checks, readings, moves, List.of(), List.of(), VisitAim.USUAL);
    return VisitMoves.of(record, new MoveAdvisor(75));
  }

  private static FittedString fitted(int number, String pitch, double gaugeIn) {
    return new FittedString(
        number, Pitch.parse(pitch, 440), 648, StringMake.of(gaugeIn, Construction.PLAIN_STEEL));
  }

  private static MoveFigures figures(StringPass pass) {
    return Objects.requireNonNull(Objects.requireNonNull(pass.advice()).figures());
  }
}
