package sillet.desktop.visit.log;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Clock;
import java.time.ZoneId;
import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.desktop.visit.TestDesk;
import sillet.desktop.visit.TestVisits;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.NoteKind;
import sillet.logbook.visits.VisitAim;
import sillet.logbook.visits.VisitNote;
import sillet.logbook.visits.VisitRecord;
import sillet.logbook.visits.WorkLine;

class LogModelTest {
  private static final Clock CLOCK = Clock.fixed(TestDesk.NOW, ZoneId.of("Europe/Berlin"));

  private final VisitRecord blank = TestVisits.six(List.of());
  private final LogModel model = new LogModel(blank, Texts.english(), CLOCK);

  @Test
  void writesDownWorkWithTimeAndTechnician() {
    var action = model.logWork("  Frets wiped ", "Noor").orElseThrow();
    assertThat(action.line()).isEqualTo(new WorkLine(TestDesk.NOW, "Noor", "Frets wiped"));
    assertThat(model.logWork(" ", "Noor")).isEmpty();
  }

  @Test
  void writesANoteForWhatItIsFor() {
    model.kind(NoteKind.DECLINED);
    var action = model.writeNote("No new nut").orElseThrow();
    assertThat(action.note())
        .isEqualTo(new VisitNote(TestDesk.NOW, NoteKind.DECLINED, "No new nut"));
  }

  @Test
  void showsTodaysTimesAndOtherDaysAsDays() {
    WorkLine today = new WorkLine(TestDesk.NOW, "Noor", "Strings fitted");
    WorkLine before = new WorkLine(TestDesk.NOW.minusSeconds(200_000), "Edda", "Looked at");
    model.take(
        new VisitRecord(
            blank.visit(),
            blank.instrument(),
            null,
            List.of(),
            List.of(),
            List.of(),
            List.of(before, today),
            List.of(),
            VisitAim.USUAL));
    assertThat(model.work())
        .containsExactly(
            new WrittenLine("29 Nov", "", "Looked at"),
            new WrittenLine("11:30", "", "Strings fitted"));
  }
}
