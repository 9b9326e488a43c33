package sillet.sheets.job;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class StringPassesTest {
  private final DemoVisit visit = new DemoVisit();

  @Test
  void knowsNothingOfAStringThatWasNeverRead() {
    StringPasses string = string();

    assertThat(string.received()).isNull();
    assertThat(string.left()).isNull();
    assertThat(string.movedMm()).isNull();
    assertThat(string.passesRead()).isZero();
  }

  @Test
  void tellsFirstAndLastReadingAndAddsTheMovesUp() {
    visit.read(1, 1, 12, "5.0");
    visit.move(1, 1, 1.5, null);
    visit.read(2, 1, 12, "1.2");
    visit.move(2, 1, 0.4, null);
    visit.read(3, 1, 12, "0.1");
    StringPasses string = string();

    assertThat(string.received()).isEqualTo(5.0);
    assertThat(string.left()).isEqualTo(0.1);
    assertThat(string.leftAfter(0)).isEqualTo(1.2);
    assertThat(string.movedMm()).isEqualTo(1.9);
    assertThat(string.passesRead()).isEqualTo(3);
  }

  @Test
  void doesNotKnowWhatIsLeftAfterAMoveNobodyReadAfter() {
    visit.read(1, 1, 12, "5.0");
    visit.move(1, 1, 1.5, null);
    StringPasses string = string();

    assertThat(string.received()).isEqualTo(5.0);
    assertThat(string.left()).isNull();
    assertThat(string.leftAfter(0)).isNull();
  }

  @Test
  void takesAnUnmovedReadingAsWhatIsLeft() {
    visit.read(1, 1, 12, "0.4");
    visit.read(2, 2, 12, "3");
    StringPasses string = string();

    assertThat(string.left()).isEqualTo(0.4);
    assertThat(string.leftAfter(0)).isEqualTo(0.4);
    assertThat(string.wasWorkedOn(1)).isFalse();
  }

  private StringPasses string() {
    return StringPasses.of(visit.passes()).get(0);
  }
}
