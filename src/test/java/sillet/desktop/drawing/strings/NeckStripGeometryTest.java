package sillet.desktop.drawing.strings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Fret places to a hundredth of a px. The rule L(1 - 2^(-n/12)) is checked in acoustics. */
class NeckStripGeometryTest {
  private static final double TO_A_HUNDREDTH = 0.01;

  private static NeckStripGeometry strip(StringsPicture picture, double zeroX, double lastFretX) {
    SheetMeasures measures = SheetMeasures.of(SheetShape.USUAL, picture);
    return new NeckStripGeometry(
        picture, new StringRows(picture, measures, 31, 14), zeroX, lastFretX);
  }

  /** A scale of 600 mm on 900 px: fret 12 at 300 mm, fret 24 at 450 mm of 675 px. */
  private static StringsPicture plain(List<StringRow> rows, int straightFret) {
    return new StringsPicture(
        rows,
        new StringsPicture.Board(24, List.of(12), straightFret),
        new Bridge.SingleSaddles("600.0"),
        Lie.USUAL,
        List.of(),
        OptionalDouble.empty());
  }

  private static List<StringRow> two(double upperMm, double lowerMm) {
    return List.of(Samples.row(1, "E4", 0.010, upperMm), Samples.row(2, "B3", 0.013, lowerMm));
  }

  @ParameterizedTest
  @CsvSource({
    "0, 100",
    "1, 150.51",
    "5, 325.76",
    "7, 399.33",
    "12, 550",
    "17, 662.88",
    "24, 775",
  })
  void fretsStandWhereTheScalePutsThem(int fret, double x) {
    NeckStripGeometry strip = strip(plain(two(600, 600), 0), 100, 775);
    assertThat(strip.fretX(0, fret)).isCloseTo(x, within(TO_A_HUNDREDTH));
    assertThat(strip.square()).isTrue();
  }

  @Test
  void aMirroredStripCountsFromTheRight() {
    NeckStripGeometry strip = strip(plain(two(600, 600), 0), 775, 100);
    assertThat(strip.fretX(0, 0)).isEqualTo(775);
    assertThat(strip.fretX(0, 12)).isCloseTo(325, within(TO_A_HUNDREDTH));
    assertThat(strip.pxPerMm()).isCloseTo(-1.5, within(1e-9));
  }

  @Test
  void onAMultiScaleBoardOneFretStandsSquareAndTheNutSlants() {
    NeckStripGeometry strip = strip(plain(two(600, 640), 12), 0, 480);
    assertThat(strip.square()).isFalse();
    assertThat(strip.fretX(0, 12)).isCloseTo(strip.fretX(1, 12), within(TO_A_HUNDREDTH));
    assertThat(strip.fretX(1, 0)).isCloseTo(0, within(TO_A_HUNDREDTH));
    assertThat(strip.fretX(0, 0)).isCloseTo(20, within(TO_A_HUNDREDTH));
    assertThat(strip.fretX(0, 24)).isLessThan(strip.fretX(1, 24));
  }

  @Test
  void aFretIsOneStraightLineThroughTheOuterStrings() {
    StringsPicture picture = Samples.multiScale();
    SheetMeasures measures = SheetMeasures.of(SheetShape.USUAL, picture);
    StringRows rows = new StringRows(picture, measures, 31, 14);
    NeckStripGeometry strip = new NeckStripGeometry(picture, rows, 100, 600);
    for (int row = 0; row < rows.count(); row++) {
      assertThat(strip.neckFretXAt(5, rows.y(row))).isCloseTo(strip.neckFretX(row, 5), within(0.2));
    }
  }

  @Test
  void aShortStringCountsFromItsOwnNut() {
    StringRow neck = Samples.row(1, "D4", 0.010, 660);
    double fromFret5 = 660 * Math.pow(2, -5 / 12.0);
    StringRow drone = new StringRow(5, "G4", ".010", 0.010, 0, fromFret5, 5, List.of(), null);
    NeckStripGeometry strip = strip(plain(List.of(neck, drone), 0), 0, 495);
    assertThat(strip.fretX(1, 0)).isCloseTo(strip.fretX(0, 5), within(TO_A_HUNDREDTH));
    assertThat(strip.fretX(1, 12)).isCloseTo(strip.fretX(0, 17), within(TO_A_HUNDREDTH));
  }
}
