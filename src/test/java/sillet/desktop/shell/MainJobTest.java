package sillet.desktop.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.TimeoutException;
import javafx.scene.Node;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.acoustics.wire.Construction;
import sillet.desktop.drawing.Picture;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.Heights;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.moves.NoteReadings;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.moves.SaddleRoom;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.units.Figures;
import sillet.logbook.units.Pitch;
import sillet.logbook.units.Tries;

/** The main job in the window, from the counter to the job sheet, with nothing but the keyboard. */
class MainJobTest {
  private static final List<String> PITCHES = List.of("E4", "B3", "G3", "D3", "A2", "E2");
  private static final List<String> GAUGES = List.of("10", "13", "17", "26", "36", "46");
  private static final List<String> FIRST = List.of("5.0", "3.2", "7.8", "0.3", "2.1", "-2.6");
  private static final List<String> SECOND = List.of("0.2", "-0.1", "0.4", "0.3", "0.1", "-0.3");

  @TempDir Path folder;

  @Test
  void goesFromTheCounterToTheJobSheetByKeyboardAlone() throws TimeoutException, IOException {
    Path sheet = folder.resolve("job.csv");
    try (TestWindow window = TestWindow.over(folder)) {
      begin(window);
      takeIn(window);
      window.untilShown("#cell-1-12");
      read(window, FIRST);
      window.untilSaid("Saved");
      movesAppear(window);
      Picture.onFxThread(() -> Picture.of(window.scene())).save("window-first-pass");
      makeMoves(window);
      read(window, SECOND);
      window.untilSaid("\u22122.6 before, \u22120.3 now");
      assertThat(count(window, "within 1 cent")).isEqualTo(5);
      assertThat(window.texts()).contains("+5.0 before, +0.2 now", "leave it");
      Picture.onFxThread(() -> Picture.of(window.scene())).save("window-second-pass");
      window.ask.file = Optional.of(sheet);
      window.press(KeyCode.CONTROL, KeyCode.E);
      window.untilSaid("Job sheet written");
      assertThat(window.ask.problems).isEmpty();
    }
    holdsTheWholeVisit(sheet);
    reopens();
  }

  private static void begin(TestWindow window) {
    window.untilShown("#shop-name");
    window.type("Quay Street Strings");
    window.press(KeyCode.CONTROL, KeyCode.ENTER);
    window.untilShown("#bench-said");
    window.press(KeyCode.CONTROL, KeyCode.N);
    window.untilShown("#customer-name");
  }

  private static void takeIn(TestWindow window) {
    window.type("Maren Oduya");
    on(window, "customer-phone", "555 0148");
    on(window, "customer-note", "");
    on(window, "request", "Sour past the seventh fret.");
    on(window, "promised", "+3");
    on(window, "condition", "Clean");
    on(window, "temperature", "20,5");
    on(window, "humidity", "44");
    on(window, "kind", "");
    on(window, "maker", "Ottersby");
    on(window, "model", "Fieldfare");
    on(window, "serial", "0382");
    on(window, "tag", "");
    on(window, "strings", "6");
    on(window, "scale", "648");
    on(window, "scale-bass", "");
    on(window, "frets", "22");
    on(window, "radius", "12in");
    on(window, "left-handed", "");
    on(window, "saddle", "");
    on(window, "screw", "M3");
    on(window, "sense", "");
    on(window, "set", "");
    on(window, "tuning", "");
    on(window, "pitch-1", "");
    on(window, "gauge-1", "");
    for (String gauge : GAUGES) {
      window.type(gauge);
      if (!gauge.equals("46")) {
        window.press(KeyCode.ENTER);
      }
    }
    on(window, "construction-6", "");
    on(window, "string-scale-6", "");
    on(window, "set-name", "Light six");
    window.press(KeyCode.TAB);
    window.press(KeyCode.SPACE);
    window.press(KeyCode.CONTROL, KeyCode.ENTER);
  }

  /** One step on by Tab, which must lead to the field with that name; then types. */
  private static void on(TestWindow window, String id, String text) {
    window.press(KeyCode.TAB);
    assertThat(Picture.onFxThread(() -> focused(window))).isEqualTo(id);
    if (!text.isEmpty()) {
      window.type(text);
    }
  }

