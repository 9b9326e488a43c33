package sillet.desktop.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.concurrent.TimeoutException;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** String sets over the demo shop, by keyboard alone. */
class StringSetsTest {
  @TempDir Path folder;

  @Test
  void showsTheTensionOfEveryStringBesideAComparedSet() throws TimeoutException {
    try (TestWindow window = demo()) {
      window.press(KeyCode.SPACE);
      window.press(KeyCode.DOWN);
      window.untilSaid("Light six (demo)");

      // .010 at E4 and 648 mm: 72.4 N, the full model's worked reference
      assertThat(window.texts()).contains("72.4", "53\u00a0%", ".010", "compared");
      assertThat(window.texts()).anyMatch(text -> text.contains("the neck carries"));
    }
  }

  @Test
  void keepsACopyThatWasChanged() throws TimeoutException {
    try (TestWindow window = demo()) {
      window.press(KeyCode.DOWN);
      window.press(KeyCode.CONTROL, KeyCode.D);
      window.untilShown("#set-name-field");
      assertThat(window.focused()).isEqualTo("set-name-field");
      window.press(KeyCode.CONTROL, KeyCode.A);
      window.type("A thinner one");
      window.press(KeyCode.TAB);
      window.press(KeyCode.TAB);
      window.press(KeyCode.CONTROL, KeyCode.A);
      window.type("9.5");
      window.press(KeyCode.CONTROL, KeyCode.ENTER);

      window.untilRows("#set-list", 5);
      window.untilSaid("A thinner one");
      assertThat(window.texts()).contains(".0095");
      window.press(KeyCode.CONTROL, KeyCode.DIGIT1);
      window.press(KeyCode.CONTROL, KeyCode.DIGIT3);
      window.untilRows("#set-list", 5);
    }
  }

  @Test
  void keepsNothingThatCannotBeTakenAndSaysWhy() throws TimeoutException {
    try (TestWindow window = demo()) {
      window.press(KeyCode.CONTROL, KeyCode.N);
      window.untilShown("#set-name-field");
      window.type("Half a set");
      window.press(KeyCode.CONTROL, KeyCode.ENTER);
      window.untilSaid("Type the gauge as printed");
      assertThat(window.focused()).isEqualTo("set-gauge-1");

      window.press(KeyCode.ESCAPE);
      window.untilRows("#set-list", 4);
    }
  }

  @Test
  void saysBesideTheTuningWhatIsWrongWithIt() throws TimeoutException {
    try (TestWindow window = demo()) {
      window.robot.clickOn("#sets-tuning");
      window.press(KeyCode.CONTROL, KeyCode.A);
      window.type("E4 B3");
      window.press(KeyCode.TAB);
      window.untilSaid("This set has 6 strings, 2 pitches were read.");
      assertThat(window.texts()).anyMatch(text -> text.startsWith("Type a pitch for every string"));
    }
  }

  @Test
  void makesASetOfTheNearestGauges() throws TimeoutException {
    try (TestWindow window = demo()) {
      window.press(KeyCode.DOWN);
      window.press(KeyCode.F7);
      window.untilShown("#ladder-set");
      assertThat(window.focused()).isEqualTo("sets-wanted");
      window.fire("#ladder-set");
      window.untilShown("#set-name-field");
      window.press(KeyCode.CONTROL, KeyCode.ENTER);
      window.untilRows("#set-list", 5);
      window.untilSaid("Light six (demo), equal tension");
    }
  }

  private TestWindow demo() throws TimeoutException {
    TestWindow window = TestWindow.over(folder);
    window.untilShown("#open-demo");
    window.press(KeyCode.CONTROL, KeyCode.D);
    window.untilRows("#bench-list", 3);
    window.press(KeyCode.CONTROL, KeyCode.DIGIT3);
    window.untilRows("#set-list", 4);
    return window;
  }
}
