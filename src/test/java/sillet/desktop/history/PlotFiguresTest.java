package sillet.desktop.history;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.tuple;

import java.time.LocalDate;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sillet.desktop.controls.Visits;
import sillet.logbook.text.Texts;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.CheckMethod;
import sillet.logbook.visits.Moment;
import sillet.logbook.visits.VisitRecord;

class PlotFiguresTest {
  @Test
  void axisRunsOverWholeYears() {
    YearAxis axis =
        YearAxis.over(
            List.of(LocalDate.of(2019, 3, 12), LocalDate.of(2021, 11, 3)),
            LocalDate.of(2025, 12, 1));

    assertThat(axis.share(LocalDate.of(2019, 1, 1))).isZero();
    assertThat(axis.share(LocalDate.of(2022, 1, 1))).isEqualTo(1);
    assertThat(axis.years(8)).hasSize(3);
  }

  @Test
  void axisLeavesYearsOutRatherThanCrowdThem() {
    YearAxis axis =
        YearAxis.over(
            List.of(LocalDate.of(1999, 1, 1), LocalDate.of(2025, 1, 1)), LocalDate.of(2025, 1, 1));

    assertThat(axis.years(8))
        .hasSizeLessThanOrEqualTo(8)
        .first()
        .isEqualTo(LocalDate.of(1999, 1, 1));
  }

  @Test
  void aVisitInWhichTheStringWasNotReadHasNoPoint() {
    VisitRecord read = Visits.ticket(1).takenIn("2024-01-02").read(1, 1, "5").record();
    VisitRecord unread = Visits.ticket(2).takenIn("2025-01-02").record();

    CentsHistory history = CentsHistory.of(1, List.of(read, unread));

    assertThat(history.points())
        .containsExactly(
            new CentsHistory.Point(LocalDate.of(2024, 1, 2), 1, 5.0, OptionalDouble.empty()));
  }

  @Test
  void setsTheSameCheckSideBySide() {
    VisitRecord visit =
        Visits.ticket(1)
            .check(action(1, Moment.RECEIVED, 1.7))
            .check(action(6, Moment.RECEIVED, 2.1))
            .check(action(1, Moment.LEFT, 1.65))
            .check(action(1, Moment.LEFT, 1.6))
            .record();

    assertThat(CheckLine.of(visit))
        .extracting(CheckLine::receivedMm, CheckLine::leftMm)
        .containsExactly(tuple(1.7, 1.6), tuple(2.1, null));
  }

  @Test
  void writesTurnsInEighthsAndLengthsInTheShopsUnit() {
    HistoryWords mm = new HistoryWords(Texts.english(), LengthUnit.MM);
    HistoryWords inch = new HistoryWords(Texts.english(), LengthUnit.SIXTY_FOURTHS);
    VisitRecord visit =
        Visits.ticket(1).moved(1, 1, 1.9).moved(1, 2, -0.5).moved(1, 2, 0.1).record();

    assertThat(visit.moves().stream().map(mm::turns))
        .containsExactly("3 3/4 turns", "1 turn", "1/4 turn");
    assertThat(mm.moved(visit.moves().get(0))).isEqualTo("1.90 mm away from neck");
    assertThat(inch.moved(visit.moves().get(1))).isEqualTo("0.020 inch toward neck");
  }

  private static BenchCheck action(int string, Moment moment, double mm) {
    return new BenchCheck(CheckKind.ACTION, string, 12, CheckMethod.OPEN, moment, mm, "");
  }
}
