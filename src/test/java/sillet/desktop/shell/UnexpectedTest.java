package sillet.desktop.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.UncheckedIOException;
import org.junit.jupiter.api.Test;

class UnexpectedTest {
  @Test
  void givesTheSameFailureTheSameCode() {
    assertThat(Unexpected.code(broken(1))).isEqualTo(Unexpected.code(broken(2)));
    assertThat(Unexpected.code(broken(1))).matches("[0-9A-F]{4}-[0-9A-F]{4}");
  }

  @Test
  void givesAnotherFailureAnotherCode() {
    assertThat(Unexpected.code(broken(1))).isNotEqualTo(Unexpected.code(new RuntimeException()));
  }

  @Test
  void looksAtWhatLiesBehind() {
    var behind = new IOException("disk");

    assertThat(Unexpected.code(new UncheckedIOException(behind)))
        .isEqualTo(Unexpected.code(behind));
  }

  private static Throwable broken(int value) {
    return new IllegalStateException("value " + value);
  }
}
