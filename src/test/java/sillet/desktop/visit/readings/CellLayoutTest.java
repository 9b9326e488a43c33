package sillet.desktop.visit.readings;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

class CellLayoutTest {

  @Test
  void leavesCellsWithRoomWhereTheyWishToStand() {
    assertThat(CellLayout.leftEdges(List.of(0.0, 100.0, 250.0), 60, 400))
        .containsExactly(0.0, 100.0, 250.0);
  }

  @Test
  void pushesCloseNeighboursApart() {
    assertThat(CellLayout.leftEdges(List.of(0.0, 30.0, 50.0), 60, 400))
        .containsExactly(0.0, 60.0, 120.0);
  }

  @Test
  void keepsTheLastCellInsideTheStripAndItsNeighbourOffIt() {
    assertThat(CellLayout.leftEdges(List.of(0.0, 310.0, 360.0), 60, 400))
        .containsExactly(0.0, 280.0, 340.0);
  }
}
