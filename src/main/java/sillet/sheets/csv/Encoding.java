package sillet.sheets.csv;

import java.nio.ByteBuffer;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;

/**
 * What a file is written in: UTF-8 unless a byte order mark says otherwise.
 *
 * @param charset how bytes become characters
 * @param markLength bytes of the mark, to be left out
 */
record Encoding(Charset charset, int markLength) {
  /** A header is plain letters: in UTF-16 every second byte of it is zero. */
  private static final int LOOKED_AT = 256;

  static Encoding of(ByteBuffer head) {
    if (starts(head, 0xEF, 0xBB, 0xBF)) {
      return new Encoding(StandardCharsets.UTF_8, 3);
    }
    if (starts(head, 0xFE, 0xFF)) {
      return new Encoding(StandardCharsets.UTF_16BE, 2);
    }
    if (starts(head, 0xFF, 0xFE)) {
      return new Encoding(StandardCharsets.UTF_16LE, 2);
    }
    return new Encoding(StandardCharsets.UTF_8, 0);
  }

  /** Tells whether this can only be UTF-16 that says so nowhere. */
  static boolean unmarkedUtf16(ByteBuffer head) {
    int pairs = Math.min(head.remaining(), LOOKED_AT) / 2;
    int zeroFirst = 0;
    int zeroSecond = 0;
    for (int i = 0; i < pairs; i++) {
      zeroFirst += head.get(head.position() + 2 * i) == 0 ? 1 : 0;
      zeroSecond += head.get(head.position() + 2 * i + 1) == 0 ? 1 : 0;
    }
    int most = Math.max(zeroFirst, zeroSecond);
    int least = Math.min(zeroFirst, zeroSecond);
    return pairs > 0 && most * 2 > pairs && least * 20 < pairs;
  }

  private static boolean starts(ByteBuffer head, int... mark) {
    if (head.remaining() < mark.length) {
      return false;
    }
    for (int i = 0; i < mark.length; i++) {
      if ((head.get(head.position() + i) & 0xFF) != mark[i]) {
        return false;
      }
    }
    return true;
  }
}
