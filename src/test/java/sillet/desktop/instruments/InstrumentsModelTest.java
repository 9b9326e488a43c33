package sillet.desktop.instruments;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.desktop.controls.Visits;
import sillet.logbook.text.Message;
import sillet.store.reading.Found;
import sillet.store.reading.InstrumentLine;
import sillet.store.reading.Kept;

class InstrumentsModelTest {
  private static final InstrumentLine LINE =
      new InstrumentLine(
          new Kept<>(Visits.ticket(1).record().instrument(), 1), null, 1, null, null);

  private final InstrumentsModel model = new InstrumentsModel();

  @Test
  void dropsTheAnswerToAnOlderQuestion() {
    int older = model.ask();
    int newer = model.ask();
    model.answer(newer, "b", found(2, 2));
    model.answer(older, "a", found(7, 7));

    assertThat(model.countProperty().get()).isEqualTo(2);
    assertThat(model.lines()).hasSize(2);
  }

  @Test
  void dropsTheTroubleOfAnOlderQuestion() {
    int older = model.ask();
    model.answer(model.ask(), "b", found(1, 1));
    model.failed(older, Message.of("problem.disk", "x"));

    assertThat(model.troubleProperty().get()).isEmpty();
  }

  @Test
  void saysThatOnlyTheFirstAreShown() {
    model.answer(model.ask(), "o", found(Found.MOST, 312));

    assertThat(model.heading()).isEqualTo(Message.of("instruments.first", "312", "50"));
  }

  @Test
  void tellsAnEmptyLogbookFromAFruitlessSearch() {
    assertThat(model.emptySentence()).isEmpty();

    model.answer(model.ask(), " ", found(0, 0));
    assertThat(model.emptySentence()).contains(Message.of("instruments.empty"));

    model.answer(model.ask(), " zzz ", found(0, 0));
    assertThat(model.emptySentence()).contains(Message.of("instruments.nothing-found", "zzz"));
  }

  private static Found<InstrumentLine> found(int shown, int count) {
    return new Found<>(List.copyOf(Collections.nCopies(shown, LINE)), count);
  }
}
