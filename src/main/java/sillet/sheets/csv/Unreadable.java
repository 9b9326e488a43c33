package sillet.sheets.csv;

/** From here on the file cannot be read: it is no text, or its quotation marks make no sense. */
public final class Unreadable extends Exception {
  private static final long serialVersionUID = 1L;

  private final transient Remark reason;

  Unreadable(Remark reason) {
    super(reason.toString());
    this.reason = reason;
  }

  public Remark reason() {
    return reason;
  }
}
