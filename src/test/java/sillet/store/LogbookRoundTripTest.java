package sillet.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import sillet.logbook.actions.AddCustomer;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.ChooseAim;
import sillet.logbook.actions.ForgetLearned;
import sillet.logbook.actions.HandOut;
import sillet.logbook.actions.KeepStringSet;
import sillet.logbook.actions.LogWork;
import sillet.logbook.actions.NameShop;
import sillet.logbook.actions.RecordChecks;
import sillet.logbook.actions.RecordFretPlaces;
import sillet.logbook.actions.RecordMoves;
import sillet.logbook.actions.RecordPickups;
import sillet.logbook.actions.RecordReadings;
import sillet.logbook.actions.RecordTravel;
import sillet.logbook.actions.TakeIn;
import sillet.logbook.actions.WriteNote;
import sillet.logbook.parts.FretPlace;
import sillet.logbook.parts.FretPlaces;
import sillet.logbook.shop.Shop;
import sillet.logbook.visits.InstrumentPast;
import sillet.logbook.visits.Travel;
import sillet.logbook.visits.Visit;
import sillet.logbook.visits.VisitAim;
import sillet.logbook.visits.VisitRecord;
import sillet.store.reading.Kept;

class LogbookRoundTripTest {
  private final Logbook logbook = Logbook.inMemory();

  @AfterEach
  void close() {
    logbook.close();
  }

  private void perform(sillet.logbook.actions.Action action) {
    logbook.perform(action, BenchDay.TECHNICIAN);
  }

  @Test
  void keepsTheShopWhole() {
    assertThat(logbook.shop().shop()).isEmpty();
    perform(new NameShop(BenchDay.shop()));
    assertThat(logbook.shop().shop()).contains(new Kept<>(BenchDay.shop(), 1));
    Shop later = Shop.usual("Quill & Sons", List.of("Ada Quill"));
    perform(new NameShop(later));
    assertThat(logbook.shop().shop()).contains(new Kept<>(later, 2));
  }

  @Test
  void keepsCustomerAndInstrumentWhole() {
    perform(new AddCustomer(BenchDay.customer()));
    perform(new AddInstrument(BenchDay.instrument()));
    perform(new AddInstrument(BenchDay.shortFifth()));
    assertThat(logbook.shop().customer(BenchDay.CUSTOMER_ID))
        .contains(new Kept<>(BenchDay.customer(), 1));
    var line = logbook.instruments().instrument(BenchDay.INSTRUMENT_ID).orElseThrow();
    assertThat(line.instrument()).isEqualTo(new Kept<>(BenchDay.instrument(), 1));
    assertThat(line.customer()).isEqualTo(BenchDay.customer());
    var nobodys = logbook.instruments().instrument(BenchDay.SHORT_FIFTH_ID).orElseThrow();
    assertThat(nobodys.instrument().what()).isEqualTo(BenchDay.shortFifth());
    assertThat(nobodys.customer()).isNull();
  }

  @Test
  void keepsTheNewestFormOfAStringSet() {
    perform(new KeepStringSet(BenchDay.set()));
    perform(new KeepStringSet(BenchDay.set()));
    assertThat(logbook.stringSets().all()).containsExactly(BenchDay.set());
  }

  @Test
  void keepsEveryMeasuringOfFretsAndPickups() {
    takeIn();
    perform(new RecordFretPlaces(BenchDay.INSTRUMENT_ID, BenchDay.fretPlaces()));
    FretPlaces again =
        new FretPlaces(
            BenchDay.AT.plusSeconds(900), 647.7, List.of(new FretPlace(1, 36.35, "36.35")));
    perform(new RecordFretPlaces(BenchDay.INSTRUMENT_ID, again));
    perform(new RecordPickups(BenchDay.INSTRUMENT_ID, BenchDay.pickups()));
    assertThat(logbook.parts().frets(BenchDay.INSTRUMENT_ID))
        .containsExactly(again, BenchDay.fretPlaces());
    assertThat(logbook.parts().pickups(BenchDay.INSTRUMENT_ID)).containsExactly(BenchDay.pickups());
    assertThat(logbook.parts().frets(BenchDay.SHORT_FIFTH_ID)).isEmpty();
    assertThat(logbook.parts().pickups(BenchDay.SHORT_FIFTH_ID)).isEmpty();
  }

