package sillet.store.place;

import static org.assertj.core.api.Assertions.assertThat;
import static sillet.store.Refusals.refuses;

import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.store.engine.ProblemKind;

class LogbookPlaceTest {
  @TempDir private Path folder;

  private Surroundings around(String system, Map<String, String> environment) {
    return new Surroundings(system, folder, environment);
  }

  private Path chosen(String option, String system, Map<String, String> environment) {
    return LogbookPlace.choose(option, around(system, environment)).file();
  }

  @Test
  void liesInThePlatformsDataFolderUnlessNamed() {
    assertThat(chosen(null, "Linux", Map.of()))
        .isEqualTo(folder.resolve(".local/share/sillet/logbook.mv.db"));
    assertThat(chosen(null, "Linux", Map.of("XDG_DATA_HOME", folder.resolve("xdg").toString())))
        .isEqualTo(folder.resolve("xdg/sillet/logbook.mv.db"));
    assertThat(chosen(null, "Windows 11", Map.of("APPDATA", folder.resolve("roam").toString())))
        .isEqualTo(folder.resolve("roam/sillet/logbook.mv.db"));
    assertThat(chosen(null, "Windows 11", Map.of()))
        .isEqualTo(folder.resolve("AppData/Roaming/sillet/logbook.mv.db"));
    assertThat(chosen(null, "Mac OS X", Map.of("XDG_DATA_HOME", "/elsewhere")))
        .isEqualTo(folder.resolve("Library/Application Support/sillet/logbook.mv.db"));
  }

  @Test
  void ignoresARelativeDataFolderAsTheStandardAsks() {
    assertThat(chosen(null, "Linux", Map.of("XDG_DATA_HOME", "data")))
        .isEqualTo(folder.resolve(".local/share/sillet/logbook.mv.db"));
  }

  @Test
  void followsTheVariableAndBeforeItTheOption() {
    Map<String, String> named = Map.of("SILLET_LOGBOOK", folder.resolve("mine").toString());
    assertThat(chosen(null, "Linux", named)).isEqualTo(folder.resolve("mine.mv.db"));
    assertThat(chosen(folder.resolve("other").toString(), "Linux", named))
        .isEqualTo(folder.resolve("other.mv.db"));
    assertThat(chosen(null, "Linux", Map.of("SILLET_LOGBOOK", " ")))
        .isEqualTo(folder.resolve(".local/share/sillet/logbook.mv.db"));
  }

  @Test
  void takesAFileWithOrWithoutItsEndingOrAFolder() {
    String text = folder.toString();
    assertThat(LogbookPlace.of(text + "/shop").file()).isEqualTo(folder.resolve("shop.mv.db"));
    assertThat(LogbookPlace.of(text + "/shop.mv.db").file())
        .isEqualTo(folder.resolve("shop.mv.db"));
    assertThat(LogbookPlace.of(text).file()).isEqualTo(folder.resolve("logbook.mv.db"));
    assertThat(LogbookPlace.of(text + "/not-yet/").file())
        .isEqualTo(folder.resolve("not-yet/logbook.mv.db"));
    assertThat(LogbookPlace.of("shop").file())
        .isEqualTo(Path.of("").toAbsolutePath().resolve("shop.mv.db"));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "  ",
        "shop;INIT=RUNSCRIPT FROM 'x.sql'",
        "shop;/",
        "shop\nname",
        "shop\tname",
        "shop\0name"
      })
  void refusesTextThatADatabaseWouldReadAsMore(String text) {
    refuses(ProblemKind.BAD_PLACE, () -> LogbookPlace.of(text));
  }

  @Test
  void refusesABackslashWhereItIsNoSeparator() {
    if (Path.of("x").getFileSystem().getSeparator().equals("/")) {
      refuses(ProblemKind.BAD_PLACE, () -> LogbookPlace.of("shop\\name"));
    } else {
      assertThat(LogbookPlace.of("shop\\name").file().getFileName()).hasToString("name.mv.db");
    }
  }

  @Test
  void refusesASemicolonInTheFolderToo() {
    refuses(
        ProblemKind.BAD_PLACE,
        () -> LogbookPlace.usual(new Surroundings("Linux", Path.of("/home/a;b"), Map.of())));
  }
}
