package sillet.sheets.csv;

import java.util.List;
import sillet.logbook.text.Message;

/** A sheet cannot be taken; carries everything that is wrong with it at once. */
public final class SheetRefused extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient List<Remark> reasons;
  private final long more;

  public SheetRefused(Remarks remarks) {
    super(remarks.listed().toString());
    this.reasons = remarks.listed();
    this.more = remarks.more();
  }

  /** Refuses a file as a whole. */
  public static SheetRefused file(String key, String... values) {
    Remarks remarks = new Remarks();
    remarks.add(Place.file(), Message.of(key, values));
    return new SheetRefused(remarks);
  }

  public List<Remark> reasons() {
    return reasons;
  }

  /** How many reasons there are beyond those listed. */
  public long more() {
    return more;
  }
}
