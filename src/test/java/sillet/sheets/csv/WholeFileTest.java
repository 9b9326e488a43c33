package sillet.sheets.csv;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WholeFileTest {
  @TempDir Path folder;

  @Test
  void writesAFileAndLeavesNothingBesideIt() throws IOException {
    Path target = folder.resolve("moves.csv");
    Files.writeString(target, "before");

    WholeFile.write(target, out -> out.write(new byte[] {'n', 'e', 'w'}));

    assertThat(target).hasContent("new");
    assertThat(folder.toFile().list()).containsExactly("moves.csv");
  }

  @Test
  void keepsWhatWasThereWhenWritingFails() throws IOException {
    Path target = folder.resolve("moves.csv");
    Files.writeString(target, "before");

    assertThatThrownBy(
            () ->
                WholeFile.write(
                    target,
                    out -> {
                      out.write(new byte[100_000]);
                      throw new IOException("disk full");
                    }))
        .hasMessage("disk full");

    assertThat(target).hasContent("before");
    assertThat(folder.toFile().list()).containsExactly("moves.csv");
  }

  @Test
  void leavesALinkALink() throws IOException {
    Path real = Files.writeString(folder.resolve("real.csv"), "before");
    Path link = Files.createSymbolicLink(folder.resolve("link.csv"), real);

    WholeFile.write(link, out -> out.write('x'));

    assertThat(link).isSymbolicLink();
    assertThat(real).hasContent("x");
  }

  @Test
  void saysSoWhenTheFolderIsMissing() {
    assertThatThrownBy(() -> WholeFile.write(folder.resolve("no/moves.csv"), out -> out.write('x')))
        .isInstanceOf(NoSuchFileException.class)
        .hasMessageEndingWith("moves.csv");
    assertThat(folder).isEmptyDirectory();
  }

  @Test
  void neverReplacesAFolder() {
    assertThatThrownBy(() -> WholeFile.write(folder, out -> out.write('x')))
        .isInstanceOf(IOException.class);
    assertThat(folder).isEmptyDirectory();
  }
}
