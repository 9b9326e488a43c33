package sillet.desktop.drawing.strings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sillet.desktop.drawing.Balloon;
import sillet.desktop.drawing.Box;

class FindingLeaderTest {
  private static final double EM = 14;

  private static SheetGeometry sheet(StringsPicture picture) {
    return new SheetGeometry(
        picture,
        SheetMeasures.of(SheetShape.USUAL, picture),
        new SheetGeometry.Frame(1200, EM, 96));
  }

  @Test
  void standsAboveTheBarWhereTheRowHasRoom() {
    SheetGeometry sheet = sheet(Samples.six());
    FindingLeader leader = FindingLeader.of(sheet, sheet.picture().findings().get(0));
    assertThat(leader.fromX()).isEqualTo(sheet.strip().fretX(1, 1));
    assertThat(leader.y() + Balloon.RADIUS_EM * EM).isLessThan(sheet.cells().cell(1, 1).y() + 1);
    assertThat(leader.y() - Balloon.RADIUS_EM * EM)
        .isGreaterThan(sheet.cells().cell(0, 1).bottom() - 2);
  }

  @Test
  void standsBehindTheCellWhereRowsAreTight() {
    SheetGeometry sheet = sheet(Samples.twelve());
    FindingLeader leader = FindingLeader.of(sheet, sheet.picture().findings().get(0));
    Box cell = sheet.cells().cell(5, 1);
    assertThat(leader.y()).isEqualTo(sheet.rows().y(5));
    assertThat(leader.fromX()).isEqualTo(cell.right());
    assertThat(leader.x() - Balloon.RADIUS_EM * EM).isGreaterThan(cell.right());
  }

  @Test
  void aFindingAtTheSaddleStaysBeforeTheWords() {
    SheetGeometry sheet = sheet(Samples.onePiece());
    FindingLeader leader = FindingLeader.of(sheet, sheet.picture().findings().get(0));
    assertThat(leader.x() + Balloon.RADIUS_EM * EM).isLessThanOrEqualTo(sheet.words(5).x());
  }

  @Test
  void theLeaderEndsOnTheRing() {
    FindingLeader leader = new FindingLeader(0, 0, 30, 40);
    double length = Math.hypot(leader.toX(EM), leader.toY(EM));
    assertThat(length).isCloseTo(50 - Balloon.RADIUS_EM * EM, within(1e-9));
  }
}
