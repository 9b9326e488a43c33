package sillet.store.saving;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static sillet.store.Refusals.refuses;

import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.acoustics.readings.Reference;
import sillet.logbook.actions.AddCustomer;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.HandOut;
import sillet.logbook.actions.RecordChecks;
import sillet.logbook.actions.RecordReadings;
import sillet.logbook.actions.ReviseCustomer;
import sillet.logbook.actions.ReviseInstrument;
import sillet.logbook.actions.TakeIn;
import sillet.logbook.actions.WriteNote;
import sillet.logbook.shop.Customer;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.CheckMethod;
import sillet.logbook.visits.Moment;
import sillet.logbook.visits.NoteKind;
import sillet.logbook.visits.Reading;
import sillet.logbook.visits.Visit;
import sillet.logbook.visits.VisitNote;
import sillet.store.BenchDay;
import sillet.store.Logbook;
import sillet.store.engine.ProblemKind;
import sillet.store.reading.Kept;

class SavingTest {
  private static final Instant NOW = Instant.parse("2025-03-30T00:59:59.123456789Z");

  private final Logbook logbook = Logbook.inMemory(Clock.fixed(NOW, ZoneOffset.UTC));

  @AfterEach
  void close() {
    logbook.close();
  }

  private Saved perform(sillet.logbook.actions.Action action) {
    return logbook.perform(action, BenchDay.TECHNICIAN);
  }

  private static Customer called(String name) {
    return new Customer(BenchDay.CUSTOMER_ID, name, "", "", "");
  }

  private String nameKept() {
    return logbook.shop().customer(BenchDay.CUSTOMER_ID).orElseThrow().what().name();
  }

  @Test
  void recordsTheActionItself() {
    Saved saved = perform(new AddCustomer(called("Ann")));
    Instant toTheMicrosecond = Instant.parse("2025-03-30T00:59:59.123456Z");
    assertThat(saved).isEqualTo(new Saved(1, toTheMicrosecond));
    assertThat(logbook.replay().recorded(0))
        .containsExactly(
            new ActionRow(
                1,
                toTheMicrosecond,
                BenchDay.TECHNICIAN,
                "add customer",
                1,
                "{\"customer\":{\"id\":\"00000000-0051-11e7-0000-000000000001\","
                    + "\"name\":\"Ann\",\"phone\":\"\",\"email\":\"\",\"note\":\"\"}}"));
  }

  @Test
  void refusesAChangeOfARowThatChangedMeanwhile() {
    perform(new AddCustomer(called("Ann")));
    perform(new ReviseCustomer(called("Anna"), 1));
    refuses(ProblemKind.CONFLICT, () -> perform(new ReviseCustomer(called("Annie"), 1)));
    assertThat(logbook.shop().customer(BenchDay.CUSTOMER_ID))
        .contains(new Kept<>(called("Anna"), 2));
    perform(new AddInstrument(BenchDay.shortFifth()));
    refuses(ProblemKind.CONFLICT, () -> perform(new ReviseInstrument(BenchDay.shortFifth(), 2)));
    assertThat(logbook.replay().recorded(0)).hasSize(3);
  }

  @Test
  void refusesToEnterTheSameTwice() {
    perform(new AddCustomer(called("Ann")));
    refuses(ProblemKind.CONFLICT, () -> perform(new AddCustomer(called("Bob"))));
    assertThat(nameKept()).isEqualTo("Ann");
  }

  @Test
  void refusesATicketThatIsTaken() {
    perform(new AddInstrument(BenchDay.shortFifth()));
    perform(new TakeIn(BenchDay.secondVisit()));
    Visit first = BenchDay.secondVisit();
    Visit second =
        new Visit(
            BenchDay.id(77),
            first.ticket(),
            first.instrumentId(),
            null,
            first.arrival(),
            first.strings(),
            first.travel(),
            null);
    refuses(ProblemKind.CONFLICT, () -> perform(new TakeIn(second)));
  }

