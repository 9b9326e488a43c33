package sillet.command;

import java.io.IOException;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;
import sillet.logbook.instruments.Instrument;
import sillet.sheets.history.HistorySheet;
import sillet.store.Logbook;
import sillet.store.place.Surroundings;

/** What an instrument was like, visit after visit. */
@Command(name = "history", mixinStandardHelpOptions = true)
final class HistoryCommand implements Callable<Integer> {
  private final Terminal terminal;

  @Mixin private final LogbookOption option;

  @Parameters(
      arity = "1..*",
      paramLabel = "INSTRUMENT",
      descriptionKey = "usage.history.instrument")
  private List<String> words = List.of();

  HistoryCommand(Terminal terminal, Surroundings around) {
    this.terminal = terminal;
    this.option = new LogbookOption(around);
  }

  @Override
  public Integer call() throws IOException {
    List<Reckoned> visits;
    try (Logbook logbook = option.open()) {
      String asked = String.join(" ", words).strip();
      Instrument instrument = new InstrumentChoice(logbook, terminal).of(asked);
      visits =
          logbook.visits().ofInstrument(instrument.id()).stream()
              .map(record -> Reckoned.of(record, logbook))
              .toList();
    }
    terminal.data(
        out -> {
          HistorySheet sheet = new HistorySheet(out);
          for (Reckoned visit : visits) {
            sheet.write(visit.record(), visit.passes());
          }
        });
    return ExitCodes.DONE;
  }
}
