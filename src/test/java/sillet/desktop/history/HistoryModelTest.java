package sillet.desktop.history;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import sillet.desktop.controls.Visits;
import sillet.logbook.text.Message;
import sillet.logbook.visits.NoteKind;
import sillet.logbook.visits.VisitNote;
import sillet.logbook.visits.VisitRecord;
import sillet.store.reading.InstrumentLine;
import sillet.store.reading.Kept;

class HistoryModelTest {
  private static final Instant AT = Instant.parse("2025-12-01T10:00:00Z");
  private static final VisitRecord OLD =
      Visits.ticket(7)
          .takenIn("2023-10-12")
          .note(new VisitNote(AT, NoteKind.DECLINED, "New saddles"))
          .note(new VisitNote(AT, NoteKind.ADVICE, "Keep it moist"))
          .record();
  private static final VisitRecord NEW = Visits.ticket(42).takenIn("2025-12-01").record();
  private static final InstrumentLine LINE =
      new InstrumentLine(new Kept<>(OLD.instrument(), 1), null, 2, null, 42);

  private final HistoryModel model = new HistoryModel();

  @Test
  void choosesTheNewestVisitFirst() {
    model.show(Optional.of(LINE), List.of(NEW, OLD));

    assertThat(model.chosenProperty().get()).contains(NEW);
    assertThat(model.oldestFirst()).containsExactly(OLD, NEW);
  }

  @Test
  void keepsTheChosenVisitWhenItIsFetchedAgain() {
    model.show(Optional.of(LINE), List.of(NEW, OLD));
    model.chosenProperty().set(Optional.of(OLD));
    model.show(Optional.of(LINE), List.of(NEW, OLD));

    assertThat(model.chosenProperty().get()).contains(OLD);
  }

  @Test
  void saysWhenTheInstrumentIsGone() {
    model.show(Optional.empty(), List.of());

    assertThat(model.troubleProperty().get()).contains(Message.of("history.gone"));
  }

  @Test
  void gathersWhatWasDeclined() {
    model.show(Optional.of(LINE), List.of(NEW, OLD));

    assertThat(model.declined())
        .extracting(HistoryModel.Declined::text)
        .containsExactly("New saddles");
  }
}
