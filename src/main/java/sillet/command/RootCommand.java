package sillet.command;

import java.io.IOException;
import java.util.concurrent.Callable;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import sillet.logbook.text.Message;
import sillet.store.place.LogbookPlace;
import sillet.store.place.Surroundings;

/** The program without a command: the window, or where there is no display the demo job. */
@Command(name = "sillet", mixinStandardHelpOptions = true)
final class RootCommand implements Callable<Integer> {
  private final Terminal terminal;
  private final @Nullable Consumer<LogbookPlace> window;

  @Mixin private final LogbookOption option;

  RootCommand(Terminal terminal, Surroundings around, @Nullable Consumer<LogbookPlace> window) {
    this.terminal = terminal;
    this.window = window;
    this.option = new LogbookOption(around);
  }

  @Override
  public Integer call() throws IOException {
    LogbookPlace place = option.place();
    if (window != null) {
      window.accept(place);
      return ExitCodes.DONE;
    }
    terminal.say(Message.of("command.no-display"));
    int code = new DemoCommand(terminal).call();
    terminal.say(Message.of("command.open-window"));
    return code;
  }
}
