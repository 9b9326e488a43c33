package sillet.acoustics.bench;

/**
 * What a method would do to one string.
 *
 * @param saddle metres, positive away from the neck
 * @param low lower end of the 95 % interval of the best saddle move; NaN where none is given
 * @param high upper end
 * @param nut metres, positive toward the bridge
 */
record Move(double saddle, double low, double high, double nut) {
  static Move plain(double saddle, double nut) {
    return new Move(saddle, Double.NaN, Double.NaN, nut);
  }

  boolean hasInterval() {
    return !Double.isNaN(low);
  }
}
