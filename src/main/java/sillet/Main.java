package sillet;

import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import sillet.command.SilletCommand;
import sillet.command.Terminal;
import sillet.desktop.shell.SilletWindow;
import sillet.store.place.LogbookPlace;
import sillet.store.place.Surroundings;

/** Entry of the program: a command, or the window when there is none. */
public final class Main {
  private Main() {}

  public static void main(String[] args) {
    Surroundings around = Surroundings.ofThisProcess();
    System.exit(new SilletCommand(Terminal.standard(), around, window(around)).run(args));
  }

  private static @Nullable Consumer<LogbookPlace> window(Surroundings around) {
    boolean headless = Boolean.getBoolean("java.awt.headless");
    return Display.isThere(around.system(), headless, around.environment())
        ? SilletWindow::open
        : null;
  }
}
