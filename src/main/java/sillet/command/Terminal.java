package sillet.command;

import java.io.BufferedWriter;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.function.BooleanSupplier;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;

/**
 * Where a command speaks: data on one stream, words on the other. Both are UTF-8, whatever the
 * machine is set to.
 */
public final class Terminal {
  private final OutputStream out;
  private final PrintWriter err;
  private final BooleanSupplier outIsPipe;
  private final Texts texts = Texts.english();

  /**
   * A terminal.
   *
   * @param outIsPipe tells whether somebody reads the data who may leave before its end
   */
  public Terminal(OutputStream out, OutputStream err, BooleanSupplier outIsPipe) {
    this.out = out;
    this.outIsPipe = outIsPipe;
    this.err = new PrintWriter(new OutputStreamWriter(err, StandardCharsets.UTF_8), true);
  }

  /** The terminal the program was started from. */
  public static Terminal standard() {
    return new Terminal(
        new FileOutputStream(FileDescriptor.out),
        new FileOutputStream(FileDescriptor.err),
        PipeReader::onStandardOutput);
  }

  /** Whether a write failed only because nobody reads any more, as after {@code | head}. */
  boolean readerIsGone(DataStream.Closed failed) {
    return PipeReader.isNamedIn(failed) || outIsPipe.getAsBoolean();
  }

  Texts texts() {
    return texts;
  }

  PrintWriter err() {
    return err;
  }

  /** Where help goes when it was asked for. */
  PrintWriter help() {
    return new PrintWriter(new OutputStreamWriter(out, StandardCharsets.UTF_8), true);
  }

  /** Says a sentence beside the data. */
  void say(Message message) {
    err.println(texts.say(message));
  }

  /** Says how many there are beyond those that were listed, if any. */
  void more(long count) {
    if (count > 0) {
      say(Message.of("command.more", String.format(Locale.ROOT, "%d", count)));
    }
  }

  /** Writes data. */
  void data(DataWriter data) throws IOException {
    Writer writer = text(new DataStream(out));
    data.writeTo(writer);
    writer.flush();
  }

  static Writer text(OutputStream bytes) {
    return new BufferedWriter(new OutputStreamWriter(bytes, StandardCharsets.UTF_8), 1 << 16);
  }
}
