package sillet.desktop.drawing.strings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;

class BridgePlanGeometryTest {
  private static BridgePlanGeometry plan(
      StringsPicture picture, double fromX, double toX, double wanted) {
    return new BridgePlanGeometry(picture, new BridgePlanGeometry.Frame(fromX, toX, 5, 96, wanted));
  }

  @Test
  void sixTimesLifeSizeIsSixTimesTheScreensOwnMillimetre() {
    BridgePlanGeometry plan = plan(Samples.six(), 700, 920, 6);
    assertThat(plan.factor()).isEqualTo(6);
    assertThat(plan.pxPerMm()).isCloseTo(6 * 96 / 25.4, within(1e-9));
    assertThat(plan.x(2) - plan.x(0)).isCloseTo(2 * 6 * 96 / 25.4, within(1e-9));
  }

  @Test
  void anotherScreenDrawsTheSameMillimetresWithItsOwnDots() {
    BridgePlanGeometry fine =
        new BridgePlanGeometry(Samples.six(), new BridgePlanGeometry.Frame(0, 600, 5, 144, 6));
    assertThat(fine.pxPerMm()).isCloseTo(6 * 144 / 25.4, within(1e-9));
  }

  @Test
  void holdsTheWholeTravelBetweenItsEnds() {
    BridgePlanGeometry plan = plan(Samples.six(), 700, 920, 6);
    assertThat(plan.lowMm()).isEqualTo(-1);
    assertThat(plan.highMm()).isEqualTo(7);
    assertThat(plan.x(-1)).isGreaterThanOrEqualTo(700);
    assertThat(plan.x(7)).isLessThanOrEqualTo(920);
    assertThat(plan.x(-1) - 700).isCloseTo(920 - plan.x(7), within(1e-6));
  }

  @Test
  void shrinksToAScaleThatCanBeSaidWhereThereIsLessRoom() {
    BridgePlanGeometry plan = plan(Samples.bass(), 700, 920, 6);
    assertThat(plan.factor()).isEqualTo(3.5);
    assertThat(plan.x(14)).isLessThanOrEqualTo(920);
  }

  @Test
  void aMirroredPlanGrowsToTheLeft() {
    BridgePlanGeometry plan = plan(Samples.six(), 920, 700, 6);
    assertThat(plan.x(7)).isLessThan(plan.x(-1));
    assertThat(plan.factor()).isEqualTo(6);
  }

  @Test
  void aWideIntervalIsCutAtTheEndOfTheRoom() {
    List<StringRow> rows =
        List.of(
            Samples.with(
                Samples.row(1, "E4", 0.010, 648), SaddleMark.at(1).within(-1, 7).to(2, -40, 44)));
    StringsPicture six = Samples.six();
    StringsPicture wide =
        new StringsPicture(rows, six.board(), six.bridge(), six.lie(), List.of(), six.spreadMm());
    BridgePlanGeometry plan = plan(wide, 700, 920, 6);
    assertThat(plan.highMm()).isEqualTo(9);
    assertThat(plan.lowMm()).isEqualTo(-3);
    assertThat(plan.x(plan.drawn(44))).isCloseTo(925, within(1e-6));
    assertThat(plan.x(plan.drawn(-40))).isCloseTo(695, within(1e-6));
  }

  @Test
  void aOnePieceSaddleBeginsAtItsFrontEdge() {
    BridgePlanGeometry plan = plan(Samples.onePiece(), 766, 930, 11);
    assertThat(plan.x(0)).isEqualTo(766);
    assertThat(plan.x(3.2) - plan.x(0)).isCloseTo(3.2 * 11 * 96 / 25.4, within(1e-6));
  }
}
