package sillet.command;

import java.io.FilterOutputStream;
import java.io.IOException;
import java.io.OutputStream;

/** Standard output; its failures can be told from those of a file. */
final class DataStream extends FilterOutputStream {
  DataStream(OutputStream out) {
    super(out);
  }

  /** Standard output takes no more. */
  static final class Closed extends IOException {
    private static final long serialVersionUID = 1L;

    Closed(IOException cause) {
      super(cause.getMessage(), cause);
    }
  }

  @Override
  public void write(byte[] bytes, int from, int length) throws IOException {
    try {
      out.write(bytes, from, length);
    } catch (IOException failed) {
      throw new Closed(failed);
    }
  }

  @Override
  public void write(int one) throws IOException {
    write(new byte[] {(byte) one}, 0, 1);
  }

  @Override
  public void flush() throws IOException {
    try {
      out.flush();
    } catch (IOException failed) {
      throw new Closed(failed);
    }
  }
}
