package sillet.desktop.visit.aim;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.visits.VisitAim;

class AimModelTest {
  private final AimModel model = new AimModel(VisitAim.USUAL);

  @Test
  void changesTheAimAndKeepsTheNut() {
    model.choose(NutMovable.WHOLE);
    assertThat(model.choose(AimChoice.Kind.NECK))
        .contains(new VisitAim(AimChoice.NECK, NutMovable.WHOLE));
    assertThat(model.choose(AimChoice.Kind.NECK)).as("chosen already").isEmpty();
  }

  @Test
  void takesFretsOfTheShopsOwnWithWeights() {
    model.own().typedProperty().set("1 5:2 12");
    VisitAim chosen = model.choose(AimChoice.Kind.FRETS).orElseThrow();
    assertThat(chosen.aim().weights()).containsEntry(5, 2.0).containsEntry(12, 1.0);
  }

  @Test
  void refusesAWordInThePlaceOfFrets() {
    model.own().typedProperty().set("neck");
    assertThat(model.choose(AimChoice.Kind.FRETS)).isEmpty();
    assertThat(model.own().problemProperty().get()).isPresent();
    assertThat(model.aim()).isEqualTo(VisitAim.USUAL);
  }

  @Test
  void passesOverFretsThatCannotBeReadWhenItGoesRound() {
    model.own().typedProperty().set("1 99");
    model.nextAim();
    assertThat(model.nextAim()).contains(VisitAim.USUAL);
  }

  @Test
  void showsTheFretsThatWereChosenBefore() {
    AimModel again = new AimModel(new VisitAim(AimChoice.parse("3 7:1.5"), NutMovable.NO));
    assertThat(again.own().typedProperty().get()).isEqualTo("3 7:1.5");
  }
}
