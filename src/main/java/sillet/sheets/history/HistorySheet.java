package sillet.sheets.history;

import java.io.IOException;
import java.io.Writer;
import java.util.List;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.strings.FittedString;
import sillet.logbook.visits.Arrival;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.MeasuredHeights;
import sillet.logbook.visits.Moment;
import sillet.logbook.visits.StringPass;
import sillet.logbook.visits.Visit;
import sillet.logbook.visits.VisitRecord;
import sillet.sheets.csv.CsvLine;
import sillet.sheets.csv.CsvOut;
import sillet.sheets.job.StringPasses;
import sillet.sheets.job.VisitCells;
import sillet.sheets.moves.AdviceCells;

/**
 * Writes what an instrument was like and what became of it, visit after visit. {@code
 * cents12_received} is the first reading of fret 12 in a visit, {@code cents12_left} the last one,
 * blank if the saddle was moved after it; {@code saddle_moved_mm} adds up all moves that were made.
 */
public final class HistorySheet {
  private static final List<String> COLUMNS =
      List.of(
          "ticket",
          "taken_in",
          "handed_out",
          "technician",
          "instrument",
          "serial",
          "tag",
          "set",
          "tuning",
          "string",
          "pitch",
          "gauge_in",
          "passes",
          "cents12_received",
          "cents12_left",
          "saddle_moved_mm",
          "action12_received_mm",
          "action12_left_mm",
          "relief_received_mm",
          "relief_left_mm",
          "humidity_pct",
          "temperature_c",
          "request");

  private final CsvOut out;

  /**
   * Begins a sheet with its header.
   *
   * @throws IOException if it cannot be written
   */
  public HistorySheet(Writer out) throws IOException {
    this.out = new CsvOut(out);
    this.out.header(COLUMNS);
  }

  /** Writes the rows of one visit. */
  public void write(VisitRecord record, List<List<StringPass>> passes) throws IOException {
    for (StringPasses string : StringPasses.of(passes)) {
      out.line(row(record, string));
    }
  }

  private static CsvLine row(VisitRecord record, StringPasses string) {
    CsvLine line = new CsvLine();
    visit(line, record.visit(), record.instrument());
    FittedString fitted = string.passes().get(0).string().string();
    int number = fitted.number();
    line.count(number).word(VisitCells.pitch(fitted)).word(VisitCells.gauge(fitted));
    line.count(string.passesRead())
        .figure(string.received(), AdviceCells.CENTS_DECIMALS)
        .figure(string.left(), AdviceCells.CENTS_DECIMALS)
        .figure(string.movedMm(), AdviceCells.MM_DECIMALS);
    List<BenchCheck> checks = record.checks();
    Arrival arrival = record.visit().arrival();
    return line.measure(MeasuredHeights.action12Mm(checks, number, Moment.RECEIVED))
        .measure(MeasuredHeights.action12Mm(checks, number, Moment.LEFT))
        .measure(MeasuredHeights.reliefMm(checks, number, Moment.RECEIVED))
        .measure(MeasuredHeights.reliefMm(checks, number, Moment.LEFT))
        .measure(arrival.humidityPct())
        .measure(arrival.temperatureC())
        .text(arrival.request());
  }

  private static void visit(CsvLine line, Visit visit, Instrument instrument) {
    line.count(visit.ticket())
        .word(VisitCells.day(visit.arrival().takenIn()))
        .word(VisitCells.day(visit.handedOut()))
        .text(visit.arrival().takenInBy())
        .text(VisitCells.instrument(instrument))
        .text(instrument.serial())
        .text(instrument.tag())
        .text(visit.strings().setName())
        .text(visit.strings().tuningName());
  }
}
