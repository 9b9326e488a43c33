package sillet.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class PipeReaderTest {
  @TempDir Path folder;

  @Test
  void knowsAFileIsNoPipe() throws IOException {
    assertThat(PipeReader.isPipe(Files.createFile(folder.resolve("moves.csv")))).isFalse();
    assertThat(PipeReader.isPipe(folder.resolve("none"))).isFalse();
  }

  @Test
  void readsThePipeOutOfAMessage() {
    assertThat(PipeReader.isNamedIn(new IOException("Broken pipe"))).isTrue();
    assertThat(PipeReader.isNamedIn(new IOException("No space left on device"))).isFalse();
  }
}
