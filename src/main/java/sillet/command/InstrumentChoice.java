package sillet.command;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
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
    Set<Instrument> exact = new LinkedHashSet<>(all);
    exact.removeIf(instrument -> !isNamed(instrument, asked));
    byTicket(asked).ifPresent(exact::add);
    if (exact.size() == 1 || all.size() == 1) {
      return exact.size() == 1 ? exact.iterator().next() : all.get(0);
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
      String serial = part("command.serial", one.serial());
      terminal.say(
          Message.of("command.instrument", one.name(), serial, part("command.tag", one.tag())));
    }
    terminal.more(count - instruments.size());
  }

  private String part(String key, String value) {
    return value.isEmpty() ? "" : terminal.texts().say(Message.of(key, value));
  }
}
