package sillet.desktop.visit.words;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.desktop.controls.Eighths;
import sillet.desktop.visit.TestVisits;
import sillet.logbook.moves.Direction;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;
import sillet.logbook.visits.InstrumentPast;
import sillet.logbook.visits.StringPass;
import sillet.logbook.visits.Travel;
import sillet.logbook.visits.VisitMoves;
import sillet.logbook.visits.VisitPass;
import sillet.logbook.visits.VisitRecord;

class MoveWordsTest {
  private static final MoveAdvisor ADVISOR = new MoveAdvisor(75);

  private final MoveWords words = new MoveWords(Texts.english());

  private static VisitRecord visit(Travel... travel) {
    return TestVisits.six(List.of(travel));
  }

  private StringWords first(VisitRecord record, int pass) {
    List<List<StringPass>> passes = VisitMoves.of(record, ADVISOR);
    StringPass before = pass > 1 ? passes.get(pass - 2).get(0) : null;
    return words.of(passes.get(pass - 1).get(0), before);
  }

  @Test
  void saysTurnsDirectionMillimetresIntervalAndTravelLeft() {
    VisitRecord record = TestVisits.read(visit(new Travel(1, 6.5, 1.0)), 1, "5.0");
    MoveFigures figures = VisitMoves.of(record, ADVISOR).get(0).get(0).advice().figures();
    StringWords said = first(record, 1);
    assertThat(said.kind()).isEqualTo(StringWords.Kind.MOVE);
    assertThat(said.direction()).isEqualTo(Direction.AWAY);
    assertThat(said.head()).isEqualTo("away from neck");
    assertThat(said.turns()).isEqualTo(new Eighths(3, 3, 4));
    assertThat(said.mm()).isEqualTo(Figures.fixed(figures.saddleMm(), 2));
    assertThat(said.range())
        .isEqualTo(Figures.fixed(figures.lowMm(), 2) + " to " + Figures.fixed(figures.highMm(), 2));
    assertThat(said.left()).isEqualTo(Figures.fixed(6.5 - figures.saddleMm(), 1));
  }

  @Test
  void saysTheSizeOfAMoveTowardTheNeckWithoutASign() {
    StringWords said = first(TestVisits.read(visit(), 1, "-5.0"), 1);
    assertThat(said.head()).isEqualTo("toward neck");
    assertThat(said.mm()).doesNotContain("-").doesNotContain("\u2212");
    assertThat(said.range()).matches("\\d\\.\\d\\d to \\d\\.\\d\\d");
    assertThat(said.left()).as("travel not known").isEmpty();
  }

  @Test
  void leavesWhatTheReadingsCannotTell() {
    StringWords said = first(TestVisits.read(visit(), 1, "0.2"), 1);
    assertThat(said.kind()).isEqualTo(StringWords.Kind.LEAVE);
    assertThat(said.head()).isEqualTo("leave it");
    assertThat(said.kind().needsHand()).isFalse();
  }

  @Test
  void saysWhatIsPossibleAndWhatIsMissingWhereThereIsNoRoom() {
    StringWords said = first(TestVisits.read(visit(new Travel(1, 1.0, 1.0)), 1, "5.0"), 1);
    assertThat(said.kind()).isEqualTo(StringWords.Kind.NO_ROOM);
    assertThat(said.mm()).isEqualTo("1.00");
    assertThat(said.turns()).isEqualTo(new Eighths(2, 0, 8));
    assertThat(said.sentence()).startsWith("no room: 0.8").endsWith(" mm short");
  }

  @Test
  void saysOfAStringNotReadWhatWasDoneToIt() {
    VisitRecord record = TestVisits.read(visit(), 1, "5.0");
    assertThat(first(TestVisits.read(visit(), 1, ""), 1).head()).isEqualTo("not read yet");
    VisitRecord moved = TestVisits.moved(record, 1, 1, 1.86);
    assertThat(first(moved, 2).sentence()).isEqualTo("moved 1.86 mm away from neck");
    StringWords past = first(moved, 1);
    assertThat(past.kind()).isEqualTo(StringWords.Kind.MADE);
    assertThat(past.head()).isEqualTo("moved 1.86 mm away from neck");
    assertThat(past.sentence()).startsWith("+5.0 read, ").endsWith("0.0 expected");
  }

  @Test
  void saysWithinOneCentWhereTheSecondPassProvesIt() {
    VisitRecord moved = TestVisits.moved(TestVisits.read(visit(), 1, "5.0"), 1, 1, 1.86);
    StringWords said = first(TestVisits.read(moved, 2, "0.3"), 2);
    assertThat(said.kind()).isEqualTo(StringWords.Kind.WITHIN);
    assertThat(said.sentence()).isEqualTo("+5.0 before, +0.3 now");
  }

  @Test
  void namesAMoveThatDidNotActAsItMust() {
    VisitRecord moved = TestVisits.moved(TestVisits.read(visit(), 1, "5.0"), 1, 1, 1.86);
    VisitRecord again = TestVisits.read(moved, 2, "5.1");
    VisitPass pass = VisitMoves.passes(again, InstrumentPast.NONE, ADVISOR).get(1);
    List<FindingLine> findings = new FindingLines(Texts.english(), ADVISOR).of(pass);
    assertThat(findings).hasSize(1);
    assertThat(findings.get(0).head()).isEqualTo("Reading in doubt, string 1");
    assertThat(findings.get(0).sentence()).contains("+5.0", "+5.1");
  }

  @Test
  void namesEachStringWhoseTriesLieApart() {
    VisitRecord read = TestVisits.read(visit(), 1, "1.0/1.1/9.0", "2.0", "1.0/1.1/9.0");
    VisitPass pass = VisitMoves.passes(read, InstrumentPast.NONE, ADVISOR).get(0);
    List<FindingLine> findings = new FindingLines(Texts.english(), ADVISOR).of(pass);
    assertThat(findings).extracting(FindingLine::strings).contains(List.of(1), List.of(3));
  }
}
