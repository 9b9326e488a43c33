package sillet.desktop.visit.checks;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.UUID;
import java.util.function.BiFunction;
import sillet.logbook.actions.RecordChecks;
import sillet.logbook.text.Message;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.Moment;
import sillet.logbook.visits.VisitRecord;

/** The checks of a visit: the usual ones on the outer strings, and every one that was made. */
public final class ChecksModel {
  private final int strings;
  private final int frets;
  private final LengthUnit unit;
  private final BiFunction<CheckKind, Length, List<Message>> unusual;
  private final Map<CheckPlace, CheckRow> rows = new LinkedHashMap<>();
  private boolean everyString;

  /**
   * The checks of a visit.
   *
   * @param record what the logbook holds
   * @param unit the shop's
   * @param unusual warnings for a figure that is out of the ordinary
   */
  public ChecksModel(
      VisitRecord record, LengthUnit unit, BiFunction<CheckKind, Length, List<Message>> unusual) {
    this.strings = record.visit().strings().strings().size();
    this.frets = record.instrument().neck().frets();
    this.unit = unit;
    this.unusual = unusual;
    row(new CheckPlace(CheckKind.RELIEF, BenchCheck.WHOLE_NECK));
    everyString(CheckKind.ACTION);
    everyString(CheckKind.FIRST_FRET_CLEARANCE);
    everyString(CheckKind.PICKUP_HEIGHT);
    take(record);
  }

  private void everyString(CheckKind kind) {
    for (int string = 1; string <= strings; string++) {
      row(new CheckPlace(kind, string));
    }
  }

  private CheckRow row(CheckPlace place) {
    return rows.computeIfAbsent(place, made -> new CheckRow(made, unit, frets, unusual));
  }

  /** Takes what the logbook now holds; checks that were corrected since are passed over. */
  public void take(VisitRecord record) {
    Map<CheckPlace, Map<Moment, BenchCheck>> newest = new LinkedHashMap<>();
    for (BenchCheck check : record.checks()) {
      Map<Moment, BenchCheck> there =
          newest.computeIfAbsent(CheckPlace.of(check), first -> new LinkedHashMap<>());
      // put in anew, so that the one made last is taken last
      there.remove(check.moment());
      there.put(check.moment(), check);
    }
    newest.forEach((place, checks) -> checks.values().forEach(row(place)::take));
  }

  /** Shows the rows of the inner strings too, or hides those in which nothing stands. */
  public void showEveryString(boolean every) {
    everyString = every;
  }

  public boolean everyString() {
    return everyString;
  }

  /** The rows to show, in order. */
  public List<CheckRow> rows() {
    List<CheckRow> shown = new ArrayList<>();
    rows.forEach(
        (place, row) -> {
          boolean outer = place.string() <= 1 || place.string() == strings;
          if (outer || row.filled() || (everyString && place.kind() != CheckKind.PICKUP_HEIGHT)) {
            shown.add(row);
          }
        });
    return shown;
  }

  /** The action that saves a field; empty if there is nothing new or it cannot be read. */
  public Optional<RecordChecks> commit(CheckRow row, Moment moment, UUID visitId) {
    return row.toSave(moment).map(check -> new RecordChecks(visitId, List.of(check)));
  }

  /** How many checks are on record for a moment. */
  public long made(Moment moment) {
    return rows.values().stream().filter(row -> row.recorded(moment) != null).count();
  }
}
