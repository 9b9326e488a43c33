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
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.shop.Shop;
import sillet.sheets.bench.SheetString;
import sillet.sheets.bench.SheetUse;

/** From a bench sheet to the moves. */
@Command(name = "moves", mixinStandardHelpOptions = true)
@SuppressWarnings("NullAway.Init") // filled from the arguments before it is called
final class MovesCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;

  @Parameters(paramLabel = "FILE", descriptionKey = "usage.moves.file")
  private Path file;

  @Option(names = "--aim", paramLabel = "octave|neck", descriptionKey = "usage.moves.aim")
  private NamedAim aim = NamedAim.OCTAVE;

  @Option(names = "--out", paramLabel = "FILE", descriptionKey = "usage.moves.out")
  private @Nullable Path out;

  private final Terminal terminal;

  MovesCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() throws IOException {
    return new BenchSheetRun(terminal, spec).run(file, SheetUse.MOVES, out, this::moves);
  }

  private List<MoveAdvice> moves(List<SheetString> rows) {
    List<BenchString> strings = rows.stream().map(SheetString::string).toList();
    return new MoveAdvisor(Shop.USUAL_BREAKING_SHARE_PERCENT)
        .advise(strings, aim.choice())
        .strings();
  }
}
