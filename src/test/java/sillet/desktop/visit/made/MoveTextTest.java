package sillet.desktop.visit.made;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.LengthUnit;

class MoveTextTest {
  private static final double SCREW_MM = 0.5;

  @ParameterizedTest
  @CsvSource({"3 3/4, 3.75", "3/4, 0.75", "3.75, 3.75", "'3,75', 3.75", "' 2 ', 2", "0, 0"})
  void readsTurnsAsPeopleWriteThem(String typed, double turns) {
    MoveText made = MoveText.parse(typed, SCREW_MM, LengthUnit.MM);
    assertThat(made.turns()).isEqualTo(turns);
    assertThat(made.mm()).isCloseTo(turns * SCREW_MM, within(1e-9));
  }

  @ParameterizedTest
  @CsvSource({"1.9mm, 1.9", "'1,9 mm', 1.9", ".075in, 1.905", "4/64in, 1.5875"})
  void readsALengthWhereAUnitIsTyped(String typed, double mm) {
    MoveText made = MoveText.parse(typed, SCREW_MM, LengthUnit.MM);
    assertThat(made.mm()).isCloseTo(mm, within(1e-9));
    assertThat(made.turns()).isNull();
  }

  @Test
  void readsABareNumberAsALengthWhereThereIsNoScrew() {
    assertThat(MoveText.parse("1.9", null, LengthUnit.MM).mm()).isEqualTo(1.9);
    assertThat(MoveText.parse("4", null, LengthUnit.SIXTY_FOURTHS).mm())
        .isCloseTo(1.5875, within(1e-9));
  }

  @ParameterizedTest
  @ValueSource(strings = {"three", "1/0", "3 3/4 1/2", "-2", "-1mm", "1 2 3"})
  void refusesWhatIsNoSize(String typed) {
    assertThatThrownBy(() -> MoveText.parse(typed, SCREW_MM, LengthUnit.MM))
        .isInstanceOf(Rejection.class);
  }
}
