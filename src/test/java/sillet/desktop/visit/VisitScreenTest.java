package sillet.desktop.visit;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.concurrent.TimeoutException;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Test;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.CheckMethod;
import sillet.logbook.visits.Moment;
import sillet.logbook.visits.NoteKind;
import sillet.logbook.visits.Travel;

/** The page under the hand: keys in, actions on the disk, words out. */
class VisitScreenTest {
  @Test
  void confirmsMovesAndLeavesThemWithEscape() throws TimeoutException {
    try (VisitWindow window = VisitWindow.blank()) {
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
    try (VisitWindow window = VisitWindow.blank()) {
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
    try (VisitWindow window = VisitWindow.blank()) {
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
    try (VisitWindow window = VisitWindow.blank()) {
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
    try (VisitWindow window = VisitWindow.blank()) {
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
  void goesToTheHistoryWithoutWipingTheReadingInHand() throws TimeoutException {
    try (VisitWindow window = VisitWindow.blank()) {
      window.type("5.0");
      window.press(KeyCode.ENTER);
      window.press(KeyCode.SHIFT, KeyCode.ENTER);
      window.press(KeyCode.CONTROL, KeyCode.H);
      assertThat(window.desk.went).containsExactly("history");
      assertThat(window.field("#cell-1-12")).isEqualTo("+5.0");
      window.press(KeyCode.CONTROL, KeyCode.F);
      assertThat(window.desk.went).containsExactly("history", "forecast 2417");
    }
  }

  @Test
  void choosesTheAimByKeyAndKeepsItWithTheVisit() throws TimeoutException {
    try (VisitWindow window = VisitWindow.blank()) {
      window.press(KeyCode.F5);
      assertThat(window.record().aim().aim()).isEqualTo(AimChoice.NECK);
      assertThat(window.says("for frets 1 to 12")).isTrue();
      window.press(KeyCode.F5);
      assertThat(window.record().aim().aim().word()).isEqualTo("1 5 7 12");
      window.press(KeyCode.SHIFT, KeyCode.F5);
      assertThat(window.record().aim().nut()).isEqualTo(NutMovable.EACH);
      window.focus("#aim-own");
      window.press(KeyCode.CONTROL, KeyCode.A);
      window.type("1 5:2 12");
      window.press(KeyCode.ENTER);
      assertThat(window.record().aim().aim().word()).isEqualTo("1 5:2 12");
    }
  }

  @Test
  void opensTheCellsOfOneFretWhereManyAreRead() throws TimeoutException {
    try (VisitWindow window = VisitWindow.blank()) {
      window.focus("#shown-frets");
      window.press(KeyCode.CONTROL, KeyCode.A);
      window.type("1 2 3 5 7 9 12 15 17");
      window.press(KeyCode.ENTER);
      assertThat(window.now(() -> window.node("#cell-1-12").getParent().isVisible())).isTrue();
      assertThat(window.now(() -> window.node("#cell-1-2").getParent().isVisible())).isFalse();
      window.focus("#cell-1-12");
      window.type("5.0");
      window.press(KeyCode.TAB);
      assertThat(window.focused()).isEqualTo("cell-1-15");
      assertThat(window.now(() -> window.node("#cell-1-12").getParent().isVisible())).isFalse();
      assertThat(window.says("frets 1 to 12:")).isTrue();
    }
  }

  @Test
  void walksThePartsOfThePageByKey() throws TimeoutException {
    try (VisitWindow window = VisitWindow.blank()) {
      window.press(KeyCode.F6);
      assertThat(window.focused()).isEqualTo("findings");
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
