package sillet.desktop.drawing.strings;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.concurrent.TimeoutException;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import sillet.desktop.drawing.Picture;
import sillet.desktop.theme.Theme;

/** Renders the drawing in its shapes under target/looks, to be looked at. */
class StringsGalleryTest {
  @BeforeAll
  static void startToolkit() throws TimeoutException {
    Picture.startToolkit();
  }

  private static void draw(
      String name, StringsPicture picture, SheetShape shape, Theme theme, int percent)
      throws IOException {
    int width = shape == SheetShape.WIDE ? 1580 : 1280;
    int height = shape == SheetShape.WIDE ? 700 : 650;
    Picture seen =
        Picture.of(() -> SheetScene.build(picture, shape), theme, percent, width, height);
    seen.save("strings-" + name);
    assertThat(seen.countOther(seen.colourAt(60, 60))).isGreaterThan(40_000);
  }

  @Test
  void sixStrings() throws IOException {
    draw("6", Samples.six(), SheetShape.USUAL, Theme.LIGHT, 100);
    draw("6-pass-2-dark", Samples.secondPass(), SheetShape.USUAL, Theme.DARK, 100);
    draw("6-contrast", Samples.six(), SheetShape.USUAL, Theme.CONTRAST, 100);
    draw("6-wide", Samples.six(), SheetShape.WIDE, Theme.LIGHT, 100);
    draw("6-narrow-dark", Samples.six(), SheetShape.NARROW, Theme.DARK, 150);
  }

  @Test
  void otherInstruments() throws IOException {
    draw("12", Samples.twelve(), SheetShape.USUAL, Theme.LIGHT, 100);
    draw("12-narrow", Samples.twelve(), SheetShape.NARROW, Theme.LIGHT, 150);
    draw("4-bass", Samples.bass(), SheetShape.USUAL, Theme.LIGHT, 100);
    draw("one-piece", Samples.onePiece(), SheetShape.USUAL, Theme.LIGHT, 100);
    draw("multi-scale", Samples.multiScale(), SheetShape.USUAL, Theme.DARK, 100);
  }

  @Test
  void wholeNeck() throws IOException {
    draw("neck", NeckSamples.of(Samples.six(), 5), SheetShape.USUAL, Theme.LIGHT, 100);
    draw("neck-dark", NeckSamples.of(Samples.six(), 12), SheetShape.USUAL, Theme.DARK, 100);
    draw("neck-wide", NeckSamples.of(Samples.six(), 1), SheetShape.WIDE, Theme.LIGHT, 100);
    draw("neck-narrow", NeckSamples.of(Samples.six(), 17), SheetShape.NARROW, Theme.LIGHT, 150);
    draw("neck-12", NeckSamples.of(Samples.twelve(), 3), SheetShape.USUAL, Theme.LIGHT, 100);
  }

  @Test
  void otherLies() throws IOException {
    draw("left-handed", Samples.six(Lie.of(true, false)), SheetShape.USUAL, Theme.LIGHT, 100);
    draw("turned", Samples.six(Lie.of(false, true)), SheetShape.USUAL, Theme.LIGHT, 100);
  }
}
