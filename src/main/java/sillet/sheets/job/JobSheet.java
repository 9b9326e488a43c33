package sillet.sheets.job;

import java.io.IOException;
import java.io.Writer;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import sillet.logbook.strings.ConstructionWords;
import sillet.logbook.strings.FittedString;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.Arrival;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.MeasuredHeights;
import sillet.logbook.visits.Moment;
import sillet.logbook.visits.StringPass;
import sillet.logbook.visits.VisitRecord;
import sillet.sheets.columns.JobColumns;
import sillet.sheets.csv.CsvLine;
import sillet.sheets.csv.CsvOut;

/**
 * Writes the job sheet of a visit. A string that was not worked on in a later pass has no row for
 * it; every string has a row for the first.
 */
public final class JobSheet {
  private final VisitRecord record;
  private final PassCells passCells;
  private final List<StringPasses> strings;
  private final List<Integer> frets;

  private JobSheet(VisitRecord record, List<List<StringPass>> passes, Texts texts) {
    this.record = record;
    this.passCells = new PassCells(record, texts);
    this.strings = StringPasses.of(passes);
    this.frets = frets(passes);
  }

  /**
   * Writes a job sheet with its header.
   *
   * @param passes the visit reckoned through
   * @throws IOException if it cannot be written
   */
  public static void write(
      Writer out, VisitRecord record, List<List<StringPass>> passes, Texts texts)
      throws IOException {
    new JobSheet(record, passes, texts).write(new CsvOut(out), passes.size());
  }

  private void write(CsvOut out, int passes) throws IOException {
    List<String> header = new ArrayList<>(JobColumns.ALL);
    frets.forEach(fret -> header.add("f" + fret));
    out.header(header);
    for (int pass = 0; pass < passes; pass++) {
      for (StringPasses string : strings) {
        if (pass == 0 || string.wasWorkedOn(pass)) {
          out.line(row(string, pass));
        }
      }
    }
  }

  private CsvLine row(StringPasses string, int pass) {
    StringPass one = string.passes().get(pass);
    CsvLine line = new CsvLine();
    visit(line);
    string(line, one.string().string());
    line.text(record.visit().strings().setName());
    passCells.write(line, string, pass);
    checks(line, one.string().string().number());
    line.text(passCells.note(one));
    passCells.frets(line, one, frets);
    return line;
  }

  private void visit(CsvLine line) {
    line.count(record.visit().ticket())
        .word(VisitCells.day(record.visit().arrival().takenIn()))
        .word(VisitCells.day(record.visit().handedOut()))
        .text(record.visit().arrival().takenInBy())
        .text(record.customer() == null ? "" : record.customer().name())
        .text(VisitCells.instrument(record.instrument()))
        .text(record.instrument().serial());
  }

  private static void string(CsvLine line, FittedString string) {
    line.count(string.number())
        .word(VisitCells.pitch(string))
        .measure(string.scaleMm())
        .word(VisitCells.gauge(string))
        .word(ConstructionWords.of(string.make().construction()));
  }

  private void checks(CsvLine line, int string) {
    List<BenchCheck> checks = record.checks();
    Arrival arrival = record.visit().arrival();
    line.measure(MeasuredHeights.action12Mm(checks, string, Moment.RECEIVED))
        .measure(MeasuredHeights.action12Mm(checks, string, Moment.LEFT))
        .measure(MeasuredHeights.reliefMm(checks, string, Moment.RECEIVED))
        .measure(MeasuredHeights.reliefMm(checks, string, Moment.LEFT))
        .measure(arrival.humidityPct())
        .measure(arrival.temperatureC());
  }

  /** Every fret that was read, the open string among them where it was not taken as tuned. */
  private static List<Integer> frets(List<List<StringPass>> passes) {
    TreeSet<Integer> frets = new TreeSet<>();
    passes.stream()
        .flatMap(List::stream)
        .map(pass -> pass.string().readings())
        .forEach(
            readings -> {
              frets.addAll(readings.frets().keySet());
              if (readings.open() != null) {
                frets.add(0);
              }
            });
    return List.copyOf(frets);
  }
}
