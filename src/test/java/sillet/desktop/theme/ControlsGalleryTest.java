package sillet.desktop.theme;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.concurrent.TimeoutException;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sillet.desktop.drawing.Picture;

/** Renders every control under target/looks; known grounds must have reached them. */
class ControlsGalleryTest {
  @BeforeAll
  static void startToolkit() throws TimeoutException {
    Picture.startToolkit();
  }

  @ParameterizedTest
  @CsvSource({
    "LIGHT, 100, #DCE1DE, #F7F9F6, #FFEDB0",
    "DARK, 100, #0D1011, #171C1D, #453A12",
    "CONTRAST, 100, #000000, #000000, #2E2700",
    "LIGHT, 200, #DCE1DE, #F7F9F6, #FFEDB0"
  })
  void groundsReachEveryControl(Theme theme, int percent, String bench, String sheet, String lamp)
      throws IOException {
    int scale = percent / 100;
    Picture page =
        Picture.of(ControlsSheet::build, theme, percent, 1280 * scale, 800 * scale)
            .save("controls-" + theme.word() + "-" + percent);
    assertThat(page.count(bench)).isGreaterThan(20_000);
    assertThat(page.count(sheet)).isGreaterThan(100_000);
    assertThat(page.count(lamp)).isGreaterThan(10_000);
  }
}
