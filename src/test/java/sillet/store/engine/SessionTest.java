package sillet.store.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static sillet.store.Refusals.refuses;

import org.jdbi.v3.core.Handle;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class SessionTest {
  private final Session session = new Engine().inMemory();

  @AfterEach
  void close() {
    session.close();
  }

  private static int keep(Handle handle, String name) {
    return handle.execute(
        "INSERT INTO string_set (id, version, name) VALUES (RANDOM_UUID(), 1, ?)", name);
  }

  private int kept() {
    return session.read(
        handle -> handle.createQuery("SELECT COUNT(*) FROM string_set").mapTo(Integer.class).one());
  }

  static Throwable[] everythingThatCanBeThrown() {
    return new Throwable[] {new IllegalStateException("refused"), new OutOfMemoryError("made up")};
  }

  @ParameterizedTest
  @MethodSource("everythingThatCanBeThrown")
  void takesEverythingBackWhateverIsThrown(Throwable thrown) {
    assertThatThrownBy(
            () ->
                session.save(
                    handle -> {
                      keep(handle, "half");
                      throw sneaked(thrown);
                    }))
        .isSameAs(thrown);
    assertThat(kept()).isZero();
    assertThat(session.<Integer>save(handle -> keep(handle, "whole"))).isEqualTo(1);
    assertThat(kept()).isEqualTo(1);
  }

  private static RuntimeException sneaked(Throwable thrown) {
    if (thrown instanceof Error error) {
      throw error;
    }
    return (RuntimeException) thrown;
  }

  @Test
  void doesItsWorkOnTheThreadOfTheLogbook() {
    assertThat(session.<String>read(handle -> Thread.currentThread().getName()))
        .isEqualTo("logbook");
    assertThat(session.<Boolean>save(handle -> Thread.currentThread().isDaemon())).isTrue();
  }

  @Test
  void refusesAnAnswerToWrongSqlAsUnexpectedAndStaysOpen() {
    refuses(
        ProblemKind.UNEXPECTED, () -> session.read(handle -> handle.execute("SELECT nonsense")));
    assertThat(kept()).isZero();
  }
}
