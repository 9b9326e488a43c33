package sillet.acoustics.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;

@DisplayName("Answers that may fail")
class OutcomeTest {

  @Test
  void carriesAnAnswerOn() {
    Outcome<Integer> doubled = Outcome.solved(2).map(x -> x * 2);
    assertThat(doubled).isEqualTo(new Solved<>(4));
  }

  @Test
  void keepsTheFirstReason() {
    Outcome<Integer> failed = Outcome.<Integer>notSolved("too stiff").map(x -> x * 2);
    assertThat(failed).isEqualTo(new NotSolved<>("too stiff"));
    assertThat(Outcome.solved(1).flatMap(x -> Outcome.notSolved("slack")))
        .isEqualTo(new NotSolved<>("slack"));
  }

  @Test
  void throwsTheReasonWhereAnAnswerIsInsistedOn() {
    assertThatThrownBy(() -> Outcome.notSolved("too stiff").orElseThrow())
        .isInstanceOf(IllegalStateException.class)
        .hasMessage("too stiff");
  }
}
