package sillet.desktop.frets;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.time.Instant;
import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.acoustics.pitch.FretPositions;
import sillet.logbook.parts.FretPlace;
import sillet.logbook.parts.FretPlaces;
import sillet.logbook.units.Figures;
import sillet.logbook.units.LengthUnit;

class FretSheetModelTest {
  private static final Instant NOW = Instant.parse("2025-12-01T14:05:00Z");

  private final FretSheetModel model = new FretSheetModel(LengthUnit.MM, 648, 22);

  /** Halves: G. Byers, American Lutherie 47 (1996) [S] for the rule of the divisor. */
  @Test
  void laysOutAnyScaleThatIsTyped() {
    model.scale().typedProperty().set("25.5in");
    model.frets().typedProperty().set("24");

    assertThat(model.rows()).hasSize(24);
    assertThat(model.rows().get(11).fromNutMm()).isCloseTo(323.85, within(1e-9));
    assertThat(model.rows().get(23).toLastMm()).isZero();
  }

  @Test
  void showsNothingForAScaleThatIsNone() {
    model.scale().typedProperty().set("long");
    model.scale().look();

    assertThat(model.rows()).isEmpty();
    assertThat(model.scale().problemProperty().get()).isPresent();
  }

  /** 0.1 mm costs 0.53 cents at fret 12 of 648 mm [D]. */
  @Test
  void holdsFewFretsAgainstScaleAndNut() {
    model.place(12).typedProperty().set("324.1");

    assertThat(model.against()).isEqualTo(FretSheetModel.Against.NOMINAL);
    FretRow.Off off = model.rows().get(11).off().orElseThrow();
    assertThat(off.mm()).isCloseTo(0.1, within(1e-9));
    assertThat(off.cents()).isCloseTo(0.53, within(0.01));
    assertThat(model.rows().get(0).off()).isEmpty();
  }

  @Test
  void tellsTheNutFromAMisplacedFret() {
    measure(0.5, 7, 0.4);

    assertThat(model.against()).isEqualTo(FretSheetModel.Against.FRETS);
    assertThat(model.byAll().orElseThrow().nutFar() * 1e3).isCloseTo(0.5, within(0.02));
    assertThat(model.byRule().orElseThrow().scale() * 1e3).isCloseTo(648, within(0.1));
    FretRow worst = model.worst().orElseThrow();
    assertThat(worst.fret()).isEqualTo(7);
    assertThat(worst.off().orElseThrow().mm()).isCloseTo(0.4, within(0.02));

    model.hold(FretSheetModel.Against.NOMINAL);
    assertThat(model.rows().get(2).off().orElseThrow().mm()).isCloseTo(0.5, within(0.02));
  }

  @Test
  void refusesAPlaceBehindTheBridge() {
    model.place(3).typedProperty().set("700");

    assertThat(model.finish(NOW)).isEmpty();
    assertThat(model.place(3).problemProperty().get()).isPresent();
    assertThat(model.rows().get(2).off()).isEmpty();
  }

  @Test
  void keepsOnlyWhatWasMeasuredAndOnlyOnce() {
    assertThat(model.changed()).isFalse();
    assertThat(model.finish(NOW)).isEmpty();
    model.place(5).typedProperty().set("162.5");
    assertThat(model.changed()).isTrue();

    FretPlaces finished = model.finish(NOW).orElseThrow();
    assertThat(finished)
        .isEqualTo(new FretPlaces(NOW, 648, List.of(new FretPlace(5, 162.5, "162.5"))));
    model.kept(finished);
    assertThat(model.changed()).isFalse();
  }

  @Test
  void takesWhatWasMeasuredBefore() {
    model.take(new FretPlaces(NOW, 648, List.of(new FretPlace(1, 36.4, "36.4"))));

    assertThat(model.place(1).typedProperty().get()).isEqualTo("36.4");
    assertThat(model.changed()).isFalse();
  }

  @Test
  void outlivesAScaleTypedShorterThanThePlaces() {
    measure(0, 1, 0);
    model.scale().typedProperty().set("300");

    assertThat(model.rows()).hasSize(22);
    model.hold(FretSheetModel.Against.NOMINAL);
    assertThat(model.rows()).hasSize(22);
  }

  private void measure(double nutFarMm, int misplaced, double misplacedMm) {
    for (int fret = 1; fret <= 22; fret++) {
      double mm = FretPositions.fromNut(648, fret) + nutFarMm;
      double place = fret == misplaced ? mm + misplacedMm : mm;
      model.place(fret).typedProperty().set(Figures.fixed(place, 2));
    }
  }
}
