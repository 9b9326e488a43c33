package sillet.command;

import java.io.IOException;
import java.io.Writer;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import sillet.logbook.demo.DemoAction;
import sillet.logbook.demo.DemoShop;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.StringPass;
import sillet.sheets.moves.MovesSheet;
import sillet.store.Logbook;

/**
 * The main job once through, on an invented instrument. The logbook lives in memory only: nobody's
 * own is touched and nothing stays behind.
 */
@Command(name = "demo", mixinStandardHelpOptions = true)
final class DemoCommand implements Callable<Integer> {
  private final Terminal terminal;

  DemoCommand(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public Integer call() throws IOException {
    Reckoned open;
    Reckoned finished;
    try (Logbook logbook = Logbook.inMemory()) {
      for (DemoAction told : DemoShop.story(LocalDate.now(ZoneId.systemDefault()))) {
        logbook.perform(told.action(), told.technician());
      }
      open = visit(logbook, DemoShop.OPEN_TICKET);
      finished = visit(logbook, DemoShop.FINISHED_TICKET);
    }
    say("command.demo-moves", open);
    terminal.data(out -> moves(out, open, terminal.texts()));
    say("command.demo-sheet", finished);
    terminal.data(out -> finished.jobSheet(out.append('\n'), terminal.texts()));
    return ExitCodes.DONE;
  }

  private void say(String key, Reckoned visit) {
    String ticket = Integer.toString(visit.record().visit().ticket());
    terminal.say(Message.of(key, ticket, visit.record().instrument().name()));
  }

  private static Reckoned visit(Logbook logbook, int ticket) {
    return Reckoned.of(logbook.visits().byTicket(ticket).orElseThrow(), logbook);
  }

  private static void moves(Writer out, Reckoned visit, Texts texts) throws IOException {
    MovesSheet sheet = new MovesSheet(out, texts);
    for (StringPass string : visit.passes().get(visit.passes().size() - 1)) {
      MoveAdvice advice = string.advice();
      if (advice != null) {
        sheet.write(advice);
      }
    }
  }
}
