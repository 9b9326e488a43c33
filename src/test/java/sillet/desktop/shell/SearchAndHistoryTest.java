package sillet.desktop.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.concurrent.TimeoutException;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.logbook.demo.DemoShop;

/** Over the demo shop, by keyboard alone. */
class SearchAndHistoryTest {
  @TempDir Path folder;

  @Test
  void findsAnInstrumentByThePhoneNumberOfItsCustomer() throws TimeoutException {
    try (TestWindow window = demo()) {
      window.press(KeyCode.F3);
      window.type("0119");
      window.untilRows("#instrument-list", 1);

      assertThat(window.texts()).contains("Brindlemoor (demo) Lapwing");
    }
  }

  @Test
  void findsAnInstrumentByATicket() throws TimeoutException {
    try (TestWindow window = demo()) {
      window.press(KeyCode.F3);
      window.type(Integer.toString(DemoShop.OPEN_TICKET + 1));
      window.untilRows("#instrument-list", 1);

      assertThat(window.texts()).contains("Ostwick (demo) Trawler");
    }
  }

  @Test
  void saysThatNothingWasFoundAndFindsAllAgain() throws TimeoutException {
    try (TestWindow window = demo()) {
      window.press(KeyCode.CONTROL, KeyCode.DIGIT2);
      window.untilRows("#instrument-list", 4);
      window.press(KeyCode.F3);
      window.type("zzz");
      window.untilShown("#instruments-said");
      assertThat(window.text("#instruments-said")).contains("zzz");

      window.press(KeyCode.ESCAPE);
      window.untilRows("#instrument-list", 4);
      assertThat(window.text("#instrument-count")).isEqualTo("4 in all");
    }
  }

  @Test
  void showsBeforeAndAfterOfAFinishedVisit() throws TimeoutException {
    try (TestWindow window = demo()) {
      window.press(KeyCode.F3);
      window.type("lapwing");
      window.untilRows("#instrument-list", 1);
      window.press(KeyCode.ENTER);
      window.press(KeyCode.ENTER);
      window.untilRows("#visit-list", 2);
      window.press(KeyCode.DOWN);
      window.untilSaid("ticket " + DemoShop.FINISHED_TICKET);

      // string 3 of the finished visit was read 6.1/6.4/6.2 first and 0.4/0.2/0.3 last; relief
      // 0.28 and 0.22 mm; its saddle went 2.29 mm
      assertThat(window.texts()).contains("+6.2", "+0.3", "\u22121.9", "0.28", "0.22");
      assertThat(window.texts()).anyMatch(text -> text.contains("2.29 mm away from neck"));
      assertThat(window.texts()).anyMatch(text -> text.contains("0.70 mm toward neck"));
    }
  }

  @Test
  void goesBackTheWayItCame() throws TimeoutException {
    try (TestWindow window = demo()) {
      window.press(KeyCode.CONTROL, KeyCode.DIGIT2);
      window.untilRows("#instrument-list", 4);
      window.press(KeyCode.DOWN);
      window.press(KeyCode.ENTER);
      window.untilShown("#history-name");
      window.press(KeyCode.ALT, KeyCode.LEFT);
      window.untilShown("#instrument-list");
      assertThat(window.list("#instrument-list").getSelectionModel().getSelectedIndex())
          .isEqualTo(1);
      window.press(KeyCode.ESCAPE);
      window.untilShown("#bench-list");
    }
  }

  private TestWindow demo() throws TimeoutException {
    TestWindow window = TestWindow.over(folder);
    window.untilShown("#open-demo");
    window.press(KeyCode.CONTROL, KeyCode.D);
    window.untilRows("#bench-list", 3);
    return window;
  }
}
