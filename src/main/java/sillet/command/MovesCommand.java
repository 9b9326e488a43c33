package sillet.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.shop.Shop;
import sillet.logbook.text.Message;
import sillet.sheets.bench.BenchSheet;
import sillet.sheets.bench.SheetString;
import sillet.sheets.bench.SheetUse;
import sillet.sheets.csv.Remark;
import sillet.sheets.csv.Remarks;
import sillet.sheets.csv.WholeFile;
import sillet.sheets.moves.MovesSheet;

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
    try (BenchSheet sheet = BenchSheet.open(file, SheetUse.MOVES)) {
      warn(sheet.warnings());
      Path target = out;
      if (target == null) {
        terminal.data(writer -> moves(sheet, new MovesSheet(writer, terminal.texts())));
        return ExitCodes.DONE;
      }
      refuseInputAsOutput(target);
      WholeFile.write(
          target,
          bytes -> {
            var writer = Terminal.text(bytes);
            moves(sheet, new MovesSheet(writer, terminal.texts()));
            writer.flush();
          });
    }
    return ExitCodes.DONE;
  }

  private void moves(BenchSheet sheet, MovesSheet moves) throws IOException {
    MoveAdvisor advisor = new MoveAdvisor(Shop.USUAL_BREAKING_SHARE_PERCENT);
    sheet.inOrder(
        rows -> {
          List<BenchString> strings = rows.stream().map(SheetString::string).toList();
          return advisor.advise(strings, aim.choice()).strings();
        },
        moves::write);
  }

  private void refuseInputAsOutput(Path target) throws IOException {
    if (Files.exists(target) && Files.isSameFile(file, target)) {
      throw new ParameterException(
          spec.commandLine(), terminal.texts().say("command.out-is-input", target.toString()));
    }
  }

  private void warn(Remarks warnings) {
    for (Remark warning : warnings.listed()) {
      String said = warning.said(terminal.texts());
      terminal.say(Message.of("command.unusual", said));
    }
    terminal.more(warnings.more());
  }
}
