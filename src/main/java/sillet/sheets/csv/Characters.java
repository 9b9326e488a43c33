package sillet.sheets.csv;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.channels.ReadableByteChannel;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.util.Locale;

/** The characters of a file, one after the other, without replacing what is no character. */
final class Characters {
  /** After the last character. */
  static final int END = -1;

  /** The bytes that come next are no character; {@link #badBytes} shows them. */
  static final int BAD = -2;

  private static final int CHUNK = 1 << 16;

  private final ReadableByteChannel in;
  private final ByteBuffer bytes = ByteBuffer.allocate(CHUNK);
  private final CharBuffer chars = CharBuffer.allocate(CHUNK);
  private final CharsetDecoder decoder;
  private final boolean unmarkedUtf16;
  private boolean noMoreBytes;
  private boolean finished;
  private int badLength;

  Characters(ReadableByteChannel in) throws IOException {
    this.in = in;
    chars.flip();
    fill();
    Encoding encoding = Encoding.of(bytes);
    this.unmarkedUtf16 = encoding.markLength() == 0 && Encoding.unmarkedUtf16(bytes);
    bytes.position(encoding.markLength());
    this.decoder =
        encoding
            .charset()
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .onUnmappableCharacter(CodingErrorAction.REPORT);
  }

  boolean unmarkedUtf16() {
    return unmarkedUtf16;
  }

  int read() throws IOException {
    while (!chars.hasRemaining()) {
      if (badLength > 0) {
        return BAD;
      }
      if (finished) {
        return END;
      }
      decode();
    }
    return chars.get();
  }

  /** The bytes that are no character. */
  String badBytes() {
    StringBuilder shown = new StringBuilder();
    for (int i = 0; i < badLength; i++) {
      int one = bytes.get(bytes.position() + i) & 0xFF;
      shown.append(String.format(Locale.ROOT, i == 0 ? "%02X" : " %02X", one));
    }
    return shown.toString();
  }

  private void decode() throws IOException {
    chars.clear();
    CoderResult result = decoder.decode(bytes, chars, noMoreBytes);
    if (result.isError()) {
      badLength = result.length();
    } else if (result.isUnderflow()) {
      if (noMoreBytes) {
        finished = decoder.flush(chars).isUnderflow();
      } else {
        fill();
      }
    }
    chars.flip();
  }

  private void fill() throws IOException {
    if (bytes.position() > 0) {
      bytes.compact();
    }
    while (bytes.hasRemaining() && !noMoreBytes) {
      noMoreBytes = in.read(bytes) < 0;
    }
    bytes.flip();
  }
}
