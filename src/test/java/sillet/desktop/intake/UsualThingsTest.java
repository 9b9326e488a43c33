package sillet.desktop.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import sillet.acoustics.wire.Construction;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.strings.Tuning;
import sillet.logbook.units.Pitch;

/** Every figure in the file is common practice, no source. */
class UsualThingsTest {
  private final UsualThings usual = UsualThings.load();

  @ParameterizedTest
  @EnumSource(InstrumentKind.class)
  void knowsEveryKindWithATuningForItsUsualStrings(InstrumentKind kind) {
    int strings = usual.of(kind).strings();
    assertThat(usual.tunings(kind, strings)).isNotEmpty();
    for (Tuning tuning : usual.tunings(kind, strings)) {
      assertThatCode(() -> tuning.at(Pitch.CONCERT_A4_HZ)).doesNotThrowAnyException();
    }
  }

  @Test
  void offersOnlyTuningsWithAsManyStrings() {
    assertThat(usual.tunings(InstrumentKind.BASS, 5))
        .extracting(Tuning::name)
        .containsExactly("five strings");
    assertThat(usual.tunings(InstrumentKind.BASS, 9)).isEmpty();
  }

  @Test
  void takesThickStringsForWound() {
    UsualKind electric = usual.of(InstrumentKind.ELECTRIC);
    assertThat(electric.construction(.017)).isEqualTo(Construction.PLAIN_STEEL);
    assertThat(electric.construction(.026)).isEqualTo(Construction.WOUND_STEEL);
  }
}
