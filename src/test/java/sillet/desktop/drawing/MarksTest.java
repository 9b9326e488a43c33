package sillet.desktop.drawing;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.concurrent.TimeoutException;
import javafx.scene.layout.StackPane;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import sillet.desktop.theme.Theme;

class MarksTest {
  private static final String LIGHT_INK = "#151C1B";
  private static final String LIGHT_PENCIL = "#AB3208";

  @BeforeAll
  static void startToolkit() throws TimeoutException {
    Picture.startToolkit();
  }

  private static Picture picture(MarkShape shape) {
    return Picture.of(() -> new StackPane(new Mark(shape, "state")), Theme.LIGHT, 200, 80, 60);
  }

  @ParameterizedTest
  @EnumSource(MarkShape.class)
  void everyMarkShowsSomethingInInkOrPencil(MarkShape shape) {
    Picture picture = picture(shape);
    assertThat(picture.count(LIGHT_INK) + picture.count(LIGHT_PENCIL)).isGreaterThan(20);
  }

  @ParameterizedTest
  @CsvSource({
    "INSIDE, false",
    "OUTSIDE_ABOVE, true",
    "OUTSIDE_BELOW, true",
    "NO_TARGET, false",
    "READ_AGAIN, true",
    "LEAVE, false",
    "MOVE, true",
    "SAVED, false",
    "DRAFT, false",
    "NOT_SAVED, true",
    "DONE, false",
    "NOT_YET, false"
  })
  void pencilMarksOnlyWhatNeedsAHand(MarkShape shape, boolean needsHand) {
    assertThat(picture(shape).count(LIGHT_PENCIL) > 0).isEqualTo(needsHand);
  }

  @ParameterizedTest
  @CsvSource({"OUTSIDE_ABOVE, true", "OUTSIDE_BELOW, false", "MOVE, true", "MOVE_LEFT, false"})
  void pencilStandsOnTheSideItSpeaksOf(MarkShape shape, boolean right) {
    Picture picture = picture(shape);
    int onTheLeft = picture.countBetween(LIGHT_PENCIL, 0, 40);
    int onTheRight = picture.countBetween(LIGHT_PENCIL, 40, 80);
    assertThat(onTheRight > onTheLeft).isEqualTo(right);
  }

  @ParameterizedTest
  @CsvSource({"LIGHT, #151C1B", "DARK, #EEF0EB", "CONTRAST, #FFFFFF"})
  void aMarkTakesTheInkOfItsTheme(Theme theme, String ink) {
    Picture picture =
        Picture.of(() -> new StackPane(new Mark(MarkShape.SAVED, "saved")), theme, 100, 40, 40);
    assertThat(picture.count(ink)).isGreaterThanOrEqualTo(144);
  }

  @Test
  void aMarkGrowsWithTheTextSize() {
    assertThat(picture(MarkShape.SAVED).count(LIGHT_INK)).isBetween(26 * 26 - 60, 27 * 27);
  }

  @Test
  void theKeyIsThereToLookAtInThreeThemes() throws IOException {
    for (Theme theme : Theme.values()) {
      Picture key = Picture.of(KeySheet::build, theme, 100, 560, 760).save("key-" + theme.word());
      assertThat(key.countOther(key.colourAt(1, 1))).isBetween(10_000, 560 * 760 / 3);
    }
  }
}
