package sillet.rules;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** What stands at the top of the repository, so that nothing is left lying there. */
class TopLevelTest {
  @Test
  void holdsOnlyWhatBelongsThere() throws IOException {
    try (Stream<Path> entries = Files.list(Path.of(""))) {
      assertThat(entries.map(Path::toString).filter(name -> !name.startsWith(".")))
          .isSubsetOf(
              "README.md",
              "DEVELOPERS.md",
              "LICENSE",
              "pom.xml",
              "src",
              "db",
              "templates",
              "target");
    }
  }
}
