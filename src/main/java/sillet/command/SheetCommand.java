package sillet.command;

import java.io.IOException;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;
import sillet.logbook.text.Rejection;
import sillet.logbook.visits.VisitRecord;
import sillet.store.Logbook;
import sillet.store.place.Surroundings;

/** The job sheet of one visit. */
@Command(name = "sheet", mixinStandardHelpOptions = true)
final class SheetCommand implements Callable<Integer> {
  private final Terminal terminal;

  @Mixin private final LogbookOption option;

  @Parameters(paramLabel = "TICKET", descriptionKey = "usage.sheet.ticket")
  private int ticket;

  SheetCommand(Terminal terminal, Surroundings around) {
    this.terminal = terminal;
    this.option = new LogbookOption(around);
  }

  @Override
  public Integer call() throws IOException {
    Reckoned visit;
    try (Logbook logbook = option.open()) {
      VisitRecord record =
          logbook
              .visits()
              .byTicket(ticket)
              .orElseThrow(() -> Rejection.of("command.no-ticket", Integer.toString(ticket)));
      visit = Reckoned.of(record, logbook);
    }
    terminal.data(out -> visit.jobSheet(out, terminal.texts()));
    return ExitCodes.DONE;
  }
}
