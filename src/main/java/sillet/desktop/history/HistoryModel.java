package sillet.desktop.history;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleObjectProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import sillet.logbook.text.Message;
import sillet.logbook.visits.NoteKind;
import sillet.logbook.visits.VisitNote;
import sillet.logbook.visits.VisitRecord;
import sillet.store.reading.InstrumentLine;

/** An instrument, its visits, the newest first, and the one that is looked at. */
final class HistoryModel {
  /**
   * What was offered and not wanted.
   *
   * @param day of the visit
   * @param text what was declined
   */
  record Declined(LocalDate day, String text) {}

  private final ReadOnlyObjectWrapper<Optional<InstrumentLine>> instrument =
      new ReadOnlyObjectWrapper<>(this, "instrument", Optional.empty());
  private final ObservableList<VisitRecord> visits = FXCollections.observableArrayList();
  private final ObjectProperty<Optional<VisitRecord>> chosen =
      new SimpleObjectProperty<>(this, "chosen", Optional.empty());
  private final ObjectProperty<Optional<Message>> trouble =
      new SimpleObjectProperty<>(this, "trouble", Optional.empty());

  ReadOnlyObjectProperty<Optional<InstrumentLine>> instrumentProperty() {
    return instrument.getReadOnlyProperty();
  }

  ObservableList<VisitRecord> visits() {
    return visits;
  }

  ObjectProperty<Optional<VisitRecord>> chosenProperty() {
    return chosen;
  }

  /** Why nothing can be shown. */
  ObjectProperty<Optional<Message>> troubleProperty() {
    return trouble;
  }

  /** Takes what was fetched; keeps the chosen visit where it still is, else chooses the newest. */
  void show(Optional<InstrumentLine> line, List<VisitRecord> records) {
    if (line.isEmpty()) {
      trouble.set(Optional.of(Message.of("history.gone")));
      return;
    }
    trouble.set(Optional.empty());
    Optional<Integer> before = chosen.get().map(visit -> visit.visit().ticket());
    instrument.set(line);
    visits.setAll(records);
    Optional<VisitRecord> again =
        before.flatMap(
            ticket ->
                records.stream().filter(visit -> visit.visit().ticket() == ticket).findFirst());
    chosen.set(again.or(() -> records.stream().findFirst()));
  }

  /** What was declined in any visit, the newest first. */
  List<Declined> declined() {
    List<Declined> all = new ArrayList<>();
    for (VisitRecord visit : visits) {
      for (VisitNote note : visit.notes()) {
        if (note.kind() == NoteKind.DECLINED) {
          all.add(new Declined(visit.visit().arrival().takenIn(), note.text()));
        }
      }
    }
    return all;
  }

  /** The visits in the order they happened, for a drawing along the years. */
  List<VisitRecord> oldestFirst() {
    List<VisitRecord> all = new ArrayList<>(visits);
    Collections.reverse(all);
    return all;
  }
}
