package sillet.desktop.bench;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.desktop.controls.Visits;
import sillet.logbook.visits.VisitRecord;

class BenchModelTest {
  private static final LocalDate MONDAY = LocalDate.of(2025, 12, 1);

  private final BenchModel model = new BenchModel();

  @Test
  void sortsByPromiseAndPutsThoseWithoutADayLast() {
    model.show(
        List.of(
            Visits.ticket(1).record(),
            Visits.ticket(2).promised("2025-12-04").record(),
            Visits.ticket(4).promised("2025-12-01").record(),
            Visits.ticket(3).promised("2025-12-01").record()),
        MONDAY);

    assertThat(model.rows()).extracting(BenchRow::ticket).containsExactly(3, 4, 2, 1);
  }

  @Test
  void groupsWhatIsLateEachNearDayAndWhatIsLater() {
    model.show(
        List.of(
            Visits.ticket(1).promised("2025-11-20").record(),
            Visits.ticket(2).promised("2025-11-30").record(),
            Visits.ticket(3).promised("2025-12-01").record(),
            Visits.ticket(4).promised("2025-12-02").record(),
            Visits.ticket(5).promised("2025-12-04").record(),
            Visits.ticket(6).promised("2025-12-05").record(),
            Visits.ticket(7).promised("2025-12-08").record(),
            Visits.ticket(8).promised("2026-02-01").record(),
            Visits.ticket(9).record()),
        MONDAY);

    assertThat(model.rows())
        .extracting(row -> row.group().kind())
        .containsExactly(
            DayGroup.Kind.LATE,
            DayGroup.Kind.LATE,
            DayGroup.Kind.TODAY,
            DayGroup.Kind.TOMORROW,
            DayGroup.Kind.THIS_WEEK,
            DayGroup.Kind.THIS_WEEK,
            DayGroup.Kind.LATER,
            DayGroup.Kind.LATER,
            DayGroup.Kind.NO_DAY);
    assertThat(List.of(0, 1, 2, 3, 4, 5, 6, 7, 8).stream().filter(model::opensGroup))
        .containsExactly(0, 2, 3, 4, 5, 6, 8);
  }

  @Test
  void isEmptyOnlyWhenThatIsKnown() {
    assertThat(model.empty()).isFalse();

    model.show(List.of(), MONDAY);

    assertThat(model.empty()).isTrue();
  }

  @Test
  void asksForAReadingAgainBeforeAnythingElse() {
    VisitRecord visit = Visits.ticket(1).read(1, 1, "5.0").moved(1, 1, 1.8).record();

    assertThat(row(visit).strings()).containsExactly(StringState.READ_AGAIN, StringState.UNREAD);
    assertThat(row(visit).next()).isEqualTo(StringState.READ_AGAIN);
  }

  @Test
  void countsWhatIsMoreThanACentOff() {
    BenchRow row = row(Visits.ticket(1).read(1, 1, "1.0").read(1, 2, "-1.1").record());

    assertThat(row.strings()).containsExactly(StringState.NEAR, StringState.OFF);
    assertThat(row.next()).isEqualTo(StringState.OFF);
    assertThat(row.count(StringState.OFF)).isEqualTo(1);
  }

  @Test
  void isReadyWhenEveryStringIsNear() {
    BenchRow row = row(Visits.ticket(1).read(1, 1, "0.4").read(1, 2, "-0.3").record());

    assertThat(row.next()).isEqualTo(StringState.NEAR);
  }

  private BenchRow row(VisitRecord visit) {
    model.show(List.of(visit), MONDAY);
    return model.rows().get(0);
  }
}
