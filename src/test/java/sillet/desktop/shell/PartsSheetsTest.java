package sillet.desktop.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.concurrent.TimeoutException;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Fret sheet and pickup sheet of instruments of the demo shop, by keyboard alone. */
class PartsSheetsTest {
  @TempDir Path folder;

  @Test
  void namesTheNutAndTheMisplacedFretOfTheDemo() throws TimeoutException {
    try (TestWindow window = demo("lapwing", 2)) {
      window.press(KeyCode.CONTROL, KeyCode.F);

      // the demo's nut stands 0.4 mm too far and its fret 7 a quarter of a millimetre off
      window.untilSaid("Fret 7 costs most");
      assertThat(window.texts()).anyMatch(text -> text.contains("0.40 mm too far from the frets"));
      assertThat(window.focused()).isEqualTo("fret-1");
      window.press(KeyCode.F7);
      window.untilSaid("against scale and nut)");
      window.press(KeyCode.ESCAPE);
      window.untilRows("#visit-list", 2);
    }
  }

  @Test
  void keepsPlacesThatWereTypedAndSaysWhatIsWrong() throws TimeoutException {
    try (TestWindow window = demo("trawler", 1)) {
      window.press(KeyCode.CONTROL, KeyCode.F);
      window.untilSaid("Nothing is measured yet");
      window.type("2000");
      window.press(KeyCode.ENTER);
      window.untilSaid("Fret 1: Must lie between");
      assertThat(window.focused()).isEqualTo("fret-2");
      window.press(KeyCode.UP);
      window.type("48.5");
      window.press(KeyCode.CONTROL, KeyCode.ENTER);
      window.untilSaid("Measured on 1 Dec 2025.");

      window.press(KeyCode.ESCAPE);
      window.untilRows("#visit-list", 1);
      window.press(KeyCode.CONTROL, KeyCode.F);
      window.untilSaid("Measured on 1 Dec 2025.");
      assertThat(window.texts()).contains("48.5");
    }
  }

  @Test
  void keepsAPickupAndItsHeight() throws TimeoutException {
    try (TestWindow window = demo("trawler", 1)) {
      window.press(KeyCode.CONTROL, KeyCode.P);
      window.untilSaid("No height is written down yet");
      window.type("split");
      window.press(KeyCode.TAB);
      window.type("216");
      window.press(KeyCode.TAB);
      window.type("2.4");
      window.press(KeyCode.CONTROL, KeyCode.ENTER);
      window.untilSaid("1 Dec 2025");
      assertThat(window.texts()).contains("2.40");
      assertThat(window.texts()).anyMatch(text -> text.contains("Lower the pickups"));

      window.press(KeyCode.ESCAPE);
      window.untilRows("#visit-list", 1);
      window.press(KeyCode.CONTROL, KeyCode.P);
      window.untilSaid("split");
    }
  }

  private TestWindow demo(String instrument, int visits) throws TimeoutException {
    TestWindow window = TestWindow.over(folder);
    window.untilShown("#open-demo");
    window.press(KeyCode.CONTROL, KeyCode.D);
    window.untilRows("#bench-list", 3);
    window.press(KeyCode.F3);
    window.type(instrument);
    window.untilRows("#instrument-list", 1);
    window.press(KeyCode.ENTER);
    window.press(KeyCode.ENTER);
    window.untilRows("#visit-list", visits);
    return window;
  }
}