  @Test
  void refusesWhatBelongsToNothing() {
    refuses(ProblemKind.NOT_THERE, () -> perform(new AddInstrument(BenchDay.instrument())));
    refuses(ProblemKind.NOT_THERE, () -> perform(new TakeIn(BenchDay.visit())));
    refuses(
        ProblemKind.NOT_THERE,
        () -> perform(new RecordReadings(BenchDay.VISIT_ID, BenchDay.readings())));
    refuses(
        ProblemKind.NOT_THERE, () -> perform(new WriteNote(BenchDay.VISIT_ID, BenchDay.note())));
    refuses(ProblemKind.NOT_THERE, () -> perform(new HandOut(BenchDay.VISIT_ID, BenchDay.DAY)));
    refuses(ProblemKind.NOT_THERE, () -> perform(new ReviseCustomer(called("Ann"), 1)));
    assertThat(logbook.replay().recorded(0)).isEmpty();
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "O'Hara; DROP TABLE customer; --",
        "two\nlines\r\nand\ta tab",
        "\"quoted\" \\backslash\\ :name ?",
        "\ud83c\udfb8 \u2013 \u05d0\u05d1 \u4e2d\u6587 \u0301",
        "  space around  ",
        "",
        "<b>&amp;</b> \u2028 \u0007 \ufffd"
      })
  void keepsHostileTextAsItIs(String text) {
    perform(new AddCustomer(called(text)));
    assertThat(nameKept()).isEqualTo(text);
    try (Logbook second = Logbook.inMemory()) {
      second.replay().perform(logbook.replay().recorded(0));
      assertThat(second.shop().customer(BenchDay.CUSTOMER_ID).orElseThrow().what().name())
          .isEqualTo(text);
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"a\0b", "half \ud83c", "\udfb8 half"})
  void refusesTextThatNotEveryDatabaseCanHold(String text) {
    assertThatThrownBy(() -> perform(new AddCustomer(called(text)))).isInstanceOf(Rejection.class);
    assertThatThrownBy(() -> logbook.perform(new AddCustomer(called("Ann")), text))
        .isInstanceOf(Rejection.class);
    assertThat(logbook.replay().recorded(0)).isEmpty();
  }

  @Test
  void cutsNothingThatIsTooLong() {
    Customer fits = new Customer(BenchDay.CUSTOMER_ID, "n".repeat(1000), "", "", "x".repeat(20000));
    perform(new AddCustomer(fits));
    assertThat(logbook.shop().customer(BenchDay.CUSTOMER_ID)).contains(new Kept<>(fits, 1));
    refuses(ProblemKind.TOO_LONG, () -> perform(new ReviseCustomer(called("n".repeat(1001)), 1)));
    assertThat(logbook.shop().customer(BenchDay.CUSTOMER_ID)).contains(new Kept<>(fits, 1));
    assertThat(logbook.replay().recorded(0)).hasSize(1);
  }

  @Test
  void refusesNumbersThatAreNone() {
    perform(new AddInstrument(BenchDay.shortFifth()));
    perform(new TakeIn(BenchDay.secondVisit()));
    Reading bad = new Reading(1, 5, 12, Tries.parse("1"), Reference.OPEN, Double.NaN, NOW);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> perform(new RecordReadings(BenchDay.SECOND_VISIT_ID, List.of(bad))));
  }

  @Test
  void letsANewerCheckOfTheSameThingStandForTheOlder() {
    perform(new AddInstrument(BenchDay.shortFifth()));
    perform(new TakeIn(BenchDay.secondVisit()));
    BenchCheck first = relief(0.25, Moment.RECEIVED);
    BenchCheck left = relief(0.2, Moment.LEFT);
    BenchCheck corrected = relief(0.3, Moment.RECEIVED);
    perform(new RecordChecks(BenchDay.SECOND_VISIT_ID, List.of(first, left)));
    perform(new RecordChecks(BenchDay.SECOND_VISIT_ID, List.of(corrected)));
    assertThat(logbook.visits().byId(BenchDay.SECOND_VISIT_ID).orElseThrow().checks())
        .containsExactly(left, corrected);
  }

  private static BenchCheck relief(double mm, Moment moment) {
    return new BenchCheck(CheckKind.RELIEF, 0, 7, CheckMethod.STRAIGHTEDGE, moment, mm, "" + mm);
  }

  @Test
  void keepsEveryNoteInTheOrderWritten() {
    perform(new AddInstrument(BenchDay.shortFifth()));
    perform(new TakeIn(BenchDay.secondVisit()));
    VisitNote later = new VisitNote(BenchDay.AT, NoteKind.NOTE, "later written, earlier dated");
    perform(new WriteNote(BenchDay.SECOND_VISIT_ID, BenchDay.note()));
    perform(new WriteNote(BenchDay.SECOND_VISIT_ID, later));
    assertThat(logbook.visits().byId(BenchDay.SECOND_VISIT_ID).orElseThrow().notes())
        .containsExactly(BenchDay.note(), later);
  }
}
