package sillet.command;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.logbook.visits.VisitRecord;
import sillet.store.Logbook;
import sillet.store.reading.Found;
import sillet.store.reading.InstrumentLine;

/**
 * Finds the one instrument that is meant: by its ticket, its whole tag or serial, else by any part
 * of what is known of it.
 */
final class InstrumentChoice {
  private final Logbook logbook;
  private final Terminal terminal;

  InstrumentChoice(Logbook logbook, Terminal terminal) {
    this.logbook = logbook;
    this.terminal = terminal;
  }

  /**
   * The instrument.
   *
   * @throws Rejection if there is none, or more than one; those are listed before
   */
  Instrument of(String asked) {
    Found<InstrumentLine> found = logbook.instruments().search(asked);
    List<Instrument> all = found.newest().stream().map(line -> line.instrument().what()).toList();
    List<Instrument> exact = all.stream().filter(i -> isNamed(i, asked)).toList();
    Optional<Instrument> byTicket = byTicket(asked);
    if (exact.isEmpty() && byTicket.isPresent()) {
      return byTicket.get();
    }
    if (exact.size() == 1 && byTicket.isEmpty()) {
      return exact.get(0);
    }
    if (all.size() == 1) {
      return all.get(0);
    }
    if (all.isEmpty()) {
      throw Rejection.of("command.no-instrument", asked);
    }
    list(all, found.count());
    throw Rejection.of("command.several-instruments", asked);
  }

  private static boolean isNamed(Instrument instrument, String asked) {
    return instrument.tag().equalsIgnoreCase(asked) || instrument.serial().equalsIgnoreCase(asked);
  }

  private Optional<Instrument> byTicket(String asked) {
    if (!asked.matches("\\d{1,9}")) {
      return Optional.empty();
    }
    return logbook.visits().byTicket(Integer.parseInt(asked)).map(VisitRecord::instrument);
  }

  private void list(List<Instrument> instruments, int count) {
    for (Instrument one : instruments) {
      terminal.say(Message.of("command.instrument", one.name(), one.serial(), one.tag()));
    }
    if (count > instruments.size()) {
      String more = String.format(Locale.ROOT, "%d", count - instruments.size());
      terminal.say(Message.of("command.more", more));
    }
  }
}
