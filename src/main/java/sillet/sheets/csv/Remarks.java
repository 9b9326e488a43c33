package sillet.sheets.csv;

import java.util.ArrayList;
import java.util.List;
import sillet.logbook.text.Message;

/**
 * What is to be said of a file, in the order it was found. A sheet can be wrong in every line, so
 * only the first ones are kept and the others counted.
 */
public final class Remarks {
  /** So many are kept. */
  public static final int LISTED = 200;

  private final List<Remark> listed = new ArrayList<>();
  private long more;

  public void add(Place place, Message message) {
    add(new Remark(place, message));
  }

  public void add(Remark remark) {
    if (listed.size() < LISTED) {
      listed.add(remark);
    } else {
      more++;
    }
  }

  public boolean any() {
    return !listed.isEmpty();
  }

  /** The first remarks. */
  public List<Remark> listed() {
    return List.copyOf(listed);
  }

  /** How many came after those. */
  public long more() {
    return more;
  }
}
