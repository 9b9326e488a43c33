package sillet.desktop.sets;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.UUID;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import sillet.acoustics.wire.Construction;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;
import sillet.logbook.units.LengthUnit;

class SetsModelTest {
  private static final StringSet LIGHT = set("Light", .010, .013, .017, .026, .036, .046);
  private static final StringSet MEDIUM = set("Medium", .011, .014, .018, .028, .038, .049);
  private static final StringSet BASS = set("Bass", .045, .065, .085, .105);
  private static final StringSet BANJO = set("Banjo", .0095, .011, .013, .020, .0095);

  private final SetsModel model = new SetsModel(LengthUnit.MM, 440);

  @BeforeEach
  void fill() {
    model.show(List.of(LIGHT, MEDIUM, BASS, BANJO));
  }

  @Test
  void beginsWithTheFirstSetAtItsUsualTuning() {
    assertThat(model.chosenProperty().get()).contains(LIGHT);
    assertThat(model.tuning().typedProperty().get()).isEqualTo("E4 B3 G3 D3 A2 E2");
    assertThat(model.scale().typedProperty().get()).isEqualTo("648");
  }

  /** Worked references of the full model at 648 mm [D]: .010 72.42 N, .017 73.67 N. */
  @Test
  void reckonsTheTensionOfEveryString() {
    SetFigures figures = model.figures().orElseThrow();

    assertThat(figures.strings()).hasSize(6);
    assertThat(figures.strings().get(0).tensionN().orElseThrow()).isCloseTo(72.42, within(0.1));
    assertThat(figures.strings().get(2).tensionN().orElseThrow()).isCloseTo(73.67, within(0.15));
    assertThat(figures.totalN().orElseThrow())
        .isCloseTo(figures.equalN().orElseThrow() * 6, within(1e-6));
  }

  @Test
  void refusesATuningOfAnotherCount() {
    model.tuning().typedProperty().set("E4 B3 G3");
    model.tuning().look();

    assertThat(model.figures()).isEmpty();
    assertThat(model.tuning().problemProperty().get().orElseThrow().key())
        .isEqualTo("sets.tuning-count");
  }

  @Test
  void keepsTheTuningTypedForSetsOfAKind() {
    model.tuning().typedProperty().set("D4 A3 F3 C3 G2 D2");
    model.choose(Optional.of(BASS));
    assertThat(model.tuning().typedProperty().get()).isEqualTo("G2 D2 A1 E1");
    assertThat(model.figures().orElseThrow().strings()).hasSize(4);

    model.choose(Optional.of(MEDIUM));
    assertThat(model.tuning().typedProperty().get()).isEqualTo("D4 A3 F3 C3 G2 D2");
  }

  @Test
  void comparesWithTheMarkedSetAndNotWithItself() {
    model.compare();
    assertThat(model.comparedFigures()).isEmpty();

    model.choose(Optional.of(MEDIUM));
    SetFigures beside = model.comparedFigures().orElseThrow();
    assertThat(beside.set()).isEqualTo(LIGHT);
    assertThat(beside.totalN().orElseThrow())
        .isLessThan(model.figures().orElseThrow().totalN().orElseThrow());

    model.choose(Optional.of(LIGHT));
    model.compare();
    assertThat(model.comparedProperty().get()).isEmpty();
  }

  @Test
  void comparesSetsOfOtherCountsAsFarAsBothGo() {
    model.compare();
    model.choose(Optional.of(BASS));

    assertThat(model.comparedFigures().orElseThrow().strings()).hasSize(4);
  }

  @Test
  void givesAShortFifthStringItsOwnScale() {
    model.choose(Optional.of(BANJO));
    SetFigures figures = model.figures().orElseThrow();

    // a nut at fret 5 leaves 670 / 2^(5/12) = 501.9 mm
    assertThat(figures.strings().get(4).string().scaleMm()).isCloseTo(501.9, within(0.1));
    assertThat(figures.strings().get(0).string().scaleMm()).isEqualTo(670);
  }

  @Test
  void keepsWhatIsChosenWhenTheDrawerIsReadAgain() {
    model.choose(Optional.of(MEDIUM));
    model.show(List.of(BASS, MEDIUM));

    assertThat(model.chosenProperty().get()).contains(MEDIUM);
    assertThat(model.tuning().value()).isPresent();
  }

  @Test
  void showsNothingOfAnEmptyDrawer() {
    model.show(List.of());

    assertThat(model.chosenProperty().get()).isEmpty();
    assertThat(model.figures()).isEmpty();
  }

  @Test
  void laddersEveryStringTowardTheMean() {
    List<LadderLine> lines = LadderLine.of(model.figures().orElseThrow(), 77);

    assertThat(lines).hasSize(6).allSatisfy(line -> assertThat(line.rung()).isPresent());
    assertThat(lines.get(1).usualIn().orElseThrow()).isBetween(.0135, .014);
  }

  private static StringSet set(String name, double... gauges) {
    List<StringMake> makes =
        DoubleStream.of(gauges)
            .mapToObj(
                gauge ->
                    StringMake.of(
                        gauge, gauge < .020 ? Construction.PLAIN_STEEL : Construction.WOUND_STEEL))
            .toList();
    return new StringSet(
        UUID.nameUUIDFromBytes(name.getBytes(StandardCharsets.UTF_8)), name, makes);
  }
}
