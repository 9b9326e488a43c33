package sillet.desktop.sets;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.UUID;
import org.junit.jupiter.api.Test;
import sillet.acoustics.wire.Construction;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;

class SetEditorModelTest {
  private static final UUID ID = new UUID(0, 7);
  private static final StringSet SET =
      new StringSet(
          ID,
          "Two",
          List.of(
              StringMake.of(.010, Construction.PLAIN_STEEL),
              new StringMake(.046, Construction.WOUND_NICKEL, .018, 6.4)));

  @Test
  void changesASetInItsOwnPlace() {
    SetEditorModel model = SetEditorModel.change(SET);

    assertThat(model.change()).isTrue();
    assertThat(model.finish()).contains(SET);
    model.lines().get(0).gauge().typedProperty().set("11");
    assertThat(model.finish().orElseThrow().strings().get(0).gaugeIn()).isEqualTo(.011);
    assertThat(model.finish().orElseThrow().id()).isEqualTo(ID);
  }

  @Test
  void needsANameAndEveryGauge() {
    SetEditorModel model = SetEditorModel.fresh(ID, 2);

    assertThat(model.finish()).isEmpty();
    assertThat(model.lines()).hasSize(2).allSatisfy(line -> assertThat(line.problem()).isPresent());

    model.name().typedProperty().set("New");
    model.lines().forEach(line -> line.gauge().typedProperty().set(".012"));
    assertThat(model.finish()).isPresent();
  }

  @Test
  void keepsWhatWasTypedWhenTheCountGrows() {
    SetEditorModel model = SetEditorModel.copy(ID, "Copy", SET.strings());
    model.count().typedProperty().set("3");

    assertThat(model.lines()).hasSize(3);
    assertThat(model.lines().get(1).core().value()).contains(.018);
    model.count().typedProperty().set("many");
    assertThat(model.lines()).hasSize(3);
    assertThat(model.finish()).isEmpty();
  }

  @Test
  void refusesACoreAsThickAsTheString() {
    SetEditorModel model = SetEditorModel.change(SET);
    model.lines().get(1).core().typedProperty().set(".046");

    assertThat(model.finish()).isEmpty();
    assertThat(model.lines().get(1).problem().orElseThrow().key())
        .isEqualTo("string.core-too-thick");
  }

  @Test
  void refusesACoreOfAPlainString() {
    SetEditorModel model = SetEditorModel.change(SET);
    model.lines().get(0).core().typedProperty().set(".010");

    assertThat(model.finish()).isEmpty();
    assertThat(model.lines().get(0).problem().orElseThrow().key()).isEqualTo("sets.core-of-plain");
  }

  @Test
  void takesThickStringsForWoundUntilSomebodySays() {
    SetLineModel line = new SetLineModel();
    line.gauge().typedProperty().set(".026");
    line.guessConstruction();
    assertThat(line.construction()).isEqualTo(Construction.WOUND_STEEL);

    line.construction(Construction.WOUND_BRONZE);
    line.gauge().typedProperty().set(".010");
    line.guessConstruction();
    assertThat(line.construction()).isEqualTo(Construction.WOUND_BRONZE);
  }
}
