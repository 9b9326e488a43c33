package sillet.desktop.visit;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Clock;
import java.time.ZoneOffset;
import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.acoustics.readings.Reference;
import sillet.desktop.visit.readings.Cell;
import sillet.desktop.visit.readings.ReadingTerms;
import sillet.desktop.visit.readings.ShownFrets;
import sillet.logbook.actions.RecordReadings;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.visits.InstrumentPast;
import sillet.logbook.visits.StringPass;
import sillet.logbook.visits.VisitRecord;

class VisitModelTest {
  private static final Clock CLOCK = Clock.fixed(TestDesk.NOW, ZoneOffset.UTC);
  private static final MoveAdvisor ADVISOR = new MoveAdvisor(75);
  private static final Cell CELL = new Cell(1, 12);

  private final VisitRecord blank = TestVisits.six(List.of());
  private final VisitModel model = new VisitModel(blank, InstrumentPast.NONE, ADVISOR, CLOCK);

  @Test
  void advisesWhileOneTypes() {
    assertThat(model.strings().get(0).advice()).isNull();
    model.type(CELL, "5");
    StringPass typing = model.strings().get(0);
    List<BenchString> together = model.strings().stream().map(StringPass::string).toList();
    MoveAdvice direct = ADVISOR.advise(together, AimChoice.OCTAVE).strings().get(0);
    assertThat(typing.advice()).isEqualTo(direct);
    assertThat(direct.figures()).isNotNull();
    double first = direct.figures().saddleMm();
    model.type(CELL, "5.6");
    assertThat(model.strings().get(0).advice().figures().saddleMm()).isGreaterThan(first);
  }

  @Test
  void takesAdviceBackWhenTheCellCannotBeRead() {
    model.type(CELL, "5");
    model.type(CELL, "5o");
    assertThat(model.strings().get(0).advice()).isNull();
  }

  @Test
  void asksForEachReadingToBeSavedOnce() {
    model.type(CELL, "5.0");
    assertThat(model.draft()).isTrue();
    var action = model.commit(CELL).orElseThrow();
    assertThat(action).isInstanceOf(RecordReadings.class);
    assertThat(((RecordReadings) action).readings()).hasSize(1);
    assertThat(model.commit(CELL)).isEmpty();
    model.take(TestVisits.read(blank, 1, "5.0"));
    assertThat(model.draft()).isFalse();
  }

  @Test
  void goesToTheNextPassWhenMovesWereMade() {
    VisitRecord read = TestVisits.read(blank, 1, "5.0", "3.0");
    model.take(read);
    assertThat(model.pass()).isEqualTo(1);
    model.take(TestVisits.moved(read, 1, 1, 1.86));
    assertThat(model.pass()).isEqualTo(2);
    assertThat(model.grid().read(CELL)).isFalse();
    assertThat(model.before().get(0).madeMm()).isEqualTo(1.86);
    model.look(1);
    assertThat(model.grid().read(CELL)).isTrue();
    model.look(7);
    assertThat(model.pass()).isEqualTo(2);
  }

  @Test
  void provesAMoveByTheSecondPass() {
    VisitRecord read = TestVisits.read(blank, 1, "5.0");
    model.take(TestVisits.moved(read, 1, 1, 1.86));
    model.type(CELL, "0.2");
    assertThat(model.strings().get(0).proof()).isNotNull();
    assertThat(model.strings().get(0).proof().withinOneCent()).isTrue();
  }

  @Test
  void keepsHowReadingsAreTakenFromTheLastOne() {
    VisitModel again =
        new VisitModel(TestVisits.read(blank, 1, "5.0"), InstrumentPast.NONE, ADVISOR, CLOCK);
    assertThat(again.terms()).isEqualTo(new ReadingTerms(Reference.OPEN, 0.3));
    again.readUnder(new ReadingTerms(Reference.HARMONIC, 0.1));
    again.type(new Cell(2, 12), "3");
    RecordReadings action = (RecordReadings) again.commit(new Cell(2, 12)).orElseThrow();
    assertThat(action.readings().get(0).against()).isEqualTo(Reference.HARMONIC);
    assertThat(action.readings().get(0).sdCents()).isEqualTo(0.1);
  }

  @Test
  void walksOverTheShownFrets() {
    model.show(ShownFrets.parse("5 12", 22));
    assertThat(model.walk().nextString(new Cell(6, 5))).isEqualTo(new Cell(1, 12));
  }
}
