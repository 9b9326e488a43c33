package sillet.acoustics.bench;

/**
 * One row of the table.
 *
 * @param task what was to be done
 * @param way by which it was done, or what was to be found
 */
record Row(String task, String way) {}
