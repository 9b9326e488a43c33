package sillet.desktop.theme;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Contrast by WCAG 2.2: text 4.5, graphics 3; the high contrast theme 7 throughout. */
class ThemeColoursTest {
  private static double contrast(String sheet, String token, String ground) throws IOException {
    Map<String, Integer> tokens = new SheetFile(sheet + ".css").tokens();
    return SheetFile.contrast(tokens.get(token), tokens.get(ground));
  }

  @Test
  void blackOnWhiteIsTwentyOne() {
    assertThat(SheetFile.contrast(0x000000, 0xFFFFFF)).isCloseTo(21, within(1e-9));
  }

  @ParameterizedTest
  @CsvSource({
    "light, 4.5, 3",
    "dark, 4.5, 3",
    "contrast, 7, 7",
  })
  void everyTokenCanBeReadOnEveryGround(String sheet, double text, double graphics)
      throws IOException {
    for (String ground : new String[] {"bench", "sheet", "field", "lamp", "band"}) {
      for (String token : new String[] {"ink", "soft", "pencil"}) {
        assertThat(contrast(sheet, token, ground))
            .as("%s on %s", token, ground)
            .isGreaterThan(text);
      }
      assertThat(contrast(sheet, "line", ground)).as("line on %s", ground).isGreaterThan(graphics);
    }
    assertThat(contrast(sheet, "on-ink", "ink")).isGreaterThan(text);
  }

  @ParameterizedTest
  @ValueSource(strings = {"light", "dark", "contrast"})
  void aColourSheetHoldsColoursAndNothingElse(String sheet) throws IOException {
    String text = new SheetFile(sheet + ".css").text();
    assertThat(text.lines().filter(line -> line.contains(":") && !line.startsWith("/*")))
        .allMatch(line -> line.matches("  -(sillet|color)-[a-z0-9-]+: [-#A-Za-z0-9]+;"));
  }

  @ParameterizedTest
  @ValueSource(strings = {"dark", "contrast"})
  void allSheetsSetTheSameNames(String sheet) throws IOException {
    assertThat(names(sheet)).isEqualTo(names("light"));
  }

  private static String names(String sheet) throws IOException {
    return new SheetFile(sheet + ".css").text().replaceAll("/\\*.*?\\*/|: [^;]+;", "");
  }

  @Test
  void theBaseSheetTakesColoursOnlyThroughTokens() throws IOException {
    Map<String, Integer> tokens = new SheetFile("light.css").tokens();
    String rules = new SheetFile("sillet.css").text();
    assertThat(rules.replaceAll("(?s)/\\*.*?\\*/", "")).doesNotContain("#", "rgb", "gradient(");
    var used = java.util.regex.Pattern.compile("-sillet-([a-z-]+)").matcher(rules);
    assertThat(used.results().map(found -> found.group(1)).distinct())
        .hasSizeGreaterThan(5)
        .allMatch(tokens::containsKey);
  }
}
