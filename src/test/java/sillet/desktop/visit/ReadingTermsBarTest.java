package sillet.desktop.visit;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Clock;
import java.time.ZoneOffset;
import java.util.List;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicInteger;
import javafx.event.ActionEvent;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import sillet.acoustics.readings.Reference;
import sillet.desktop.drawing.Picture;
import sillet.desktop.visit.readings.ReadingTerms;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.InstrumentPast;

class ReadingTermsBarTest {
  private final VisitModel model =
      new VisitModel(
          TestVisits.six(List.of()),
          InstrumentPast.NONE,
          new MoveAdvisor(75),
          Clock.fixed(TestDesk.NOW, ZoneOffset.UTC));
  private final AtomicInteger changes = new AtomicInteger();

  @BeforeAll
  static void startToolkit() throws TimeoutException {
    Picture.startToolkit();
  }

  private TextField scatter() {
    ReadingTermsBar bar =
        new ReadingTermsBar(
            model, Texts.english(), new Label(), () -> {}, changes::incrementAndGet);
    return (TextField) bar.lookup("#scatter");
  }

  @Test
  void aScatterOfHundredthsStaysWhenTheFieldIsOnlyPassedThrough() {
    model.readUnder(new ReadingTerms(Reference.OPEN, 0.25));
    String shown =
        Picture.onFxThread(
            () -> {
              TextField field = scatter();
              field.fireEvent(new ActionEvent());
              return field.getText();
            });
    assertThat(shown).isEqualTo("0.25");
    assertThat(model.terms().sdCents()).isEqualTo(0.25);
    assertThat(changes).hasValue(0);
  }

  @Test
  void takesAScatterThatWasTyped() {
    Picture.onFxThread(
        () -> {
          TextField field = scatter();
          field.setText("0.15");
          field.fireEvent(new ActionEvent());
          return field;
        });
    assertThat(model.terms().sdCents()).isEqualTo(0.15);
    assertThat(changes).hasValue(1);
  }
}
