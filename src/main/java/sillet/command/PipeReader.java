package sillet.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;

/**
 * Whoever reads our standard output. Java reports a reader that has gone away as any other failed
 * write; only what standard output is tells the two apart.
 */
final class PipeReader {
  private static final Path STANDARD_OUTPUT = Path.of("/dev/stdout");
  private static final int KIND_OF_FILE = 0xF000;
  private static final int PIPE = 0x1000;
  private static final int SOCKET = 0xC000;

  private PipeReader() {}

  /** Windows cannot be asked what its output is, but its message names the pipe. */
  static boolean isNamedIn(IOException failed) {
    String message = failed.getMessage();
    return message != null && message.toLowerCase(Locale.ROOT).contains("pipe");
  }

  static boolean onStandardOutput() {
    return isPipe(STANDARD_OUTPUT);
  }

  static boolean isPipe(Path path) {
    try {
      int kind = (Integer) Files.getAttribute(path, "unix:mode") & KIND_OF_FILE;
      return kind == PIPE || kind == SOCKET;
    } catch (IOException | UnsupportedOperationException | IllegalArgumentException notToBeAsked) {
      return false;
    }
  }
}
