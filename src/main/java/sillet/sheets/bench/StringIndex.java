package sillet.sheets.bench;

/**
 * Remembers for each string in which line it stands and how that line ranks among others of the
 * same string. Twenty bytes a string, so that a sheet of millions of rows can be checked.
 */
final class StringIndex {
  private long[] keys = new long[1 << 10];
  private long[] lines = new long[1 << 10];
  private int[] ranks = new int[1 << 10];
  private int size;

  /** The line a string stands in, or 0. */
  long line(long key) {
    return lines[slot(key)];
  }

  int rank(long key) {
    return ranks[slot(key)];
  }

  /** Remembers a line, in place of an earlier one of the same string. */
  void put(long key, long line, int rank) {
    int slot = slot(key);
    if (lines[slot] == 0) {
      if (2 * (size + 1) > keys.length) {
        grow();
        slot = slot(key);
      }
      size++;
    }
    keys[slot] = key;
    lines[slot] = line;
    ranks[slot] = rank;
  }

  private int slot(long key) {
    int mask = keys.length - 1;
    int slot = (int) key & mask;
    while (lines[slot] != 0 && keys[slot] != key) {
      slot = (slot + 1) & mask;
    }
    return slot;
  }

  private void grow() {
    long[] oldKeys = keys;
    long[] oldLines = lines;
    int[] oldRanks = ranks;
    keys = new long[2 * oldKeys.length];
    lines = new long[keys.length];
    ranks = new int[keys.length];
    for (int i = 0; i < oldKeys.length; i++) {
      if (oldLines[i] != 0) {
        int slot = slot(oldKeys[i]);
        keys[slot] = oldKeys[i];
        lines[slot] = oldLines[i];
        ranks[slot] = oldRanks[i];
      }
    }
  }
}
