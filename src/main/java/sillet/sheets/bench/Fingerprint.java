package sillet.sheets.bench;

/**
 * A text as 64 bits, so that millions of strings can be remembered in little room. Two different
 * texts of one sheet have the same fingerprint by chance once in ten million sheets of two million
 * rows; such a sheet would be refused for a string that does not stand there twice.
 */
final class Fingerprint {
  private static final long START = 0xcbf29ce484222325L;
  private static final long STEP = 0x100000001b3L;
  private static final char END = 0x1f;

  private Fingerprint() {}

  static long of(String... texts) {
    long hash = START;
    for (String text : texts) {
      for (int i = 0; i < text.length(); i++) {
        hash = (hash ^ text.charAt(i)) * STEP;
      }
      hash = (hash ^ END) * STEP;
    }
    return stirred(hash);
  }

  static long of(long instrument, int string) {
    return stirred(instrument + string * 0x9e3779b97f4a7c15L);
  }

  /** Spreads neighbouring values over all bits. */
  private static long stirred(long value) {
    long v = (value ^ (value >>> 30)) * 0xbf58476d1ce4e5b9L;
    v = (v ^ (v >>> 27)) * 0x94d049bb133111ebL;
    return v ^ (v >>> 31);
  }
}