  @Test
  void knowsThePastOfAnInstrumentAndFromWhenItTeaches() {
    takeIn();
    VisitRecord first = logbook.visits().byTicket(BenchDay.TICKET).orElseThrow();
    assertThat(logbook.visits().past(first)).isEqualTo(InstrumentPast.NONE);
    Visit again =
        new Visit(
            BenchDay.SECOND_VISIT_ID,
            BenchDay.TICKET + 7,
            BenchDay.INSTRUMENT_ID,
            null,
            BenchDay.visit().arrival(),
            BenchDay.visit().strings(),
            List.of(),
            null);
    perform(new TakeIn(again));
    perform(new ForgetLearned(BenchDay.INSTRUMENT_ID, BenchDay.AT));
    perform(new ForgetLearned(BenchDay.INSTRUMENT_ID, BenchDay.AT.plusSeconds(5)));
    VisitRecord second = logbook.visits().byTicket(again.ticket()).orElseThrow();
    assertThat(logbook.visits().past(second))
        .isEqualTo(new InstrumentPast(List.of(first), BenchDay.AT.plusSeconds(5)));
  }

  @Test
  void keepsAVisitWithEverythingThatWasAddedToIt() {
    takeIn();
    perform(new RecordChecks(BenchDay.VISIT_ID, BenchDay.checks()));
    perform(new RecordReadings(BenchDay.VISIT_ID, BenchDay.readings()));
    perform(new RecordMoves(BenchDay.VISIT_ID, BenchDay.moves()));
    perform(new LogWork(BenchDay.VISIT_ID, BenchDay.work()));
    perform(new WriteNote(BenchDay.VISIT_ID, BenchDay.note()));
    perform(new ChooseAim(BenchDay.VISIT_ID, VisitAim.USUAL));
    perform(new ChooseAim(BenchDay.VISIT_ID, BenchDay.aim()));
    VisitRecord expected =
        new VisitRecord(
            BenchDay.visit(),
            BenchDay.instrument(),
            BenchDay.customer(),
            BenchDay.checks(),
            BenchDay.readings(),
            BenchDay.moves(),
            List.of(BenchDay.work()),
            List.of(BenchDay.note()),
            BenchDay.aim());
    assertThat(logbook.visits().byTicket(BenchDay.TICKET)).contains(expected);
    assertThat(logbook.visits().byId(BenchDay.VISIT_ID)).contains(expected);
    assertThat(logbook.visits().ofInstrument(BenchDay.INSTRUMENT_ID)).containsExactly(expected);
  }

  @Test
  void putsTheRoomAtASaddleInPlaceOfWhatWasKnownOfIt() {
    takeIn();
    Travel newer = new Travel(6, 2.5, 0.5);
    Travel added = new Travel(2, 4.0, null);
    perform(new RecordTravel(BenchDay.VISIT_ID, List.of(newer, added)));
    perform(new RecordTravel(BenchDay.VISIT_ID, List.of(new Travel(2, 4.25, 1.0))));
    assertThat(logbook.visits().byId(BenchDay.VISIT_ID).orElseThrow().visit().travel())
        .containsExactly(new Travel(1, 3.5, null), newer, new Travel(2, 4.25, 1.0));
  }

  @Test
  void keepsAVisitOfWhichHardlyAnythingIsKnown() {
    perform(new AddInstrument(BenchDay.shortFifth()));
    perform(new TakeIn(BenchDay.secondVisit()));
    VisitRecord record = logbook.visits().byId(BenchDay.SECOND_VISIT_ID).orElseThrow();
    assertThat(record.visit()).isEqualTo(BenchDay.secondVisit());
    assertThat(record.customer()).isNull();
  }

  @Test
  void countsOnFromTheHighestTicket() {
    assertThat(logbook.visits().nextTicket()).isEqualTo(1);
    takeIn();
    assertThat(logbook.visits().nextTicket()).isEqualTo(BenchDay.TICKET + 1);
  }

  @Test
  void takesAVisitOffTheBenchWhenItIsHandedOut() {
    takeIn();
    assertThat(logbook.visits().open())
        .singleElement()
        .satisfies(line -> assertThat(line.ticket()).isEqualTo(BenchDay.TICKET));
    perform(new HandOut(BenchDay.VISIT_ID, BenchDay.DAY));
    assertThat(logbook.visits().open()).isEmpty();
    assertThat(logbook.visits().byId(BenchDay.VISIT_ID).orElseThrow().visit().handedOut())
        .isEqualTo(BenchDay.DAY);
  }

  @Test
  void numbersActionsFromOneWithoutGaps() {
    assertThat(logbook.perform(new AddCustomer(BenchDay.customer()), "B. Rook").sequence())
        .isEqualTo(1);
    assertThat(logbook.perform(new AddInstrument(BenchDay.instrument()), "B. Rook").sequence())
        .isEqualTo(2);
  }

  private void takeIn() {
    perform(new AddCustomer(BenchDay.customer()));
    perform(new AddInstrument(BenchDay.instrument()));
    perform(new TakeIn(BenchDay.visit()));
  }
}
