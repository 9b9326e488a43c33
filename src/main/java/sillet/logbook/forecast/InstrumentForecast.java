package sillet.logbook.forecast;

import java.util.ArrayList;
import java.util.List;
import sillet.logbook.moves.FindingReport;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.text.Message;

/**
 * What a change will ask of an instrument.
 *
 * @param strings each string, string 1 first
 * @param pullNowN tensions of all strings together now, newtons; strings without a tension left out
 * @param pullThenN the same then
 * @param findings causes the readings so far speak for; empty without readings
 * @param redo what must be done or read again after the change, in the order it stands on the
 *     instrument from relief to intonation; empty where nothing changes
 * @param cautions where the change can hurt the instrument or somebody
 */
public record InstrumentForecast(
    List<StringForecast> strings,
    double pullNowN,
    double pullThenN,
    List<FindingReport> findings,
    List<Message> redo,
    List<Message> cautions) {

  /** Copies the lists. */
  public InstrumentForecast {
    strings = List.copyOf(strings);
    findings = List.copyOf(findings);
    redo = List.copyOf(redo);
    cautions = List.copyOf(cautions);
  }

  /**
   * The forecast as it stands in a sheet: an advice for each string, with what must be redone among
   * its sentences.
   *
   * @return string 1 first
   */
  public List<MoveAdvice> rows() {
    List<MoveAdvice> rows = new ArrayList<>();
    for (StringForecast one : strings) {
      List<Message> notes = new ArrayList<>(one.notes());
      notes.addAll(redo);
      List<FindingReport> found =
          findings.stream().filter(finding -> finding.concerns(one.then().number())).toList();
      rows.add(new MoveAdvice(one.now(), one.figures(), one.verdict(), one.neck(), found, notes));
    }
    return rows;
  }
}
