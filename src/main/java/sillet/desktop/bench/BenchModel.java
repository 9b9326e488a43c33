package sillet.desktop.bench;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Message;
import sillet.logbook.visits.VisitRecord;

/** The open visits in the order they were promised; those without a day come last. */
final class BenchModel {
  private static final Comparator<VisitRecord> BY_PROMISE =
      Comparator.<VisitRecord, @Nullable LocalDate>comparing(
              BenchModel::promised, Comparator.nullsLast(Comparator.naturalOrder()))
          .thenComparing(record -> record.visit().ticket());

  private final ObservableList<BenchRow> rows = FXCollections.observableArrayList();
  private final ObjectProperty<Optional<Message>> trouble =
      new SimpleObjectProperty<>(this, "trouble", Optional.empty());
  private boolean loaded;

  ObservableList<BenchRow> rows() {
    return rows;
  }

  /** Why the visits could not be fetched. */
  ObjectProperty<Optional<Message>> troubleProperty() {
    return trouble;
  }

  /** Whether it is known that there is no open visit. */
  boolean empty() {
    return loaded && rows.isEmpty();
  }

  /** Takes the visits as fetched. */
  void show(List<VisitRecord> visits, LocalDate today) {
    List<VisitRecord> sorted = new ArrayList<>(visits);
    sorted.sort(BY_PROMISE);
    List<BenchRow> result = new ArrayList<>();
    @Nullable DayGroup group = null;
    for (VisitRecord visit : sorted) {
      LocalDate promised = promised(visit);
      DayGroup.Kind kind = DayGroup.kind(promised, today);
      if (group == null || !group.holds(kind, promised)) {
        group = new DayGroup(kind, promised);
      }
      result.add(BenchRow.of(visit, group));
    }
    loaded = true;
    trouble.set(Optional.empty());
    rows.setAll(result);
  }

  /** Where a ticket stands, or -1. */
  int indexOf(int ticket) {
    for (int i = 0; i < rows.size(); i++) {
      if (rows.get(i).ticket() == ticket) {
        return i;
      }
    }
    return -1;
  }

  /** Whether a row is the first of its day. */
  boolean opensGroup(int index) {
    return index == 0 || !rows.get(index).group().equals(rows.get(index - 1).group());
  }

  private static @Nullable LocalDate promised(VisitRecord visit) {
    return visit.visit().arrival().promised();
  }
}
