package sillet.desktop.visit.readings;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Instant;
import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.acoustics.readings.Reference;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.Reading;

class GridModelTest {
  private static final Instant NOW = Instant.parse("2026-03-02T10:00:00Z");
  private static final Cell CELL = new Cell(3, 12);

  private final GridModel grid = new GridModel(1, ReadingTerms.USUAL);

  private static Reading recorded(int pass, String tries) {
    return new Reading(pass, 3, 12, Tries.parse(tries), Reference.OPEN, 0.5, NOW);
  }

  @Test
  void showsTheMedianOfSeveralTriesAndAllOfThemWhileTyping() {
    grid.type(CELL, "2.6 2.8 3.3");
    CellFace face = grid.face(CELL);
    assertThat(face.text()).isEqualTo("+2.8");
    assertThat(face.typing()).isEqualTo("2.6 2.8 3.3");
    assertThat(face.tries()).isEqualTo(3);
    assertThat(face.state()).isEqualTo(CellFace.State.READ);
  }

  @Test
  void namesTheTryThatLiesApart() {
    grid.type(CELL, "2.6 2.8 9.5 2.7");
    assertThat(grid.face(CELL).wildTry()).hasValue(2);
  }

  @Test
  void asksToSaveAReadingAsItWasTypedWithHowItWasTaken() {
    grid.readUnder(new ReadingTerms(Reference.HARMONIC, 0.2));
    grid.type(CELL, "3,1/2.8");
    assertThat(grid.toSave(CELL, NOW))
        .contains(new Reading(1, 3, 12, Tries.parse("3.1/2.8"), Reference.HARMONIC, 0.2, NOW));
  }

  @Test
  void keepsWhatWasTypedUntilTheRecordHoldsIt() {
    grid.take(List.of(recorded(1, "4.0")));
    grid.type(CELL, "5.0");
    assertThat(grid.draft()).isTrue();
    grid.take(List.of(recorded(1, "4.0")));
    assertThat(grid.face(CELL).text()).isEqualTo("+5.0");
    assertThat(grid.draft()).isTrue();
    grid.take(List.of(recorded(1, "4.0"), recorded(1, "5.0")));
    assertThat(grid.draft()).isFalse();
    assertThat(grid.face(CELL).text()).isEqualTo("+5.0");
  }

  @Test
  void doesNotSaveWhatTheRecordHoldsOrWhatCannotBeRead() {
    grid.take(List.of(recorded(1, "4.0")));
    grid.type(CELL, "4.0");
    assertThat(grid.toSave(CELL, NOW)).isEmpty();
    grid.type(CELL, "4.o");
    assertThat(grid.toSave(CELL, NOW)).isEmpty();
    assertThat(grid.face(CELL).state()).isEqualTo(CellFace.State.ERROR);
    assertThat(grid.draft()).isTrue();
  }

  @Test
  void takesAReadingBackWhenItsCellIsEmptied() {
    grid.take(List.of(recorded(1, "4.0")));
    grid.type(CELL, " ");
    assertThat(grid.toSave(CELL, NOW))
        .contains(new Reading(1, 3, 12, null, Reference.OPEN, 0.5, NOW));
  }

  @Test
  void doesNotAskToTakeBackWhatWasNeverRead() {
    grid.type(CELL, "");
    assertThat(grid.toSave(CELL, NOW)).isEmpty();
    assertThat(grid.draft()).isFalse();
  }

  @Test
  void holdsTheReadingsOfItsOwnPassOnly() {
    grid.take(List.of(recorded(2, "0.3")));
    assertThat(grid.read(CELL)).isFalse();
  }

  @Test
  void theNewestReadingOfANoteCounts() {
    grid.take(List.of(recorded(1, "4.0"), recorded(1, "4.6")));
    assertThat(grid.face(CELL).text()).isEqualTo("+4.6");
    assertThat(grid.fretsRead()).containsExactly(12);
  }

  @Test
  void sendsAReadingOnceAndAChangedOneAgain() {
    grid.type(CELL, "5.0");
    assertThat(grid.send(CELL, NOW)).isPresent();
    assertThat(grid.send(CELL, NOW)).isEmpty();
    grid.type(CELL, "5.2");
    assertThat(grid.send(CELL, NOW)).isPresent();
  }

  @Test
  void sendsTheOldReadingAgainWhereAnotherIsOnItsWay() {
    grid.take(List.of(recorded(1, "4.0")));
    grid.type(CELL, "5.0");
    grid.send(CELL, NOW);
    grid.type(CELL, "4.0");
    assertThat(grid.send(CELL, NOW)).isPresent();
    grid.take(List.of(recorded(1, "4.0"), recorded(1, "5.0"), recorded(1, "4.0")));
    assertThat(grid.draft()).isFalse();
  }
}
