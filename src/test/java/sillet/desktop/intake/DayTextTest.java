package sillet.desktop.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.LocalDate;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.logbook.text.Rejection;

class DayTextTest {
  private static final LocalDate TODAY = LocalDate.of(2026, 12, 1);

  @ParameterizedTest
  @CsvSource({
    "2026-12-04, 2026-12-04",
    "2026-2-4, 2026-02-04",
    "4.12.2026, 2026-12-04",
    "4.12., 2026-12-04",
    "4.12, 2026-12-04",
    "3.1., 2027-01-03",
    "1.12., 2026-12-01",
    "+3, 2026-12-04",
    "-7, 2026-11-24",
    "\u22127, 2026-11-24"
  })
  void readsDaysAsTheyAreTypedAtACounter(String typed, LocalDate day) {
    assertThat(DayText.parse(typed, TODAY)).isEqualTo(day);
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "soon", "31.2.", "2026-13-01", "30.2.2027", "4/12/2026", "3"})
  void refusesWhatIsNoDay(String typed) {
    assertThatThrownBy(() -> DayText.parse(typed, TODAY)).isInstanceOf(Rejection.class);
  }

  @Test
  void saysTheWeekdayBack() {
    assertThat(DayText.said(LocalDate.of(2026, 12, 4))).isEqualTo("Fri 4 Dec 2026");
  }
}
