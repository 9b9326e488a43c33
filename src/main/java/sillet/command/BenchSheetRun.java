package sillet.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.text.Message;
import sillet.sheets.bench.BenchSheet;
import sillet.sheets.bench.SheetString;
import sillet.sheets.bench.SheetUse;
import sillet.sheets.csv.Remark;
import sillet.sheets.csv.Remarks;
import sillet.sheets.csv.WholeFile;
import sillet.sheets.moves.MovesSheet;

/** A bench sheet in, a row for every string out: to standard output or into a file. */
final class BenchSheetRun {
  private final Terminal terminal;
  private final CommandSpec spec;

  BenchSheetRun(Terminal terminal, CommandSpec spec) {
    this.terminal = terminal;
    this.spec = spec;
  }

  /**
   * Runs it.
   *
   * @param out null for standard output
   * @param reckon what to make of the strings of an instrument, in the same order
   */
  int run(
      Path file,
      SheetUse use,
      @Nullable Path out,
      Function<List<SheetString>, List<MoveAdvice>> reckon)
      throws IOException {
    try (BenchSheet sheet = BenchSheet.open(file, use)) {
      warn(sheet.warnings());
      if (out == null) {
        terminal.data(
            writer -> {
              MovesSheet moves = new MovesSheet(writer, terminal.texts());
              sheet.inOrder(reckon, moves::write);
            });
        return ExitCodes.DONE;
      }
      refuseInputAsOutput(file, out);
      WholeFile.write(
          out,
          bytes -> {
            var writer = Terminal.text(bytes);
            MovesSheet moves = new MovesSheet(writer, terminal.texts());
            sheet.inOrder(reckon, moves::write);
            writer.flush();
          });
    }
    return ExitCodes.DONE;
  }

  private void refuseInputAsOutput(Path file, Path target) throws IOException {
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
