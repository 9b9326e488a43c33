package sillet;

import sillet.command.SilletCommand;
import sillet.command.Terminal;

/** Entry of the program. */
public final class Main {
  private Main() {}

  public static void main(String[] args) {
    System.exit(SilletCommand.run(Terminal.standard(), args));
  }
}
