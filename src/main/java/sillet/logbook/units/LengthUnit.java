package sillet.logbook.units;

/** The units a shop holds in its hand. */
public enum LengthUnit {
  /** Millimetres. */
  MM("mm"),
  /** Inches with decimals. */
  INCH("inch"),
  /** Sixty-fourths of an inch. */
  SIXTY_FOURTHS("64ths"),
  /** Thousandths of an inch. */
  THOUSANDTHS("thousandths");

  /** Millimetres in an inch, exactly. */
  public static final double MM_PER_INCH = 25.4;

  private final String word;

  LengthUnit(String word) {
    this.word = word;
  }

  /**
   * The word it is stored under.
   *
   * @return stable word
   */
  public String word() {
    return word;
  }

  /**
   * How long one of it is.
   *
   * @return millimetres
   */
  public double mm() {
    return switch (this) {
      case MM -> 1;
      case INCH -> MM_PER_INCH;
      case SIXTY_FOURTHS -> MM_PER_INCH / 64;
      case THOUSANDTHS -> MM_PER_INCH / 1000;
    };
  }
}
