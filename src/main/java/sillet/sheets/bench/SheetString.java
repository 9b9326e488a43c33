package sillet.sheets.bench;

import sillet.logbook.forecast.StringChange;
import sillet.logbook.moves.BenchString;

/**
 * What a row says of its string.
 *
 * @param string as it is
 * @param change what it will be; none unless the sheet is read for a forecast
 */
public record SheetString(BenchString string, StringChange change) {}
