package sillet.desktop.visit.readings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.logbook.text.Rejection;

class ShownFretsTest {
  private static final int FRETS = 22;

  @Test
  void readsFretsInAnyOrderAndDividedAsPeopleDo() {
    assertThat(ShownFrets.parse(" 12, 5 1/5;0 ", FRETS).frets()).containsExactly(0, 1, 5, 12);
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "twelve", "1 -5", "23", "1.5", "100"})
  void refusesWhatIsNoFretOfThisNeck(String typed) {
    assertThatThrownBy(() -> ShownFrets.parse(typed, FRETS))
        .isInstanceOfSatisfying(
            Rejection.class, r -> assertThat(r.reason().key()).isEqualTo("visit.frets.none"));
  }

  @Test
  void takesAsManyFretsAsOneWantsToRead() {
    assertThat(ShownFrets.parse("17 1 2 3 5 7 9 12 15", FRETS).written())
        .isEqualTo("1 2 3 5 7 9 12 15 17");
  }

  @Test
  void showsWhatWasReadBesideTheUsualFrets() {
    assertThat(ShownFrets.including(List.of(12, 7)).frets()).containsExactly(1, 5, 7, 12);
    assertThat(ShownFrets.including(List.of(12, 7)).written()).isEqualTo("1 5 7 12");
  }
}
