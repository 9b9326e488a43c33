package sillet.desktop.drawing.strings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SheetGeometryTest {
  private static SheetGeometry sheet(StringsPicture picture) {
    return new SheetGeometry(
        picture,
        SheetMeasures.of(SheetShape.USUAL, picture),
        new SheetGeometry.Frame(1200, 14, 96));
  }

  private static StringsPicture strings(int count) {
    List<StringRow> rows =
        IntStream.rangeClosed(1, count).mapToObj(n -> Samples.row(n, "E4", 0.01, 648)).toList();
    return new StringsPicture(
        rows,
        StringsPicture.Board.of(22, Samples.FRETS),
        new Bridge.SingleSaddles("648.0"),
        Lie.USUAL,
        List.of(),
        OptionalDouble.empty());
  }

  @ParameterizedTest
  @CsvSource({"4, 5.35", "5, 4.28", "6, 3.567", "7, 3.057", "8, 2.675", "9, 2.43", "12, 2.43"})
  void rowsShareTheHeightButKeepACellAndItsRing(int strings, double rowEm) {
    assertThat(SheetMeasures.of(SheetShape.USUAL, strings(strings)).row())
        .isCloseTo(rowEm, within(0.001));
  }

  @Test
  void stringsOfACourseLieCloserThanCourses() {
    StringRows rows = sheet(Samples.twelve()).rows();
    assertThat(rows.y(1) - rows.y(0)).isCloseTo(2.43 * 14, within(1.0));
    assertThat(rows.y(2) - rows.y(1)).isCloseTo(3 * 14, within(1.0));
  }

  @Test
  void turnedStringsStandTheOtherWayUp() {
    StringRows usual = sheet(Samples.twelve()).rows();
    StringsPicture twelve = Samples.twelve();
    StringsPicture turned =
        new StringsPicture(
            twelve.rows(),
            twelve.board(),
            twelve.bridge(),
            Lie.of(false, true),
            List.of(),
            twelve.spreadMm());
    StringRows rows = sheet(turned).rows();
    assertThat(IntStream.range(0, 12)).allMatch(i -> rows.y(i) == usual.y(11 - i));
  }

  @Test
  void everyRowStandsOnTheMiddleOfAPixel() {
    StringRows rows = sheet(Samples.twelve()).rows();
    assertThat(IntStream.range(0, 12)).allMatch(i -> rows.y(i) - Math.floor(rows.y(i)) == 0.5);
  }

  @Test
  void awayFromTheNeckPointsFromNutToBridge() {
    for (Lie lie : List.of(Lie.USUAL, Lie.of(true, false), Lie.of(false, true))) {
      SheetGeometry sheet = sheet(Samples.six(lie));
      double towardBridge = sheet.breakFarX() - sheet.strip().fretX(0, 0);
      assertThat(sheet.away()).isEqualTo((int) Math.signum(towardBridge));
      assertThat(Math.signum(sheet.plan().pxPerMm())).isEqualTo(Math.signum(towardBridge));
    }
    assertThat(Lie.of(true, false).away()).isEqualTo(-1);
    assertThat(Lie.of(true, true).away()).isEqualTo(1);
  }

  @Test
  void theScaleAcrossFollowsFromTheSpreadAtTheBridge() {
    SheetGeometry sheet = sheet(Samples.six());
    double px = sheet.rows().y(5) - sheet.rows().y(0);
    assertThat(sheet.across()).isCloseTo(px / 96 * 25.4 / 52.5, within(1e-9));
    assertThat(sheet(Samples.onePiece()).across()).isNaN();
  }

  @Test
  void wordsStandBesideTheirStringWithinTheSheet() {
    SheetGeometry usual = sheet(Samples.six());
    assertThat(usual.words(3).middleY()).isCloseTo(usual.rows().y(3), within(1.0));
    assertThat(usual.words(3).right()).isLessThanOrEqualTo(1200);
    assertThat(sheet(Samples.six(Lie.of(true, false))).words(3).x()).isZero();
  }

  @Test
  void thinStringsGrowAllTogether() {
    double[] widths =
        StringLines.widths(
            List.of(Samples.row(1, "E4", 0.008, 648), Samples.row(2, "E2", 0.040, 648)), 14);
    assertThat(widths).containsExactly(new double[] {1, 5}, within(1e-9));
    double[] usual = StringLines.widths(List.of(Samples.row(6, "E2", 0.046, 648)), 28);
    assertThat(usual[0]).isCloseTo(9.2, within(1e-9));
  }
}
