package sillet.desktop.drawing.strings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import sillet.desktop.drawing.Box;

class CellGridTest {
  private static final double EM = 14;

  private static SheetGeometry sheet(StringsPicture picture, SheetShape shape) {
    double em = shape == SheetShape.NARROW ? 21 : EM;
    double width = shape == SheetShape.WIDE ? 1492 : 1200;
    return new SheetGeometry(
        picture, SheetMeasures.of(shape, picture), new SheetGeometry.Frame(width, em, 96));
  }

  private static StringsPicture readAt(List<Integer> frets) {
    StringsPicture six = Samples.six();
    return new StringsPicture(
        six.rows(),
        StringsPicture.Board.of(22, frets),
        six.bridge(),
        six.lie(),
        List.of(),
        six.spreadMm());
  }

  @Test
  void aCellHangsToTheRightOfItsFretLineAroundItsString() {
    SheetGeometry sheet = sheet(Samples.six(), SheetShape.USUAL);
    Box cell = sheet.cells().cell(2, 12);
    assertThat(cell.x()).isCloseTo(sheet.strip().fretX(2, 12) + 0.57 * EM, within(0.5));
    assertThat(cell.middleY()).isCloseTo(sheet.rows().y(2), within(0.5));
  }

  @Test
  void aMirroredCellHangsToTheLeft() {
    SheetGeometry sheet = sheet(Samples.six(Lie.of(true, false)), SheetShape.USUAL);
    Box cell = sheet.cells().cell(2, 12);
    assertThat(cell.right()).isCloseTo(sheet.strip().fretX(2, 12) - 0.57 * EM, within(0.5));
  }

  @Test
  void figuresCanBeReadAtArmsLengthInEveryShape() {
    for (StringsPicture picture :
        List.of(
            Samples.six(),
            Samples.twelve(),
            Samples.bass(),
            Samples.onePiece(),
            Samples.multiScale())) {
      for (SheetShape shape : SheetShape.values()) {
        CellGrid cells = sheet(picture, shape).cells();
        assertThat(cells.figurePx()).isGreaterThanOrEqualTo(15.8);
        assertThat(cells.heightPx()).isGreaterThanOrEqualTo(27);
      }
    }
  }

  @Test
  void moreRoomMakesLargerCells() {
    CellGrid wide = sheet(Samples.six(), SheetShape.WIDE).cells();
    CellGrid usual = sheet(Samples.six(), SheetShape.USUAL).cells();
    assertThat(wide.widthPx()).isGreaterThan(usual.widthPx());
    assertThat(wide.figurePx()).isCloseTo(1.43 * EM, within(0.01));
  }

  @Test
  void crowdedCellsMoveUpTheNeckAndNeverOverlap() {
    SheetGeometry sheet = sheet(readAt(List.of(1, 2, 3, 12, 14, 15, 17)), SheetShape.USUAL);
    List<Box> cells =
        sheet.picture().board().readFrets().stream()
            .map(fret -> sheet.cells().cell(0, fret))
            .toList();
    assertThat(IntStream.range(1, cells.size()))
        .allMatch(i -> cells.get(i).x() >= cells.get(i - 1).right());
    assertThat(cells.get(cells.size() - 1).right()).isLessThan(sheet.breakNearX());
    assertThat(cells.get(0).x()).isGreaterThan(sheet.strip().fretX(0, 0));
  }

  @Test
  void theLastCellHasRoomBeforeTheBreakLine() {
    SheetGeometry sheet = sheet(readAt(List.of(12, 22)), SheetShape.USUAL);
    Box cell = sheet.cells().cell(0, 22);
    assertThat(cell.right()).isLessThan(sheet.breakNearX());
    assertThat(cell.x()).isGreaterThan(sheet.strip().fretX(0, 22) + 0.5 * EM);
  }

  @Test
  void thereAreCellsAtReadFretsOnly() {
    CellGrid cells = sheet(Samples.six(), SheetShape.USUAL).cells();
    assertThatThrownBy(() -> cells.cell(0, 9)).isInstanceOf(IllegalArgumentException.class);
  }
}
