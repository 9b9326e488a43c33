package sillet.command;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import sillet.logbook.forecast.Forecaster;
import sillet.logbook.forecast.InstrumentChange;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.BenchHistory;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.shop.Shop;
import sillet.sheets.bench.SheetString;
import sillet.sheets.bench.SheetUse;

/** From a bench sheet to what other strings, another tuning or another action will ask for. */
@Command(name = "forecast", mixinStandardHelpOptions = true)
@SuppressWarnings("NullAway.Init") // filled from the arguments before it is called
final class ForecastCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;

  @Parameters(paramLabel = "FILE", descriptionKey = "usage.forecast.file")
  private Path file;

  @Option(names = "--out", paramLabel = "FILE", descriptionKey = "usage.forecast.out")
  private @Nullable Path out;

  private final Terminal terminal;

  ForecastCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() throws IOException {
    return new BenchSheetRun(terminal, spec).run(file, SheetUse.FORECAST, out, this::forecast);
  }

  private List<MoveAdvice> forecast(List<SheetString> rows) {
    List<BenchHistory> strings = rows.stream().map(row -> BenchHistory.of(row.string())).toList();
    InstrumentChange change =
        new InstrumentChange(rows.stream().map(SheetString::change).toList(), 0);
    return new Forecaster(Shop.USUAL_BREAKING_SHARE_PERCENT)
        .forecast(strings, change, AimChoice.OCTAVE)
        .rows();
  }
}
