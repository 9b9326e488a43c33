package sillet.acoustics.estimate;

/** What a string's situation is made from; each is what is expected plus unknowns. */
enum Quantity {
  SADDLE(0),
  NUT(1),
  CORE(2),
  MODULUS(3),
  BENDING(4),
  MASS(5),
  PRESS(6),
  AFTER_LENGTH(7),
  HELD(8),
  HELD_OPEN(9),
  ACTION(10),
  GAP(11),
  RELIEF(12);

  static final int COUNT = 13;

  private static final Quantity[] ALL = values();

  private final int place;

  Quantity(int place) {
    this.place = place;
  }

  /** Place among all quantities, 0 first. */
  int place() {
    return place;
  }

  static Quantity at(int place) {
    return ALL[place];
  }
}
