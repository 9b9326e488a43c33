package sillet.store.reading;

import java.util.List;

/**
 * What a search found.
 *
 * @param newest the newest of them, not more than {@link #MOST}
 * @param count how many there are in all
 * @param <T> what was looked for
 */
public record Found<T>(List<T> newest, int count) {
  /** More than this nobody reads in a list. */
  public static final int MOST = 50;

  /** Copies the list. */
  public Found {
    newest = List.copyOf(newest);
  }
}
