package sillet.store.reading;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.logbook.actions.Action;
import sillet.logbook.actions.AddCustomer;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.HandOut;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.shop.Customer;
import sillet.store.BenchDay;
import sillet.store.Logbook;

class SearchTest {
  private static final int MANY = 60;
  private static Logbook logbook;

  @BeforeAll
  static void fill() {
    logbook = Logbook.inMemory();
    for (Action action : BenchDay.actions().subList(0, 14)) {
      logbook.perform(action, BenchDay.TECHNICIAN);
    }
  }

  @AfterAll
  static void close() {
    logbook.close();
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "alderton",
        "MEADOW",
        "a-0042",
        "blue tag",
        "7 blue",
        "zoe",
        "Zo\u00eb",
        "ZOE\u0308 marsalek",
        "Mar\u0161\u00e1lek meadow",
        "0151",
        "0151 234567",
        "0151-234-567",
        "234567",
        "1041",
        "#1041",
        "zoe@example.org",
        "  alderton   6 "
      })
  void findsTheInstrumentBy(String typed) {
    Found<InstrumentLine> found = logbook.instruments().search(typed);
    assertThat(found.count()).isEqualTo(1);
    assertThat(found.newest())
        .singleElement()
        .extracting(line -> line.instrument().what())
        .isEqualTo(BenchDay.instrument());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"alderton nobody", "%", "_", "!", "1043", "' OR 1=1 --", "\\", "99999999999999"})
  void findsNothingBy(String typed) {
    assertThat(logbook.instruments().search(typed)).isEqualTo(new Found<>(List.of(), 0));
  }

  @Test
  void saysWhatIsOnTheBenchAndHowOftenItWasThere() {
    InstrumentLine line = logbook.instruments().search("alderton").newest().get(0);
    assertThat(line.visits()).isEqualTo(1);
    assertThat(line.openTicket()).isEqualTo(BenchDay.TICKET);
    assertThat(line.lastTakenIn()).isEqualTo(BenchDay.DAY);
  }

  @Test
  void findsCustomersByNameAndTelephone() {
    assertThat(logbook.shop().customers("zoe").count()).isEqualTo(1);
    assertThat(logbook.shop().customers("0151/234").newest())
        .containsExactly(new Kept<>(BenchDay.customer(), 1));
    assertThat(logbook.shop().customers("alderton").count()).isZero();
  }

  @Test
  void beginsWithWhatWasOnTheBenchLast() {
    assertThat(names("")).containsExactly("five-string", "Alderton Meadow 6");
    try (Logbook other = Logbook.inMemory()) {
      for (Action action : BenchDay.actions().subList(0, 14)) {
        other.perform(action, BenchDay.TECHNICIAN);
      }
      other.perform(new HandOut(BenchDay.VISIT_ID, BenchDay.DAY), BenchDay.TECHNICIAN);
      assertThat(other.instruments().search("").newest())
          .extracting(line -> line.instrument().what().name())
          .containsExactly("Alderton Meadow 6", "five-string");
    }
  }

  private static List<String> names(String typed) {
    return logbook.instruments().search(typed).newest().stream()
        .map(line -> line.instrument().what().name())
        .toList();
  }

  @Test
  void showsTheNewestFiftyAndCountsAll() {
    try (Logbook crowded = Logbook.inMemory()) {
      for (int i = 1; i <= MANY; i++) {
        crowded.perform(new AddCustomer(numbered(i)), BenchDay.TECHNICIAN);
        crowded.perform(new AddInstrument(ofNumber(i)), BenchDay.TECHNICIAN);
      }
      Found<InstrumentLine> found = crowded.instruments().search("maker");
      assertThat(found.count()).isEqualTo(MANY);
      assertThat(found.newest()).hasSize(Found.MOST);
      assertThat(found.newest().get(0).instrument().what()).isEqualTo(ofNumber(MANY));
      assertThat(crowded.shop().customers("").count()).isEqualTo(MANY);
      assertThat(crowded.shop().customers("").newest().get(0).what()).isEqualTo(numbered(MANY));
    }
  }

  private static Customer numbered(int number) {
    return new Customer(BenchDay.id(1000 + number), "Customer " + number, "", "", "");
  }

  private static Instrument ofNumber(int number) {
    Instrument like = BenchDay.instrument();
    return new Instrument(
        BenchDay.id(2000 + number),
        BenchDay.id(1000 + number),
        InstrumentKind.OTHER,
        "Maker",
        "no " + number,
        "",
        "",
        like.neck(),
        like.saddle());
  }
}
