package sillet.logbook.moves;

import java.util.ArrayList;
import java.util.List;
import sillet.logbook.text.Message;

/** The findings of an instrument for people, in the order in which to look. */
final class NeckReports {
  private NeckReports() {}

  static List<FindingReport> of(KnownNeck neck) {
    List<FindingReport> reports = new ArrayList<>();
    for (BenchHistory string : neck.strings()) {
      for (Disagreements.Odd odd : Disagreements.of(string.now())) {
        int number = string.now().string().number();
        Message again = Message.of("finding.reading.do");
        reports.add(
            new FindingReport(
                Finding.READING, number, odd.fret(), false, 0, odd.said(), again, null));
      }
    }
    return reports;
  }
}
