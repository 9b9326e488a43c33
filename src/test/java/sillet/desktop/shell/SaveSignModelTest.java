package sillet.desktop.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Instant;
import org.junit.jupiter.api.Test;
import sillet.logbook.text.Message;

class SaveSignModelTest {
  private static final Instant AT = Instant.parse("2025-12-01T20:14:59Z");

  private final SaveSignModel sign = new SaveSignModel(TestWindow.CLOCK);

  @Test
  void saysTheTimeOfTheShop() {
    sign.saved(AT);

    assertThat(sign.signProperty().get().words()).isEqualTo(Message.of("shell.saved", "21:14"));
    assertThat(sign.signProperty().get().shape()).isEqualTo(SaveSignModel.Shape.FULL);
  }

  @Test
  void keepsTheReasonUntilASaveSucceeds() {
    Message why = Message.of("problem.disk", "x");
    sign.notSaved(why);
    assertThat(sign.signProperty().get().why()).contains(why);

    sign.draft(AT);
    assertThat(sign.signProperty().get().shape()).isEqualTo(SaveSignModel.Shape.HALF);

    sign.saved(AT);
    assertThat(sign.signProperty().get().why()).isEmpty();
  }
}
