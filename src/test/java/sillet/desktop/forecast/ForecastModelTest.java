package sillet.desktop.forecast;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Locale;
import java.util.UUID;
import org.junit.jupiter.api.Test;
import sillet.acoustics.wire.Construction;
import sillet.logbook.forecast.StringChange;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;
import sillet.logbook.text.Texts;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.units.Pitch;
import sillet.logbook.visits.StringsOn;

class ForecastModelTest {
  private static final StringMake PLAIN = StringMake.of(0.010, Construction.PLAIN_STEEL);
  private static final StringMake WOUND = StringMake.of(0.046, Construction.WOUND_NICKEL);

  private final ForecastModel model =
      new ForecastModel(
          new StringsOn(
              "",
              null,
              "",
              440,
              List.of(
                  new FittedString(1, Pitch.parse("E4", 440), 648, PLAIN),
                  new FittedString(2, Pitch.parse("E2", 440), 648, WOUND))),
          LengthUnit.MM,
          Texts.english());

  private StringChange change(int string) {
    return model.change().orElseThrow().of(string);
  }

  @Test
  void leavesEverythingAsItIsWhileNothingIsTyped() {
    assertThat(change(1)).isEqualTo(StringChange.none(1));
    assertThat(change(2)).isEqualTo(StringChange.none(2));
    assertThat(model.change().orElseThrow().capoFret()).isZero();
  }

  @Test
  void tunesAllStringsDownByNote() {
    model.semitones().typedProperty().set("-2");
    model.tune();
    assertThat(change(1).pitch().typed()).isEqualTo("D4");
    // D2 is 73.42 Hz at A4 = 440 (equal temperament)
    assertThat(change(2).pitch().hz()).isCloseTo(73.42, within(0.01));
  }

  @Test
  void keepsTheNotesUnderAnotherReference() {
    model.reference().typedProperty().set("432");
    assertThat(change(1).pitch().typed()).isEqualTo("E4");
    assertThat(change(1).pitch().hz() / Pitch.parse("E4", 440).hz())
        .isCloseTo(432 / 440.0, within(1e-9));
  }

  @Test
  void makesAWoundStringLikeTheWoundOnesThatAreOn() {
    model.rows().get(0).gauge().typedProperty().set("20w");
    assertThat(change(1).gaugeIn()).isEqualTo(0.020);
    assertThat(change(1).construction()).isEqualTo(Construction.WOUND_NICKEL);
    model.rows().get(1).gauge().typedProperty().set("52");
    assertThat(change(2).construction()).isEqualTo(Construction.WOUND_NICKEL);
  }

  @Test
  void keepsWhatASetKnowsOfItsStringsUntilAnotherGaugeIsTyped() {
    StringMake known = new StringMake(0.011, Construction.PLAIN_STEEL, null, 0.48);
    model.take(new StringSet(new UUID(0, 1), "Elevens", List.of(known, WOUND)));
    assertThat(change(1).unitMassGPerM()).isEqualTo(0.48);
    assertThat(change(2)).as("the same string").isEqualTo(StringChange.none(2));
    model.rows().get(0).gauge().typedProperty().set("12");
    assertThat(change(1).unitMassGPerM()).isNull();
  }

  @Test
  void saysWhyACapoOrAPitchCannotBeRead() {
    model.capo().typedProperty().set("30");
    assertThat(model.change()).isEmpty();
    assertThat(model.problem()).isPresent();
    model.clear();
    model.rows().get(0).action().typedProperty().set(String.format(Locale.ROOT, "%.1f", 1.4));
    assertThat(change(1).action12Mm()).isEqualTo(1.4);
    model.rows().get(0).pitch().typedProperty().set("H4");
    assertThat(model.change()).isEmpty();
  }
}
