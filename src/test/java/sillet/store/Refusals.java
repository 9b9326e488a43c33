package sillet.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import sillet.store.engine.LogbookProblem;
import sillet.store.engine.ProblemKind;

/** Checks that a call fails for the right reason. */
public final class Refusals {
  private Refusals() {}

  public static void refuses(ProblemKind kind, ThrowingCallable call) {
    assertThatThrownBy(call)
        .isInstanceOfSatisfying(
            LogbookProblem.class, problem -> assertThat(problem.kind()).isEqualTo(kind));
  }
}
