package sillet.desktop.visit.log;

import java.time.Clock;
import java.time.Instant;
import java.time.LocalDate;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.UUID;
import sillet.logbook.actions.LogWork;
import sillet.logbook.actions.WriteNote;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.NoteKind;
import sillet.logbook.visits.VisitNote;
import sillet.logbook.visits.VisitRecord;
import sillet.logbook.visits.WorkLine;

/** What is written on a visit: work that was done, notes, advice, what was declined. */
public final class LogModel {
  private static final DateTimeFormatter TIME =
      DateTimeFormatter.ofPattern("HH:mm", Locale.ENGLISH);
  private static final DateTimeFormatter DAY = DateTimeFormatter.ofPattern("d MMM", Locale.ENGLISH);

  private final Texts texts;
  private final Clock clock;
  private VisitRecord record;
  private NoteKind kind = NoteKind.NOTE;

  public LogModel(VisitRecord record, Texts texts, Clock clock) {
    this.record = record;
    this.texts = texts;
    this.clock = clock;
  }

  /** Takes what the logbook now holds. */
  public void take(VisitRecord now) {
    record = now;
  }

  /** What was done, first first. */
  public List<WrittenLine> work() {
    return record.work().stream()
        .map(line -> new WrittenLine(time(line.at()), "", line.text()))
        .toList();
  }

  /** What was written, first first. */
  public List<WrittenLine> notes() {
    return record.notes().stream()
        .map(note -> new WrittenLine(time(note.at()), texts.say(note.kind().key()), note.text()))
        .toList();
  }

  /** The time of today, the day of any other day. */
  private String time(Instant at) {
    var local = at.atZone(clock.getZone());
    boolean today = local.toLocalDate().equals(LocalDate.now(clock));
    return (today ? TIME : DAY).format(local);
  }

  /** What the next note is for. */
  public NoteKind kind() {
    return kind;
  }

  public void kind(NoteKind chosen) {
    kind = chosen;
  }

  /** The action that writes down work; empty if nothing was typed. */
  public Optional<LogWork> logWork(String typed, String technician) {
    return text(typed)
        .map(text -> new LogWork(visitId(), new WorkLine(clock.instant(), technician, text)));
  }

  /** The action that writes a note; empty if nothing was typed. */
  public Optional<WriteNote> writeNote(String typed) {
    return text(typed)
        .map(text -> new WriteNote(visitId(), new VisitNote(clock.instant(), kind, text)));
  }

  private static Optional<String> text(String typed) {
    return typed.isBlank() ? Optional.empty() : Optional.of(typed.strip());
  }

  private UUID visitId() {
    return record.visit().id();
  }
}
