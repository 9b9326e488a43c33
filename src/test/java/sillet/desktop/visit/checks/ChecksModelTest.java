package sillet.desktop.visit.checks;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.UUID;
import org.junit.jupiter.api.Test;
import sillet.desktop.visit.TestVisits;
import sillet.logbook.actions.RecordChecks;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.CheckMethod;
import sillet.logbook.visits.Moment;
import sillet.logbook.visits.VisitRecord;

class ChecksModelTest {
  private static final UUID VISIT = new UUID(0, 1);
  private static final BenchCheck RELIEF =
      new BenchCheck(CheckKind.RELIEF, 0, 7, CheckMethod.STRING, Moment.RECEIVED, 0.31, "0.31");

  private final VisitRecord blank = TestVisits.six(List.of());
  private final ChecksModel model =
      new ChecksModel(blank, LengthUnit.MM, (kind, length) -> List.of());

  private CheckRow row(CheckKind kind, int string) {
    return model.rows().stream()
        .filter(row -> row.kind() == kind && row.string() == string)
        .findFirst()
        .orElseThrow();
  }

  @Test
  void showsTheOuterStringsAndOnRequestEveryString() {
    assertThat(model.rows())
        .extracting(row -> row.kind().word() + " " + row.string())
        .containsExactly(
            "relief 0",
            "action 1",
            "action 6",
            "first-fret-clearance 1",
            "first-fret-clearance 6",
            "pickup-height 1",
            "pickup-height 6");
    model.showEveryString(true);
    assertThat(model.rows()).hasSize(1 + 6 + 6 + 2);
  }

  @Test
  void showsAnInnerStringThatWasMeasured() {
    BenchCheck inner =
        new BenchCheck(CheckKind.ACTION, 3, 12, CheckMethod.OPEN, Moment.RECEIVED, 1.8, "1.8");
    model.take(TestVisits.checked(blank, inner));
    assertThat(row(CheckKind.ACTION, 3).value(Moment.RECEIVED).typedProperty().get())
        .isEqualTo("1.8");
  }

  @Test
  void savesAFigureWithItsFretAndMethodAndWhatWasTyped() {
    CheckRow row = row(CheckKind.ACTION, 6);
    row.fret().fill("17");
    row.measuredBy(CheckMethod.CAPO_1);
    row.value(Moment.LEFT).fill("5/64");
    RecordChecks action = model.commit(row, Moment.LEFT, VISIT).orElseThrow();
    BenchCheck check = action.checks().get(0);
    assertThat(check.fret()).isEqualTo(17);
    assertThat(check.method()).isEqualTo(CheckMethod.CAPO_1);
    assertThat(check.moment()).isEqualTo(Moment.LEFT);
    assertThat(check.valueMm()).isCloseTo(1.984, within(0.001));
    assertThat(check.typed()).isEqualTo("5/64");
    assertThat(row.value(Moment.LEFT).saidBackProperty().get()).isEqualTo("1.98 mm");
  }

  @Test
  void savesNothingThatTheRecordHoldsOrThatCannotBeRead() {
    model.take(TestVisits.checked(blank, RELIEF));
    CheckRow row = row(CheckKind.RELIEF, 0);
    assertThat(row.fret().typedProperty().get()).isEqualTo("7");
    assertThat(row.method()).isEqualTo(CheckMethod.STRING);
    assertThat(model.commit(row, Moment.RECEIVED, VISIT)).isEmpty();
    row.value(Moment.RECEIVED).fill("o.31");
    assertThat(model.commit(row, Moment.RECEIVED, VISIT)).isEmpty();
    row.value(Moment.RECEIVED).fill("0.33");
    assertThat(model.commit(row, Moment.RECEIVED, VISIT)).isPresent();
  }

  @Test
  void keepsWhatIsBeingTypedWhenTheRecordArrives() {
    model.take(TestVisits.checked(blank, RELIEF));
    CheckRow row = row(CheckKind.RELIEF, 0);
    row.value(Moment.RECEIVED).fill("0.4");
    model.take(TestVisits.checked(blank, RELIEF));
    assertThat(row.value(Moment.RECEIVED).typedProperty().get()).isEqualTo("0.4");
    assertThat(model.made(Moment.RECEIVED)).isEqualTo(1);
    assertThat(model.made(Moment.LEFT)).isZero();
  }

  private static BenchCheck relief(int fret, CheckMethod method, Moment moment, String typed) {
    double mm = Double.parseDouble(typed);
    return new BenchCheck(CheckKind.RELIEF, 0, fret, method, moment, mm, typed);
  }

  @Test
  void keepsAFretAndAMethodJustChosenWhenTheRecordArrives() {
    model.take(TestVisits.checked(blank, RELIEF));
    CheckRow row = row(CheckKind.RELIEF, 0);
    row.fret().typedProperty().set("8");
    row.measuredBy(CheckMethod.STRAIGHTEDGE);
    model.take(
        TestVisits.checked(blank, RELIEF, relief(7, CheckMethod.STRING, Moment.LEFT, "0.2")));
    assertThat(row.fret().typedProperty().get()).isEqualTo("8");
    assertThat(row.method()).isEqualTo(CheckMethod.STRAIGHTEDGE);
    assertThat(row.value(Moment.LEFT).typedProperty().get()).isEqualTo("0.2");
  }

  @Test
  void followsTheRecordAgainOnceAChosenFretAndMethodWereSaved() {
    model.take(TestVisits.checked(blank, RELIEF));
    CheckRow row = row(CheckKind.RELIEF, 0);
    row.fret().typedProperty().set("8");
    row.measuredBy(CheckMethod.STRAIGHTEDGE);
    BenchCheck saved = model.commit(row, Moment.RECEIVED, VISIT).orElseThrow().checks().get(0);
    model.take(TestVisits.checked(blank, RELIEF, saved));
    BenchCheck later = relief(9, CheckMethod.STRING, Moment.RECEIVED, "0.31");
    model.take(TestVisits.checked(blank, RELIEF, saved, later));
    assertThat(row.fret().typedProperty().get()).isEqualTo("9");
    assertThat(row.method()).isEqualTo(CheckMethod.STRING);
  }

  @Test
  void aCheckThatWasCorrectedSinceChangesNothing() {
    BenchCheck corrected = relief(8, CheckMethod.STRAIGHTEDGE, Moment.RECEIVED, "0.28");
    VisitRecord record = TestVisits.checked(blank, RELIEF, corrected);
    model.take(record);
    CheckRow row = row(CheckKind.RELIEF, 0);
    row.fret().typedProperty().set("7");
    row.measuredBy(CheckMethod.STRING);
    model.take(record);
    assertThat(row.recorded(Moment.RECEIVED)).isEqualTo(corrected);
    assertThat(row.fret().typedProperty().get()).isEqualTo("7");
    assertThat(row.method()).isEqualTo(CheckMethod.STRING);
    assertThat(row.value(Moment.RECEIVED).typedProperty().get()).isEqualTo("0.28");
  }

  @Test
  void showsARecordedFigureAgainThatWasCleared() {
    model.take(TestVisits.checked(blank, RELIEF));
    CheckRow row = row(CheckKind.RELIEF, 0);
    row.value(Moment.RECEIVED).typedProperty().set(" ");
    assertThat(model.commit(row, Moment.RECEIVED, VISIT)).isEmpty();
    assertThat(row.value(Moment.RECEIVED).typedProperty().get()).isEqualTo("0.31");
    assertThat(model.commit(row, Moment.LEFT, VISIT)).isEmpty();
    assertThat(row.value(Moment.LEFT).typedProperty().get()).isEmpty();
  }
}
