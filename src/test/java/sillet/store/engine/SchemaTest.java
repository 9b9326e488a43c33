package sillet.store.engine;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

class SchemaTest {
  private static final Path SCRIPTS = Path.of("db", "migration");
  private static final Pattern NAME = Pattern.compile("V(\\d+)__\\w+\\.sql");

  private static List<Path> scripts() throws IOException {
    try (Stream<Path> files = Files.list(SCRIPTS)) {
      return files.sorted().toList();
    }
  }

  @Test
  void knowsTheNewestScript() throws IOException {
    int newest = 0;
    for (Path script : scripts()) {
      Matcher name = NAME.matcher(script.getFileName().toString());
      assertThat(name.matches()).as(script.toString()).isTrue();
      newest = Math.max(newest, Integer.parseInt(name.group(1)));
    }
    assertThat(Schema.NEWEST).isEqualTo(newest);
  }

  @Test
  void speaksNoDialect() throws IOException {
    for (Path script : scripts()) {
      String sql = Files.readString(script).replaceAll("--.*", "").toLowerCase(Locale.ROOT);
      assertThat(sql)
          .doesNotContainPattern(
              "auto_increment|\\bserial\\b.*primary|returning|on conflict|merge into|clob|nextval"
                  + "|\\bif not exists|\\btext\\b|create index[^;]*where|index[^;]*\\(\\s*lower");
    }
  }

  @Test
  void bringsANewDatabaseToTheNewestScript() {
    try (Session session = new Engine().inMemory()) {
      String newest =
          session.read(
              handle ->
                  handle
                      .createQuery("SELECT MAX(\"version\") FROM \"flyway_schema_history\"")
                      .mapTo(String.class)
                      .one());
      assertThat(newest).isEqualTo(String.valueOf(Schema.NEWEST));
    }
  }

  @Test
  void leavesNoConnectionOpenButItsOwn() {
    try (Session session = new Engine().inMemory()) {
      int connections =
          session.read(
              handle ->
                  handle
                      .createQuery("SELECT COUNT(*) FROM INFORMATION_SCHEMA.SESSIONS")
                      .mapTo(Integer.class)
                      .one());
      assertThat(connections).isEqualTo(1);
    }
  }
}
