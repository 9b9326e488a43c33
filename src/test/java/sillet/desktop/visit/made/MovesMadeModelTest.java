package sillet.desktop.visit.made;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.UUID;
import org.junit.jupiter.api.Test;
import sillet.desktop.visit.TestDesk;
import sillet.desktop.visit.TestVisits;
import sillet.logbook.actions.RecordMoves;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.StringPass;
import sillet.logbook.visits.Travel;
import sillet.logbook.visits.VisitMoves;
import sillet.logbook.visits.VisitRecord;

class MovesMadeModelTest {
  private static final UUID VISIT = new UUID(0, 1);

  private static MovesMadeModel model(List<Travel> travel, String... cents12) {
    VisitRecord read = TestVisits.read(TestVisits.six(travel), 1, cents12);
    List<StringPass> strings = VisitMoves.of(read, new MoveAdvisor(75)).get(0);
    return new MovesMadeModel(strings, LengthUnit.MM);
  }

  private static List<MadeMove> moves(MovesMadeModel model) {
    RecordMoves action = model.action(VISIT, TestDesk.NOW).orElseThrow();
    assertThat(action.visitId()).isEqualTo(VISIT);
    return action.moves();
  }

  @Test
  void beginsWithWhatWasProposedInEighthsOfATurn() {
    MovesMadeModel model = model(List.of(), "5.0", "", "0.1", "", "", "-2.6");
    assertThat(model.rows()).extracting(MadeRow::text).element(0).isEqualTo("3 3/4");
    assertThat(model.rows().get(0).away()).isTrue();
    assertThat(model.rows().get(1).text()).as("not read").isEmpty();
    assertThat(model.rows().get(2).text()).as("leave it").isEmpty();
    assertThat(model.rows().get(5).away()).isFalse();
    List<MadeMove> moves = moves(model);
    assertThat(moves).extracting(MadeMove::string).containsExactly(1, 6);
    assertThat(moves.get(0).saddleMm()).isCloseTo(3.75 * 0.5, within(1e-9));
    assertThat(moves.get(0).turns()).isEqualTo(3.75);
    assertThat(moves.get(1).saddleMm()).isNegative();
    assertThat(moves).extracting(MadeMove::pass).containsOnly(1);
  }

  @Test
  void beginsWithNoMoreThanTheTravel() {
    MovesMadeModel model = model(List.of(new Travel(1, 1.0, 1.0)), "5.0");
    assertThat(model.rows().get(0).text()).isEqualTo("2");
  }

  @Test
  void recordsWhatWasReallyMade() {
    MovesMadeModel model = model(List.of(), "5.0", "3.0");
    model.rows().get(0).type("3.5");
    model.rows().get(1).type("1,2mm");
    model.rows().get(1).turnAround();
    List<MadeMove> moves = moves(model);
    assertThat(moves.get(0).turns()).isEqualTo(3.5);
    assertThat(moves.get(1).saddleMm()).isEqualTo(-1.2);
    assertThat(moves.get(1).turns()).isNull();
  }

  @Test
  void stepsByAnEighthOfATurnAndNotBelowNothing() {
    MadeRow row = model(List.of(), "5.0").rows().get(0);
    row.step(1);
    assertThat(row.text()).isEqualTo("3 7/8");
    row.step(-100);
    assertThat(row.text()).isEmpty();
  }

  @Test
  void recordsNothingWhileARowCannotBeReadOrNothingWasMoved() {
    MovesMadeModel model = model(List.of(), "5.0");
    model.rows().get(0).type("three");
    assertThat(model.complete()).isFalse();
    assertThat(model.rows().get(0).problem()).isNotNull();
    model.rows().get(0).type("");
    assertThat(model.complete()).isFalse();
    assertThat(model.action(VISIT, TestDesk.NOW)).isEmpty();
  }
}
