package sillet.command;

import java.io.IOException;
import java.io.Writer;
import java.util.List;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.StringPass;
import sillet.logbook.visits.VisitMoves;
import sillet.logbook.visits.VisitRecord;
import sillet.sheets.job.JobSheet;
import sillet.store.Logbook;

/**
 * A visit with everything that follows from its readings.
 *
 * @param record what the logbook holds of it
 * @param passes the visit reckoned through
 */
record Reckoned(VisitRecord record, List<List<StringPass>> passes) {

  static Reckoned of(VisitRecord record, Logbook logbook) {
    MoveAdvisor advisor = new MoveAdvisor(LogbookOption.breakingSharePercent(logbook));
    return new Reckoned(record, VisitMoves.of(record, advisor));
  }

  void jobSheet(Writer out, Texts texts) throws IOException {
    JobSheet.write(out, record, passes, texts);
  }
}
