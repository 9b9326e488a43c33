package sillet.desktop.visit;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.concurrent.TimeoutException;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Test;
import sillet.acoustics.readings.Reference;
import sillet.desktop.theme.Looks;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.Reading;

/** Readings under the hand: keys in, actions on the disk, words out. */
class ReadingCellsTest {
  private static List<String> readings(VisitWindow window) {
    return window.record().readings().stream()
        .map(
            one ->
                one.pass()
                    + " "
                    + one.string()
                    + "/"
                    + one.fret()
                    + " "
                    + (one.tries() == null ? "taken back" : one.tries().written()))
        .toList();
  }

  @Test
  void savesEachReadingWhenItIsDoneAndSaysDraftBefore() throws TimeoutException {
    try (VisitWindow window = VisitWindow.blank()) {
      assertThat(window.focused()).isEqualTo("cell-1-12");
      window.type("5,0");
      assertThat(window.desk.sign()).isEqualTo("draft");
      assertThat(window.record().readings()).isEmpty();
      assertThat(window.says("1.86\u00a0mm")).isTrue();
      window.press(KeyCode.ENTER);
      assertThat(window.desk.sign()).isEqualTo("saved");
      assertThat(readings(window)).containsExactly("1 1/12 5.0");
      assertThat(window.focused()).isEqualTo("cell-2-12");
      assertThat(window.field("#cell-1-12")).isEqualTo("+5.0");
    }
  }

  @Test
  void goesOverTheGridWithEnterTabAndArrows() throws TimeoutException {
    try (VisitWindow window = VisitWindow.blank()) {
      window.press(KeyCode.TAB);
      assertThat(window.focused()).isEqualTo("cell-2-1");
      window.press(KeyCode.SHIFT, KeyCode.TAB);
      assertThat(window.focused()).isEqualTo("cell-1-12");
      window.focus("#cell-6-5");
      window.press(KeyCode.ENTER);
      assertThat(window.focused()).isEqualTo("cell-1-12");
      window.press(KeyCode.UP);
      window.press(KeyCode.UP);
      window.press(KeyCode.DOWN);
      assertThat(window.field("#cell-1-12")).isEqualTo("+0.1");
      window.focus("#cell-6-12");
      window.press(KeyCode.TAB);
      assertThat(window.focused())
          .as("Tab leaves the grid after its last cell")
          .isNotEqualTo("cell-6-12");
    }
  }

  @Test
  void takesSeveralTriesAndAddsToThemLater() throws TimeoutException {
    try (VisitWindow window = VisitWindow.blank()) {
      window.type("2.6 2.8");
      window.press(KeyCode.ENTER);
      window.press(KeyCode.SHIFT, KeyCode.ENTER);
      assertThat(window.field("#cell-1-12")).isEqualTo("2.6 2.8");
      window.type("/3.3");
      window.press(KeyCode.ENTER);
      assertThat(readings(window)).containsExactly("1 1/12 2.6/2.8", "1 1/12 2.6/2.8/3.3");
      assertThat(window.field("#cell-1-12")).isEqualTo("+2.8");
    }
  }

  @Test
  void marksWhatCannotBeReadKeepsItAndSaysWhy() throws TimeoutException {
    try (VisitWindow window = VisitWindow.blank()) {
      window.type("31o");
      window.press(KeyCode.ENTER);
      assertThat(window.field("#cell-1-12")).isEqualTo("31o");
      assertThat(window.says("\u201c31o\u201d is no number")).isTrue();
      boolean marked =
          window.now(() -> window.node("#cell-1-12").getPseudoClassStates().contains(Looks.ERROR));
      assertThat(marked).isTrue();
      assertThat(window.record().readings()).isEmpty();
    }
  }

  @Test
  void showsAFailedSaveAndKeepsWhatWasTyped() throws TimeoutException {
    try (VisitWindow window = VisitWindow.blank()) {
      window.type("5.0");
      window.logbook.close();
      window.press(KeyCode.ENTER);
      assertThat(window.desk.sign()).startsWith("not saved ");
      assertThat(window.field("#cell-1-12")).isEqualTo("+5.0");
      window.type("3.2");
      assertThat(window.desk.sign()).as("typing on hides no failure").startsWith("not saved ");
      window.press(KeyCode.CONTROL, KeyCode.S);
      assertThat(window.desk.signs.stream().filter(sign -> sign.startsWith("not saved")))
          .hasSize(2);
      window.leave();
      assertThat(window.desk.went).contains("problem visit.left-unsaved");
    }
  }

  @Test
  void takesAReadingBackWhenItsCellIsEmptied() throws TimeoutException {
    try (VisitWindow window = VisitWindow.blank()) {
      window.type("5.0");
      window.press(KeyCode.ENTER);
      window.press(KeyCode.SHIFT, KeyCode.ENTER);
      window.press(KeyCode.BACK_SPACE);
      window.press(KeyCode.ENTER);
      assertThat(readings(window)).containsExactly("1 1/12 5.0", "1 1/12 taken back");
      assertThat(window.says("1.86\u00a0mm")).isFalse();
    }
  }

  @Test
  void leavingThePageKeepsWhatIsBeingTyped() throws TimeoutException {
    try (VisitWindow window = VisitWindow.blank()) {
      window.type("5.0");
      window.leave();
      assertThat(readings(window)).containsExactly("1 1/12 5.0");
    }
  }

  @Test
  void showsCellsAtOtherFretsAndReadsTheOpenString() throws TimeoutException {
    try (VisitWindow window = VisitWindow.blank()) {
      window.focus("#shown-frets");
      window.press(KeyCode.CONTROL, KeyCode.A);
      window.type("0 7 12");
      window.press(KeyCode.ENTER);
      window.focus("#cell-2-0");
      window.type("0.4");
      window.press(KeyCode.TAB);
      assertThat(window.focused()).isEqualTo("cell-2-7");
      assertThat(readings(window)).containsExactly("1 2/0 0.4");
      window.focus("#shown-frets");
      window.press(KeyCode.CONTROL, KeyCode.A);
      window.type("30");
      window.press(KeyCode.ENTER);
      assertThat(window.says("\u201c30\u201d is no fret of this neck")).isTrue();
    }
  }

  @Test
  void recordsHowReadingsAreTaken() throws TimeoutException {
    try (VisitWindow window = VisitWindow.blank()) {
      window.focus("#scatter");
      window.press(KeyCode.CONTROL, KeyCode.A);
      window.type("0.1");
      window.press(KeyCode.ENTER);
      window.fire("#against-harmonic");
      window.focus("#cell-1-12");
      window.type("2.0");
      window.press(KeyCode.ENTER);
      Reading reading = window.record().readings().get(0);
      assertThat(reading)
          .isEqualTo(
              new Reading(1, 1, 12, Tries.parse("2.0"), Reference.HARMONIC, 0.1, TestDesk.NOW));
    }
  }
}
