package sillet.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import picocli.CommandLine;
import sillet.store.engine.LogbookProblem;
import sillet.store.engine.ProblemKind;

class FailuresTest {
  private final ByteArrayOutputStream err = new ByteArrayOutputStream();
  private final Failures failures =
      new Failures(new Terminal(new ByteArrayOutputStream(), err, () -> false));

  @ParameterizedTest
  @CsvSource({
    "IN_USE, 3", "DAMAGED, 4", "NEWER, 4", "UNREADABLE_ACTION, 4", "READ_ONLY, 5", "DISK, 5",
    "NOT_CERTAIN, 5", "NO_SUCH, 2", "BAD_PLACE, 2", "EXISTS, 2", "UNEXPECTED, 1", "CLOSED, 1"
  })
  void answersEachProblemOfALogbookWithItsCode(ProblemKind kind, int code) {
    assertThat(handle(new LogbookProblem(kind, "here", null))).isEqualTo(code);
    assertThat(said()).hasLineCount(1).endsWith("here\n");
  }

  @Test
  void answersTroubleWritingWithFive() {
    assertThat(handle(new AccessDeniedException("/shop/moves.csv"))).isEqualTo(5);
    assertThat(handle(new IOException("No space left on device"))).isEqualTo(5);
    assertThat(said().lines())
        .containsExactly(
            "Not written: no permission for /shop/moves.csv",
            "Not written: No space left on device");
  }

  @Test
  void answersWhatNobodyExpectedWithOneAndOneLine() {
    assertThat(handle(new IllegalStateException("odd"))).isEqualTo(1);
    assertThat(said()).contains("IllegalStateException: odd at ").hasLineCount(1);
  }

  private int handle(Exception trouble) {
    return failures.handleExecutionException(
        trouble, new CommandLine(new MovesCommand(Terminal.standard())), null);
  }

  private String said() {
    return err.toString(StandardCharsets.UTF_8);
  }
}
