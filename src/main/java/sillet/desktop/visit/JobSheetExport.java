package sillet.desktop.visit;

import java.io.IOException;
import java.io.OutputStreamWriter;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.function.Consumer;
import java.util.function.Supplier;
import sillet.desktop.controls.Desk;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.logbook.visits.VisitMoves;
import sillet.logbook.visits.VisitRecord;
import sillet.sheets.csv.WholeFile;
import sillet.sheets.job.JobSheet;

/** Writes the job sheet into a file the technician picks; it holds what the logbook holds. */
final class JobSheetExport {
  private final Desk desk;
  private final MoveAdvisor advisor;
  private final Supplier<VisitRecord> read;

  /**
   * An export.
   *
   * @param desk asks for the file, works in the background
   * @param advisor with the shop's limits
   * @param read reads the visit; called off the window's thread
   */
  JobSheetExport(Desk desk, MoveAdvisor advisor, Supplier<VisitRecord> read) {
    this.desk = desk;
    this.advisor = advisor;
    this.read = read;
  }

  /**
   * Asks where to and writes.
   *
   * @param ticket of the visit, for the name that is suggested
   * @param said takes what is to be said when it is done
   */
  void write(int ticket, Consumer<Message> said) {
    String name = "job-" + ticket + ".csv";
    desk.ask()
        .fileToSave(name)
        .ifPresent(
            file ->
                desk.background()
                    .run(
                        () -> write(file),
                        done -> said.accept(Message.of("visit.job-sheet.written", done.toString())),
                        desk.ask()::problem));
  }

  private Path write(Path file) {
    VisitRecord record = read.get();
    try {
      WholeFile.write(
          file,
          out -> {
            Writer writer = new OutputStreamWriter(out, StandardCharsets.UTF_8);
            JobSheet.write(writer, record, VisitMoves.of(record, advisor), desk.texts());
            writer.flush();
          });
    } catch (IOException notWritten) {
      throw Rejection.of(
          "visit.job-sheet.not-written", file.toString(), String.valueOf(notWritten.getMessage()));
    }
    return file;
  }
}
