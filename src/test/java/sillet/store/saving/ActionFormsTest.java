package sillet.store.saving;

import static org.assertj.core.api.Assertions.assertThat;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.logbook.actions.Action;
import sillet.store.BenchDay;
import sillet.store.Logbook;

/**
 * The files under {@code recorded} were written when their form was new. They are never written
 * again: a logbook from that day has rows like theirs.
 */
class ActionFormsTest {
  private static final String FOLDER = "/sillet/store/recorded/";

  static List<String> known() {
    return ActionForms.known();
  }

  @Test
  void knowsAFormOfEveryAction() {
    List<String> names = new ArrayList<>();
    BenchDay.actions().forEach(action -> names.add(action.name() + " " + action.form()));
    assertThat(ActionForms.known()).containsAll(names);
    assertThat(BenchDay.actions().stream().map(Action::getClass).distinct().toList())
        .hasSize(Action.class.getPermittedSubclasses().length);
  }

  @ParameterizedTest
  @MethodSource("known")
  void readsWhatWasRecordedInEveryFormThereEverWas(String form) throws IOException {
    List<ActionRow> rows = recorded(form);
    assertThat(rows).isNotEmpty();
    ActionForms forms = new ActionForms();
    for (ActionRow row : rows) {
      assertThat(row.name() + " " + row.form()).isEqualTo(form);
      assertThat(forms.read(row).name()).isEqualTo(row.name());
    }
  }

  @Test
  void makesALogbookOfWhatWasRecorded() throws IOException {
    List<ActionRow> rows = new ArrayList<>();
    for (String form : ActionForms.known()) {
      rows.addAll(recorded(form));
    }
    rows.sort(Comparator.comparingLong(ActionRow::sequence));
    try (Logbook logbook = Logbook.inMemory()) {
      logbook.replay().perform(rows);
      var record = logbook.visits().byTicket(BenchDay.TICKET).orElseThrow();
      assertThat(record.readings()).isEqualTo(BenchDay.readings());
      assertThat(record.checks()).isEqualTo(BenchDay.checks());
      assertThat(record.moves()).isEqualTo(BenchDay.moves());
      assertThat(record.work()).containsExactly(BenchDay.work());
      assertThat(record.aim()).isEqualTo(BenchDay.aim());
      assertThat(record.notes()).containsExactly(BenchDay.note());
      assertThat(logbook.parts().frets(BenchDay.INSTRUMENT_ID))
          .containsExactly(BenchDay.fretPlaces());
      assertThat(logbook.parts().pickups(BenchDay.INSTRUMENT_ID))
          .containsExactly(BenchDay.pickups());
    }
  }

  private static List<ActionRow> recorded(String form) throws IOException {
    String file = FOLDER + form.replace(' ', '-') + ".jsonl";
    try (InputStream stream = ActionFormsTest.class.getResourceAsStream(file)) {
      assertThat(stream).as(file).isNotNull();
      String text = new String(stream.readAllBytes(), StandardCharsets.UTF_8);
      return text.lines().map(ActionFormsTest::row).toList();
    }
  }

  private static ActionRow row(String line) {
    JsonObject object = JsonParser.parseString(line).getAsJsonObject();
    return new ActionRow(
        object.get("sequence").getAsLong(),
        Instant.parse(object.get("at").getAsString()),
        object.get("technician").getAsString(),
        object.get("name").getAsString(),
        object.get("form").getAsInt(),
        object.get("values").toString());
  }
}
