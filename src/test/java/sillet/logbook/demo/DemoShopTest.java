package sillet.logbook.demo;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.logbook.actions.Action;
import sillet.logbook.actions.AddCustomer;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.KeepStringSet;
import sillet.logbook.actions.NameShop;
import sillet.logbook.actions.RecordChecks;
import sillet.logbook.actions.RecordReadings;
import sillet.logbook.actions.TakeIn;
import sillet.logbook.forecast.Forecaster;
import sillet.logbook.forecast.InstrumentChange;
import sillet.logbook.forecast.InstrumentForecast;
import sillet.logbook.forecast.StringChange;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.moves.FindingReport;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.text.Message;
import sillet.logbook.units.Pitch;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.InstrumentPast;
import sillet.logbook.visits.Reading;
import sillet.logbook.visits.Visit;
import sillet.logbook.visits.VisitAim;
import sillet.logbook.visits.VisitMoves;
import sillet.logbook.visits.VisitPass;
import sillet.logbook.visits.VisitRecord;

class DemoShopTest {
  private static final LocalDate TODAY = LocalDate.of(2026, 1, 15);

  @Test
  void marksEveryNameAsDemo() {
    List<String> names = DemoShop.story(TODAY).stream().flatMap(d -> names(d).stream()).toList();
    assertThat(names).hasSizeGreaterThan(9).allMatch(name -> name.contains("(demo)"));
  }

  @Test
  void tellsTheSameStoryTwice() {
    assertThat(DemoShop.story(TODAY)).isEqualTo(DemoShop.story(TODAY));
  }

  @Test
  void theNeckShowsAHighSlotAndAMisplacedFretAndLaterOnlyTheFret() {
    VisitRecord first = record(DemoShop.NECK_TICKET);
    VisitRecord again = record(DemoShop.NECK_AGAIN_TICKET);
    MoveAdvisor advisor = new MoveAdvisor(75);
    VisitPass before = VisitMoves.passes(first, InstrumentPast.NONE, advisor).get(0);
    assertThat(before.findings())
        .extracting(FindingReport::word)
        .containsExactly("nut-high", "fret-9");
    assertThat(before.findings().get(0).string()).isEqualTo(5);
    InstrumentPast past = new InstrumentPast(List.of(first), null);
    VisitPass after = VisitMoves.passes(again, past, advisor).get(0);
    assertThat(after.findings()).extracting(FindingReport::word).containsExactly("fret-9");
  }

  @Test
  void theVisitOfTheForecastTellsWhatHeavierStringsAToneLowerAskFor() {
    InstrumentPast past = new InstrumentPast(List.of(record(DemoShop.NECK_TICKET)), null);
    StringChange heavier =
        new StringChange(6, Pitch.parse("D2", 440), .056, null, null, null, null);
    InstrumentForecast forecast =
        new Forecaster(75)
            .ofVisit(
                record(DemoShop.NECK_AGAIN_TICKET),
                past,
                new InstrumentChange(List.of(heavier), 0));
    assertThat(forecast.strings().get(5).figures()).isNotNull();
    assertThat(forecast.redo()).extracting(Message::key).contains("redo.slots-wider");
  }

  private static VisitRecord record(int ticket) {
    List<Action> actions = DemoShop.story(TODAY).stream().map(DemoAction::action).toList();
    Visit visit =
        actions.stream()
            .filter(TakeIn.class::isInstance)
            .map(action -> ((TakeIn) action).visit())
            .filter(one -> one.ticket() == ticket)
            .findFirst()
            .orElseThrow();
    Instrument instrument =
        actions.stream()
            .filter(AddInstrument.class::isInstance)
            .map(action -> ((AddInstrument) action).instrument())
            .filter(one -> one.id().equals(visit.instrumentId()))
            .findFirst()
            .orElseThrow();
    List<BenchCheck> checks = new ArrayList<>();
    List<Reading> readings = new ArrayList<>();
    for (Action action : actions) {
      if (action instanceof RecordChecks made && made.visitId().equals(visit.id())) {
        checks.addAll(made.checks());
      } else if (action instanceof RecordReadings read && read.visitId().equals(visit.id())) {
        readings.addAll(read.readings());
      }
    }
    return new VisitRecord(
        visit, instrument, null, checks, readings, List.of(), List.of(), List.of(), VisitAim.USUAL);
  }

  private static List<String> names(DemoAction told) {
    if (told.action() instanceof AddCustomer add) {
      return List.of(add.customer().name(), told.technician());
    } else if (told.action() instanceof AddInstrument add) {
      return List.of(add.instrument().name());
    } else if (told.action() instanceof KeepStringSet keep) {
      return List.of(keep.set().name());
    } else if (told.action() instanceof NameShop name) {
      return List.of(name.shop().name());
    }
    return List.of(told.technician());
  }
}
