package sillet.command;

import java.util.Locale;
import java.util.ResourceBundle;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine;
import sillet.logbook.text.Texts;
import sillet.store.place.LogbookPlace;
import sillet.store.place.Surroundings;

/** The program as it is called from a shell: from arguments to an exit code. */
public final class SilletCommand {
  private final Terminal terminal;
  private final Surroundings around;
  private final @Nullable Consumer<LogbookPlace> window;

  /**
   * The program at one terminal.
   *
   * @param around where it runs
   * @param window opens the window on a logbook and returns when it is closed; null where there is
   *     no display
   */
  public SilletCommand(
      Terminal terminal, Surroundings around, @Nullable Consumer<LogbookPlace> window) {
    this.terminal = terminal;
    this.around = around;
    this.window = window;
  }

  /**
   * Runs what the arguments ask for.
   *
   * @return the exit code
   */
  public int run(String... args) {
    Texts texts = terminal.texts();
    CommandLine line =
        described(new RootCommand(terminal, around, window), texts.say("usage.sillet"))
            .addSubcommand(described(new MovesCommand(terminal), texts.say("usage.moves")))
            .addSubcommand(described(new ForecastCommand(terminal), texts.say("usage.forecast")))
            .addSubcommand(described(new SheetCommand(terminal, around), texts.say("usage.sheet")))
            .addSubcommand(
                described(new HistoryCommand(terminal, around), texts.say("usage.history")))
            .addSubcommand(described(new DemoCommand(terminal), texts.say("usage.demo")));
    String version = texts.say("usage.version", version(texts));
    line.getCommandSpec().version(version);
    line.getSubcommands().values().forEach(below -> below.getCommandSpec().version(version));
    line.setResourceBundle(ResourceBundle.getBundle("sillet.texts", Locale.ROOT));
    line.setCaseInsensitiveEnumValuesAllowed(true);
    // a name may begin with @; it is no file of arguments
    line.setExpandAtFiles(false);
    Failures failures = new Failures(terminal);
    line.setParameterExceptionHandler(failures);
    line.setExecutionExceptionHandler(failures);
    line.setErr(terminal.err());
    line.setOut(terminal.help());
    return line.execute(args);
  }

  private static CommandLine described(Object command, String description) {
    CommandLine line = new CommandLine(command);
    line.getCommandSpec().usageMessage().description(description);
    return line;
  }

  /** The version stands in the jar; classes alone do not know theirs. */
  private static String version(Texts texts) {
    String version = SilletCommand.class.getPackage().getImplementationVersion();
    return version == null ? texts.say("usage.version-unknown") : version;
  }
}
