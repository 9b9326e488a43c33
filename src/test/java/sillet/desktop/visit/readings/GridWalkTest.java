package sillet.desktop.visit.readings;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;

class GridWalkTest {
  private final GridWalk walk = new GridWalk(6, List.of(1, 5, 12));

  @Test
  void enterKeepsTheFretAndGoesToTheNextString() {
    assertThat(walk.nextString(new Cell(1, 12))).isEqualTo(new Cell(2, 12));
  }

  @Test
  void enterOnTheLastStringGoesToTheFirstStringAtTheNextFret() {
    assertThat(walk.nextString(new Cell(6, 1))).isEqualTo(new Cell(1, 5));
  }

  @Test
  void enterOnTheVeryLastCellStays() {
    assertThat(walk.nextString(new Cell(6, 12))).isEqualTo(new Cell(6, 12));
  }

  @Test
  void enterWithShiftGoesBackTheSameWay() {
    assertThat(walk.previousString(new Cell(2, 5))).isEqualTo(new Cell(1, 5));
    assertThat(walk.previousString(new Cell(1, 5))).isEqualTo(new Cell(6, 1));
    assertThat(walk.previousString(new Cell(1, 1))).isEqualTo(new Cell(1, 1));
  }

  @Test
  void tabGoesToTheNextFretThenToTheNextStringAndLeavesAtTheEnd() {
    assertThat(walk.nextFret(new Cell(1, 5))).contains(new Cell(1, 12));
    assertThat(walk.nextFret(new Cell(1, 12))).contains(new Cell(2, 1));
    assertThat(walk.nextFret(new Cell(6, 12))).isEmpty();
  }

  @Test
  void tabWithShiftGoesBackTheSameWay() {
    assertThat(walk.previousFret(new Cell(2, 5))).contains(new Cell(2, 1));
    assertThat(walk.previousFret(new Cell(2, 1))).contains(new Cell(1, 12));
    assertThat(walk.previousFret(new Cell(1, 1))).isEmpty();
  }

  @Test
  void enterAloneReachesEveryCellOnce() {
    Set<Cell> reached = new HashSet<>();
    Cell at = new Cell(1, 1);
    while (reached.add(at)) {
      at = walk.nextString(at);
    }
    assertThat(reached).hasSize(18);
  }

  @Test
  void beginsAtTheFirstStringNotYetReadAtTheOctave() {
    assertThat(walk.start(cell -> cell.string() < 3)).isEqualTo(new Cell(3, 12));
    assertThat(walk.start(cell -> true)).isEqualTo(new Cell(1, 12));
  }

  @Test
  void beginsAtTheLastShownFretWhereTheOctaveIsNotShown() {
    assertThat(new GridWalk(4, List.of(5, 7)).start(cell -> false)).isEqualTo(new Cell(1, 7));
  }
}
