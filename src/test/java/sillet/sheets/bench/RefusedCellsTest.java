package sillet.sheets.bench;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.logbook.text.Texts;
import sillet.sheets.csv.Remark;

/** Every cell the contract of the bench sheet refuses, one at a time. */
class RefusedCellsTest {
  @TempDir Path folder;

  @ParameterizedTest
  @ValueSource(strings = {"instrument", "string", "pitch", "scale_mm", "gauge_in", "construction"})
  void refusesARequiredCellThatIsBlank(String column) throws IOException {
    List<Remark> refusals = Sheets.refusals(folder, Sheets.with(column, "  "));

    assertThat(refusals).extracting(r -> r.message().key()).containsExactly("bench.cell-blank");
    assertThat(refusals.get(0).place().header()).isEqualTo(column);
    assertThat(refusals.get(0).place().line()).isEqualTo(2);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "scale_mm",
        "gauge_in",
        "core_in",
        "unit_mass_g_m",
        "action12_mm",
        "nutgap1_mm",
        "relief_mm",
        "sd_cents",
        "screw_mm",
        "room_back_mm",
        "room_forward_mm"
      })
  void refusesWhatIsNoNumber(String column) throws IOException {
    for (String cell :
        List.of("much", "NaN", "Infinity", "-Infinity", "1e3", "0x10", "1.2.3", "--1", "1 2")) {
      assertThat(brief(Sheets.with(column, cell)))
          .as("%s in %s", cell, column)
          .containsExactly("number.none");
    }
    assertThat(brief(Sheets.with(column, "1,234"))).containsExactly("number.ambiguous");
  }

  @ParameterizedTest
  @CsvSource({
    "scale_mm, 0", "scale_mm, -648", "gauge_in, 0", "gauge_in, -.01", "core_in, 0",
    "core_in, -.01", "unit_mass_g_m, 0", "unit_mass_g_m, -1", "screw_mm, 0", "screw_mm, -0.5"
  })
  void refusesWhatHasToBeAboveZero(String column, String cell) throws IOException {
    assertThat(brief(Sheets.with(column, cell))).containsExactly("bench.not-above-zero");
  }

  @ParameterizedTest
  @ValueSource(strings = {"sd_cents", "room_back_mm", "room_forward_mm"})
  void refusesWhatCannotBeBelowZero(String column) throws IOException {
    assertThat(brief(Sheets.with(column, "-0.1"))).containsExactly("bench.below-zero");
    assertThat(brief(Sheets.with(column, "0"))).isEmpty();
  }

  @ParameterizedTest
  @CsvSource({
    "string, 0, bench.string-number",
    "string, -1, bench.string-number",
    "string, 1.5, bench.string-number",
    "string, 1.0, bench.string-number",
    "string, one, bench.string-number",
    "string, 99999999999999999999, bench.string-number",
    "pitch, H4, pitch.none",
    "pitch, E, pitch.none",
    "pitch, 0, pitch.none",
    "pitch, -329.63, pitch.none",
    "pitch, NaN, pitch.none",
    "construction, steel, bench.word-unknown",
    "against, fretted, bench.word-unknown",
    "nut_movable, yes, bench.word-unknown",
    "f12, sharp, bench.reading-none",
    "f12, NaN, bench.reading-none",
    "f12, 3.1/, bench.reading-none",
    "f12, 100.1, cents.too-far",
    "f12, -100.1, cents.too-far",
    "f12, 3/100.1, cents.too-far",
    "f1, 101, cents.too-far",
    "f24, x, bench.reading-none",
    "f0, 101, cents.too-far",
    "f0, x, bench.reading-none"
  })
  void refusesWhatCannotBe(String column, String cell, String key) throws IOException {
    assertThat(brief(Sheets.with(column, cell))).containsExactly(key);
  }

  @Test
  void refusesAReadingThatCouldBeTwoNumbers() throws IOException {
    assertThat(brief(Sheets.with("f12", "1,234"))).containsExactly("number.ambiguous");
    assertThat(brief(Sheets.with("pitch", "1,234"))).containsExactly("number.ambiguous");
  }

  @ParameterizedTest
  @CsvSource({
    "plain-steel, 0.010, ''",
    "plain-steel, .01, ''",
    "plain-steel, 0.009, string.core-of-plain",
    "plain-steel, 0.011, string.core-of-plain",
    "wound-steel, 0.009, ''",
    "wound-steel, 0.010, string.core-too-thick",
    "wound-nylon, 0.011, string.core-too-thick"
  })
  void holdsTheCoreAgainstTheGauge(String construction, String core, String key)
      throws IOException {
    String sheet = Sheets.with("core_in", core).replace("plain-steel", construction);

    assertThat(String.join(" ", brief(sheet))).isEqualTo(key);
  }

  @Test
  void quotesAtMostFortyCharactersWithControlCharactersShown() throws IOException {
    String cell = "\u001b[31m" + "x".repeat(60);

    Remark refusal = Sheets.refusals(folder, Sheets.with("construction", cell)).get(0);

    assertThat(refusal.message().values().get(0)).isEqualTo("\\u001b[31m" + "x".repeat(35) + "...");
  }

  @Test
  void saysPlaceWhatWasReadAndWhatWasExpected() throws IOException {
    Remark refusal = Sheets.refusals(folder, Sheets.with("pitch", "H4")).get(0);

    assertThat(refusal.said(Texts.english()))
        .isEqualTo(
            "line 2, column 3 (pitch): “H4” is no pitch; expected a note with its octave like E4,"
                + " F#3, Bb2, or hertz like 329.63");
  }

  private List<String> brief(String sheet) throws IOException {
    return Sheets.refusals(folder, sheet).stream().map(r -> r.message().key()).toList();
  }
}
