package sillet.sheets.bench;

/** What a bench sheet is read for. */
public enum SheetUse {
  /** Moves from readings: every instrument needs one. */
  MOVES,
  /** A forecast: readings help and are not needed, and what the strings will be is read too. */
  FORECAST
}
