package sillet.command;

import java.util.Locale;
import java.util.ResourceBundle;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import sillet.logbook.text.Texts;

/** The program as it is called from a shell: one command with others below it. */
@Command(name = "sillet", mixinStandardHelpOptions = true)
public final class SilletCommand {
  private SilletCommand() {}

  /**
   * Runs what the arguments ask for.
   *
   * @return the exit code
   */
  public static int run(Terminal terminal, String... args) {
    Texts texts = terminal.texts();
    CommandLine line = new CommandLine(new SilletCommand());
    describe(line, texts.say("usage.sillet"));
    add(line, new MovesCommand(terminal), texts.say("usage.moves"));
    line.getCommandSpec().version(texts.say("usage.version", version(texts)));
    line.setResourceBundle(ResourceBundle.getBundle("sillet.texts", Locale.ROOT));
    line.setCaseInsensitiveEnumValuesAllowed(true);
    Failures failures = new Failures(terminal);
    line.setParameterExceptionHandler(failures);
    line.setExecutionExceptionHandler(failures);
    line.setErr(terminal.err());
    line.setOut(terminal.help());
    return line.execute(args);
  }

  private static void add(CommandLine line, Object command, String description) {
    CommandLine below = new CommandLine(command);
    describe(below, description);
    line.addSubcommand(below);
  }

  private static void describe(CommandLine line, String description) {
    line.getCommandSpec().usageMessage().description(description);
  }

  /** The version stands in the jar; classes alone do not know theirs. */
  private static String version(Texts texts) {
    String version = SilletCommand.class.getPackage().getImplementationVersion();
    return version == null ? texts.say("usage.version-unknown") : version;
  }
}
