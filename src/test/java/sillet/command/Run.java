package sillet.command;

import java.io.ByteArrayOutputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Map;
import sillet.store.place.Surroundings;

/**
 * One run of the program inside this one.
 *
 * @param code exit code
 * @param out standard output
 * @param err standard error
 */
record Run(int code, String out, String err) {

  static Run of(Object... args) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    return into(out, args).withOut(out.toString(StandardCharsets.UTF_8));
  }

  /** A run whose standard output goes somewhere else. */
  static Run into(OutputStream out, Object... args) {
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    String[] words = new String[args.length];
    for (int i = 0; i < args.length; i++) {
      words[i] = args[i].toString();
    }
    Terminal terminal = new Terminal(out, err, () -> false);
    Surroundings nowhere = new Surroundings("Linux", Path.of("/nowhere"), Map.of());
    int code = new SilletCommand(terminal, nowhere, null).run(words);
    return new Run(code, "", err.toString(StandardCharsets.UTF_8));
  }

  private Run withOut(String text) {
    return new Run(code, text, err);
  }
}
