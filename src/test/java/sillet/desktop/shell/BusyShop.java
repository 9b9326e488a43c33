package sillet.desktop.shell;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.Construction;
import sillet.logbook.actions.Action;
import sillet.logbook.actions.AddCustomer;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.NameShop;
import sillet.logbook.actions.RecordMoves;
import sillet.logbook.actions.RecordReadings;
import sillet.logbook.actions.TakeIn;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.Neck;
import sillet.logbook.instruments.Saddle;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.shop.Customer;
import sillet.logbook.shop.Shop;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.units.Pitch;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.Arrival;
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.Reading;
import sillet.logbook.visits.StringsOn;
import sillet.logbook.visits.Visit;
import sillet.store.Logbook;

/** An invented shop with a full bench, long names and every state a visit can be in. */
final class BusyShop {
  private static final LocalDate TODAY = LocalDate.of(2025, 12, 1);
  private static final Instant NOW = Instant.parse("2025-12-01T10:00:00Z");
  private static final String TECHNICIAN = "Noor";

  private final Logbook logbook;

  private BusyShop(Logbook logbook) {
    this.logbook = logbook;
  }

  static void fill(Logbook logbook) {
    BusyShop shop = new BusyShop(logbook);
    shop.act(new NameShop(Shop.usual("Quay Street Strings", List.of(TECHNICIAN, "Edda", "Piet"))));
    shop.visit(2398, "Tamsin & Row/no. 7", "I. Varga", -3, "New bridge, find its place", "6 moved");
    shop.visit(2409, "Brackwell/Tern", "T. Fenk", 0, "Buzz on the low string", "4 near");
    shop.visit(2411, "Ottersby/Dunlin", "A. Lehtola", 0, "Winter setup", "6 near");
    shop.visit(2414, "Hale & Fitch/Plover", "R. Penhallow", 0, "Sharp up the neck", "6 two off");
    shop.visit(2412, "Marl Street/Wren", "S. Obi", 1, "Strings, intonation", "4");
    shop.visit(
        2415,
        "Ottersby and Daughters of the Lower Mill/Fieldfare Extra Long Scale Signature",
        "Josefina Marchetti-Oyelaran of the Low Tide Studio",
        1,
        "Goes to .011 strings, then please look at everything else that could be looked at",
        "6");
    shop.visit(
        2417, "Ottersby/Fieldfare", "M. Oduya", 3, "Sour past the seventh fret", "6 one near");
    shop.visit(2418, "Lindqvale/Twelve", "D. Achterberg", 3, "Octaves beat", "12");
    shop.visit(2420, "Brackwell/Heron", "", 3, "New set, check over", "5");
    shop.visit(2402, "Corriden/Parlour", "E. Sandoval", 4, "Saddle too high", "6 near");
    shop.visit(2404, "Ottersby/Sandpiper", "K. Brandt", 9, "Two tunings", "8 two off");
    shop.visit(2422, "Marl Street/Kite", "V. Ferreira", 12, "First check over", "6");
    shop.visit(2423, "Marl Street/Kite", "V. Ferreira", 99, "", "6");
  }

  private void act(Action action) {
    logbook.perform(action, TECHNICIAN);
  }

  private void visit(
      int ticket,
      String name,
      String customer,
      int inDays,
      String request,
      String stringsAndState) {
    String[] parts = stringsAndState.split(" ", 2);
    int strings = Integer.parseInt(parts[0]);
    String state = parts.length == 1 ? "" : parts[1];
    UUID owner = null;
    if (!customer.isEmpty()) {
      owner = UUID.randomUUID();
      act(new AddCustomer(new Customer(owner, customer, "555 0" + ticket, "", "")));
    }
    String[] makerModel = name.split("/", -1);
    Instrument instrument =
        new Instrument(
            UUID.randomUUID(),
            owner,
            InstrumentKind.ELECTRIC,
            makerModel[0],
            makerModel[1],
            "Q" + ticket,
            "",
            new Neck(strings, 648, 648, 22, 305.0, false),
            new Saddle(SaddleKind.SCREW, 0.5, ScrewSense.CLOCKWISE_AWAY, null));
    act(new AddInstrument(instrument));
    LocalDate promised = inDays == 99 ? null : TODAY.plusDays(inDays);
    Arrival arrival =
        new Arrival(TODAY.minusDays(5), TECHNICIAN, promised, request, "", null, null);
    UUID visit = UUID.randomUUID();
    StringsOn on = new StringsOn("Light", null, "usual", 440, fitted(strings));
    act(new TakeIn(new Visit(visit, ticket, instrument.id(), owner, arrival, on, List.of(), null)));
    read(visit, strings, state);
  }

  private void read(UUID visit, int strings, String state) {
    if (state.isEmpty()) {
      return;
    }
    List<Reading> readings = new ArrayList<>();
    for (int string = 1; string <= strings; string++) {
      boolean off =
          switch (state) {
            case "two off" -> string < 3;
            case "one near" -> string != 4;
            case "moved" -> true;
            default -> false;
          };
      Tries tries = Tries.parse(off ? "4.8" : "0.3");
      readings.add(new Reading(1, string, 12, tries, Reference.OPEN, 0.3, NOW));
    }
    act(new RecordReadings(visit, readings));
    if (state.equals("moved")) {
      List<MadeMove> moves = new ArrayList<>();
      for (int string = 1; string <= strings; string++) {
        moves.add(new MadeMove(1, string, 1.5, 3.0, null, NOW));
      }
      act(new RecordMoves(visit, moves));
    }
  }

  private static List<FittedString> fitted(int count) {
    List<FittedString> strings = new ArrayList<>();
    for (int string = 1; string <= count; string++) {
      strings.add(
          new FittedString(
              string,
              Pitch.parse("F#3", 440),
              648,
              StringMake.of(0.017, Construction.PLAIN_STEEL)));
    }
    return strings;
  }
}