  private static String focused(TestWindow window) {
    for (Node at = window.scene().getFocusOwner(); at != null; at = at.getParent()) {
      if (at.getId() != null) {
        return at.getId();
      }
    }
    return "nothing";
  }

  private static void read(TestWindow window, List<String> cents) {
    for (int string = 1; string <= cents.size(); string++) {
      String cell = "cell-" + string + "-12";
      window.until(() -> focused(window).equals(cell));
      window.type(cents.get(string - 1));
      window.press(KeyCode.ENTER);
    }
  }

  /** What the window says is what the advisor says of the same strings on their own. */
  private static void movesAppear(TestWindow window) {
    List<MoveAdvice> advice =
        new MoveAdvisor(75).advise(benchStrings(), AimChoice.OCTAVE).strings();
    List<String> said = window.texts();
    for (MoveAdvice one : advice) {
      double mm = one.figures().saddleMm();
      assertThat(said).contains(Figures.fixed(Math.abs(mm), 2) + "\u00a0mm");
    }
    assertThat(said).contains("away from neck", "toward neck", "leave it");
    assertThat(String.join(" ", said)).doesNotContain("lockwise");
  }

  private static List<BenchString> benchStrings() {
    List<BenchString> strings = new ArrayList<>();
    for (int i = 0; i < PITCHES.size(); i++) {
      Construction made = i < 3 ? Construction.PLAIN_STEEL : Construction.WOUND_STEEL;
      StringMake make = StringMake.of(Integer.parseInt(GAUGES.get(i)) / 1000.0, made);
      strings.add(
          new BenchString(
              "one",
              new FittedString(i + 1, Pitch.parse(PITCHES.get(i), 440), 648, make),
              Heights.NOT_KNOWN,
              new SaddleRoom(0.5, null, null, SaddleKind.SCREW, null, NutMovable.NO),
              NoteReadings.of(Map.of(12, Tries.parse(FIRST.get(i))))));
    }
    return strings;
  }

  private static void makeMoves(TestWindow window) {
    window.press(KeyCode.F8);
    window.until(() -> focused(window).equals("made-1"));
    String proposed =
        Picture.onFxThread(() -> ((TextField) window.scene().lookup("#made-1")).getText());
    assertThat(proposed).isEqualTo("3 3/4");
    window.press(KeyCode.F8);
    window.untilShown("#pass-2");
    window.until(() -> focused(window).equals("cell-1-12"));
  }

  private static long count(TestWindow window, String text) {
    return window.texts().stream().filter(text::equals).count();
  }

  private static void holdsTheWholeVisit(Path sheet) throws IOException {
    List<String> lines = Files.readAllLines(sheet);
    assertThat(lines.get(0)).startsWith("ticket,taken_in,");
    assertThat(lines.get(0)).endsWith(",note,f12");
    assertThat(lines).hasSize(1 + 6 + 6);
    assertThat(lines.get(1)).contains("Maren Oduya", "Ottersby Fieldfare", "0382", "Light six");
    assertThat(lines.get(1)).contains(",1.875,3.75,away from neck,").endsWith(",5.0");
    assertThat(lines.get(7)).endsWith(",0.2");
  }

  private void reopens() throws TimeoutException {
    try (TestWindow window = TestWindow.over(folder)) {
      window.untilRows("#bench-list", 1);
      window.press(KeyCode.ENTER);
      window.untilShown("#pass-2");
      assertThat(cell(window, 1)).isEqualTo("+0.2");
      assertThat(window.texts()).contains("Maren Oduya", "within 1 cent");
      window.fire("#pass-1");
      window.untilSaid("+5.0 read, ");
      assertThat(cell(window, 1)).isEqualTo("+5.0");
      assertThat(cell(window, 6)).isEqualTo("\u22122.6");
      window.press(KeyCode.ESCAPE);
      window.press(KeyCode.CONTROL, KeyCode.DIGIT2);
      window.untilRows("#instrument-list", 1);
    }
  }

  private static String cell(TestWindow window, int string) {
    return Picture.onFxThread(
        () -> ((TextField) window.scene().lookup("#cell-" + string + "-12")).getText());
  }
}
