package sillet.desktop.visit.checks;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.UUID;
import org.junit.jupiter.api.Test;
import sillet.desktop.visit.TestVisits;
import sillet.logbook.actions.RecordTravel;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.Travel;
import sillet.logbook.visits.VisitRecord;

class RoomModelTest {
  private static final UUID VISIT = new UUID(0, 1);
  private static final Travel KNOWN = new Travel(1, 6.5, 1.0);

  private static RoomModel of(VisitRecord record) {
    return new RoomModel(record, LengthUnit.MM);
  }

  @Test
  void savesTheRoomOfOneSaddle() {
    RoomModel model = of(TestVisits.six(List.of()));
    RoomRow row = model.rows().get(2);
    row.back().fill("6.5");
    assertThat(model.commit(row, VISIT))
        .contains(new RecordTravel(VISIT, List.of(new Travel(3, 6.5, null))));
  }

  @Test
  void savesNothingThatIsNotNew() {
    RoomModel model = of(TestVisits.six(List.of(KNOWN)));
    assertThat(model.rows().get(0).back().typedProperty().get()).isEqualTo("6.50");
    assertThat(model.commit(model.rows().get(0), VISIT)).isEmpty();
    assertThat(model.commit(model.rows().get(1), VISIT)).isEmpty();
  }

  /** Moved 2 mm away from the neck: that much less behind it and more before it. */
  @Test
  void showsTheRoomAsItStandsNowAndKeepsItAsItCameIn() {
    RoomModel model = of(TestVisits.moved(TestVisits.six(List.of(KNOWN)), 1, 1, 2.0));
    RoomRow row = model.rows().get(0);
    assertThat(row.back().typedProperty().get()).isEqualTo("4.50");
    assertThat(row.forward().typedProperty().get()).isEqualTo("3.00");
    row.back().fill("4.0");
    assertThat(model.commit(row, VISIT))
        .contains(new RecordTravel(VISIT, List.of(new Travel(1, 6.0, 1.0))));
  }

  @Test
  void savesNothingThatCannotBeRead() {
    RoomModel model = of(TestVisits.six(List.of()));
    RoomRow row = model.rows().get(0);
    row.back().fill("a lot");
    assertThat(model.commit(row, VISIT)).isEmpty();
    assertThat(row.back().problemProperty().get()).isPresent();
  }

  @Test
  void keepsWhatIsTypedInOneFieldWhenTheOtherOneIsSaved() {
    RoomModel model = of(TestVisits.six(List.of()));
    RoomRow row = model.rows().get(0);
    row.back().typedProperty().set("6.5");
    row.forward().typedProperty().set("1.");
    model.take(TestVisits.six(List.of(new Travel(1, 6.5, null))));
    assertThat(row.back().typedProperty().get()).isEqualTo("6.50");
    assertThat(row.forward().typedProperty().get()).isEqualTo("1.");
    row.forward().typedProperty().set("1.0");
    assertThat(model.commit(row, VISIT)).contains(new RecordTravel(VISIT, List.of(KNOWN)));
  }

  /** What was typed and saved is no draft any more: it follows the saddle. */
  @Test
  void showsTheRoomAfterAMoveAlsoWhereItWasTyped() {
    RoomModel model = of(TestVisits.six(List.of()));
    RoomRow row = model.rows().get(0);
    row.back().typedProperty().set("6.5");
    row.forward().typedProperty().set("1");
    VisitRecord saved = TestVisits.six(List.of(KNOWN));
    model.take(saved);
    model.take(TestVisits.moved(saved, 1, 1, 0.5));
    assertThat(row.back().typedProperty().get()).isEqualTo("6.00");
    assertThat(row.forward().typedProperty().get()).isEqualTo("1.50");
    assertThat(model.commit(row, VISIT)).isEmpty();
  }
}
