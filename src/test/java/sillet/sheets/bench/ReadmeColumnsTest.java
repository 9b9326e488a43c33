package sillet.sheets.bench;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;

class ReadmeColumnsTest {
  @Test
  void theReadmeNamesEveryColumn() throws IOException {
    String readme = Files.readString(Path.of("README.md"));
    List<String> single =
        Columns.KNOWN.stream().filter(name -> !name.matches("f([2-9]|1\\d|2[0-3])")).toList();

    assertThat(single)
        .hasSizeGreaterThan(40)
        .allSatisfy(name -> assertThat(readme).contains('`' + name + '`'));
  }
}
