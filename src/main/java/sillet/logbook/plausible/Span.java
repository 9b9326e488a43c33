package sillet.logbook.plausible;

/**
 * From where to where a figure is usual.
 *
 * @param from lowest usual value
 * @param to highest usual value
 */
record Span(double from, double to) {

  boolean holds(double value) {
    return value >= from && value <= to;
  }
}
