package sillet.sheets.bench;

import org.jspecify.annotations.Nullable;
import sillet.logbook.forecast.StringChange;
import sillet.logbook.moves.BenchString;
import sillet.logbook.text.Message;
import sillet.logbook.text.Quoted;
import sillet.sheets.csv.CsvRow;
import sillet.sheets.csv.Remarks;

/**
 * One row of a bench sheet.
 *
 * @param line where it begins
 * @param instrument stands for its instrument, see {@link Fingerprint}
 * @param rank which of several rows of the same string counts: the highest
 * @param said what the row says
 */
record BenchRow(long line, long instrument, int rank, SheetString said) {
  private static final int LAST_PASS = 9999;
  private static final int BENCH_SHEET = 1;

  /** Reads a row; null if anything in it was refused. */
  static @Nullable BenchRow read(CsvRow row, Header header, Remarks refusals, Remarks warnings) {
    Cells cells = new Cells(row, header, refusals, warnings);
    cells.refuseUnnamed();
    String instrument = cells.filled(Columns.INSTRUMENT);
    var fitted = StringCells.read(cells);
    var heights = BenchCells.heights(cells);
    var room = BenchCells.room(cells);
    var readings = NoteCells.read(cells);
    StringChange change =
        header.use() == SheetUse.FORECAST ? ChangeCells.read(cells, fitted) : null;
    int pass = header.isJobSheet() ? pass(cells) : BENCH_SHEET;
    if (cells.refused() || instrument == null || fitted == null) {
      return null;
    }
    BenchString string = new BenchString(instrument, fitted, heights, room, readings);
    int rank = header.isJobSheet() && readings.frets().isEmpty() ? 0 : pass;
    StringChange becomes = change == null ? StringChange.none(fitted.number()) : change;
    return new BenchRow(cells.line(), instrument(cells), rank, new SheetString(string, becomes));
  }

  BenchString string() {
    return said.string();
  }

  boolean isRead() {
    return !string().readings().frets().isEmpty();
  }

  /** Stands for the string on its instrument. */
  long stringOnInstrument() {
    return Fingerprint.of(instrument, string().string().number());
  }

  /** In a job sheet the same instrument can come back with another ticket. */
  private static long instrument(Cells cells) {
    return Fingerprint.of(
        cells.text(Columns.INSTRUMENT), cells.text(Columns.SERIAL), cells.text(Columns.TICKET));
  }

  private static int pass(Cells cells) {
    String text = cells.text(Columns.PASS);
    Double pass = cells.number(Columns.PASS);
    if (pass == null) {
      return 1;
    }
    if (pass < 1 || pass > LAST_PASS || pass != Math.rint(pass)) {
      cells.refuse(Columns.PASS, Message.of("bench.pass-number", Quoted.of(text)));
      return 1;
    }
    return pass.intValue();
  }
}
