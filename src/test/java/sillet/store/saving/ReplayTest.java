package sillet.store.saving;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static sillet.store.Refusals.refuses;

import java.nio.file.Path;
import java.sql.SQLException;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.store.BenchDay;
import sillet.store.Logbook;
import sillet.store.Tables;
import sillet.store.engine.ProblemKind;
import sillet.store.place.LogbookPlace;

class ReplayTest {
  @TempDir private Path folder;

  private LogbookPlace place(String name) {
    return LogbookPlace.of(folder.resolve(name).toString());
  }

  private List<ActionRow> rowsOfABenchDay(LogbookPlace place) {
    try (Logbook logbook = Logbook.create(place)) {
      BenchDay.actions().forEach(action -> logbook.perform(action, BenchDay.TECHNICIAN));
      return logbook.replay().recorded(0);
    }
  }

  @Test
  void givesTheSameLogbookFromItsActionsAlone() throws SQLException {
    List<ActionRow> rows = rowsOfABenchDay(place("first"));
    try (Logbook logbook = Logbook.create(place("second"))) {
      logbook.replay().perform(rows);
    }
    Map<String, List<String>> first = Tables.of(place("first").file());
    assertThat(Tables.of(place("second").file())).isEqualTo(first);
    assertThat(first).hasSizeGreaterThan(10);
    assertThat(first).allSatisfy((table, content) -> assertThat(content).isNotEmpty());
  }

  @Test
  void goesOnWhereALogbookStands() throws SQLException {
    List<ActionRow> rows = rowsOfABenchDay(place("first"));
    try (Logbook logbook = Logbook.create(place("second"))) {
      logbook.replay().perform(rows.subList(0, 5));
    }
    try (Logbook logbook = Logbook.open(place("second"))) {
      assertThat(logbook.replay().recorded(3)).isEqualTo(rows.subList(3, 5));
      logbook.replay().perform(rows.subList(5, rows.size()));
    }
    assertThat(Tables.of(place("second").file())).isEqualTo(Tables.of(place("first").file()));
  }

  @Test
  void refusesAGap() {
    List<ActionRow> rows = rowsOfABenchDay(place("first"));
    try (Logbook logbook = Logbook.inMemory()) {
      assertThatIllegalArgumentException()
          .isThrownBy(() -> logbook.replay().perform(rows.subList(1, 3)));
      assertThat(logbook.replay().recorded(0)).isEmpty();
    }
  }

  @Test
  void refusesWhatANewerProgramRecorded() {
    ActionRow row = rowsOfABenchDay(place("first")).get(0);
    try (Logbook logbook = Logbook.inMemory()) {
      refuses(
          ProblemKind.UNREADABLE_ACTION,
          () -> logbook.replay().perform(List.of(with(row, row.name(), 2, row.values()))));
      refuses(
          ProblemKind.UNREADABLE_ACTION,
          () -> logbook.replay().perform(List.of(with(row, "fly away", 1, row.values()))));
    }
  }

  @Test
  void refusesValuesThatAreMissingOrLeftOverOrNone() {
    ActionRow row = rowsOfABenchDay(place("first")).get(0);
    String values = row.values();
    ActionForms forms = new ActionForms();
    assertThat(forms.read(row)).isEqualTo(BenchDay.actions().get(0));
    for (String broken :
        List.of(
            values.replace("\"demo\":true", "\"other\":true"),
            values.replace("\"demo\":true", "\"demo\":true,\"more\":1"),
            values.replace("64ths", "65ths"),
            values.replace("\"technicians\":[", "\"technicians\":[{},"),
            "",
            "null",
            "[]",
            "{",
            "\u0000")) {
      refuses(
          ProblemKind.UNREADABLE_ACTION,
          () -> forms.read(with(row, row.name(), row.form(), broken)));
    }
  }

  private static ActionRow with(ActionRow row, String name, int form, String values) {
    return new ActionRow(row.sequence(), row.at(), row.technician(), name, form, values);
  }
}
