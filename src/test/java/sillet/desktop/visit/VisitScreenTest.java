package sillet.desktop.visit;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.concurrent.TimeoutException;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Test;
import sillet.acoustics.moves.Reference;
import sillet.desktop.theme.Looks;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.CheckMethod;
import sillet.logbook.visits.Moment;
import sillet.logbook.visits.NoteKind;
import sillet.logbook.visits.Reading;
import sillet.logbook.visits.Travel;

/** The page under the hand: keys in, actions on the disk, words out. */
class VisitScreenTest {

  private static VisitWindow blank() throws TimeoutException {
    return VisitWindow.over(
        visits -> visits.takeIn(SampleVisits.six(), SampleVisits.sixStrings(648), List.of()));
  }

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
    try (VisitWindow window = blank()) {
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
    try (VisitWindow window = blank()) {
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
    try (VisitWindow window = blank()) {
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
    try (VisitWindow window = blank()) {
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
    try (VisitWindow window = blank()) {
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
    try (VisitWindow window = blank()) {
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
    try (VisitWindow window = blank()) {
      window.type("5.0");
      window.leave();
      assertThat(readings(window)).containsExactly("1 1/12 5.0");
    }
  }

  @Test
  void showsCellsAtOtherFretsAndReadsTheOpenString() throws TimeoutException {
    try (VisitWindow window = blank()) {
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
    try (VisitWindow window = blank()) {
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

  @Test
  void confirmsMovesAndLeavesThemWithEscape() throws TimeoutException {
    try (VisitWindow window = blank()) {
      window.type("5.0");
      window.press(KeyCode.ENTER);
      window.press(KeyCode.F8);
      assertThat(window.focused()).isEqualTo("made-1");
      assertThat(window.field("#made-1")).isEqualTo("3 3/4");
      window.press(KeyCode.ESCAPE);
      assertThat(window.record().moves()).isEmpty();
      window.press(KeyCode.F8);
      window.type("3.5");
      window.press(KeyCode.ENTER);
      assertThat(window.focused()).isEqualTo("made-2");
      window.type("0.4mm");
      window.fire("#made-way-2");
      window.press(KeyCode.F8);
      assertThat(window.record().moves())
          .extracting(move -> move.string() + " " + move.saddleMm() + " " + move.turns())
          .containsExactly("1 1.75 3.5", "2 -0.4 null");
      assertThat(window.focused()).isEqualTo("cell-1-12");
      assertThat(window.field("#cell-1-12")).isEmpty();
      window.press(KeyCode.CONTROL, KeyCode.PAGE_UP);
      assertThat(window.field("#cell-1-12")).isEqualTo("+5.0");
    }
  }

  @Test
  void keepsChecksWithTheirFretAndMethod() throws TimeoutException {
    try (VisitWindow window = blank()) {
      window.focus("#check-action-1-received");
      window.type("4/64");
      window.press(KeyCode.ENTER);
      assertThat(window.focused()).isEqualTo("check-action-6-received");
      var check = window.record().checks().get(0);
      assertThat(check.kind()).isEqualTo(CheckKind.ACTION);
      assertThat(check.fret()).isEqualTo(12);
      assertThat(check.method()).isEqualTo(CheckMethod.OPEN);
      assertThat(check.moment()).isEqualTo(Moment.RECEIVED);
      assertThat(check.typed()).isEqualTo("4/64");
      window.type("25");
      assertThat(window.says("25: ")).isTrue();
      window.press(KeyCode.ENTER);
      assertThat(window.record().checks()).as("unusual is asked, not blocked").hasSize(2);
    }
  }

  @Test
  void keepsTheRoomAtASaddleAndSaysWhatDoesNotFit() throws TimeoutException {
    try (VisitWindow window = blank()) {
      window.type("5.0");
      window.focus("#room-back-1");
      window.type("1");
      window.press(KeyCode.ENTER);
      assertThat(window.record().visit().travel()).containsExactly(new Travel(1, 1.0, null));
      assertThat(window.says("no room: 0.8")).isTrue();
      assertThat(window.says("No room, string 1")).isTrue();
      assertThat(window.focused()).isEqualTo("room-back-2");
    }
  }

  @Test
  void writesWorkNotesAndAdvice() throws TimeoutException {
    try (VisitWindow window = blank()) {
      window.press(KeyCode.CONTROL, KeyCode.L);
      window.type("Frets wiped");
      window.press(KeyCode.ENTER);
      assertThat(window.record().work().get(0).text()).isEqualTo("Frets wiped");
      assertThat(window.record().work().get(0).technician()).isEqualTo("Noor");
      assertThat(window.field("#work-line")).isEmpty();
      window.fire("#note-kind-advice");
      window.type("Keep it humid");
      window.press(KeyCode.ENTER);
      assertThat(window.record().notes().get(0).kind()).isEqualTo(NoteKind.ADVICE);
      assertThat(window.says("advice: Keep it humid")).isTrue();
    }
  }

  @Test
  void handsOutOnlyWhenSureAndThenNothingIsTypedAnyMore() throws TimeoutException {
    try (VisitWindow window = blank()) {
      window.desk.sure = false;
      window.press(KeyCode.CONTROL, KeyCode.ENTER);
      assertThat(window.desk.went).containsExactly("asked visit.hand-out.sure");
      assertThat(window.record().visit().handedOut()).isNull();
      window.desk.sure = true;
      window.press(KeyCode.CONTROL, KeyCode.ENTER);
      assertThat(window.record().visit().handedOut()).isEqualTo("2026-12-01");
      assertThat(window.says("Handed out Tue 1 Dec")).isTrue();
      boolean editable = window.now(() -> ((TextField) window.node("#cell-1-12")).isEditable());
      assertThat(editable).isFalse();
      window.focus("#cell-1-12");
      window.press(KeyCode.UP);
      window.press(KeyCode.ENTER);
      assertThat(window.record().readings()).isEmpty();
    }
  }

  @Test
  void walksThePartsOfThePageByKey() throws TimeoutException {
    try (VisitWindow window = blank()) {
      window.press(KeyCode.F6);
      assertThat(window.focused()).startsWith("check-");
      window.press(KeyCode.F6);
      assertThat(window.focused()).isEqualTo("room-back-1");
      window.press(KeyCode.F6);
      assertThat(window.focused()).isEqualTo("work-line");
      window.press(KeyCode.F6);
      assertThat(window.focused()).isEqualTo("note-line");
      window.press(KeyCode.F6);
      assertThat(window.focused()).isEqualTo("hand-out");
      window.press(KeyCode.F6);
      assertThat(window.focused()).isEqualTo("cell-1-12");
      window.press(KeyCode.SHIFT, KeyCode.F6);
      assertThat(window.focused()).isEqualTo("hand-out");
    }
  }

  @Test
  void saysSoWhereThereIsNoSuchVisit() throws TimeoutException {
    try (VisitWindow window = VisitWindow.over(visits -> {})) {
      assertThat(window.says("There is no visit with ticket 2417")).isTrue();
    }
  }
}
