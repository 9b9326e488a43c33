package sillet.desktop.visit.made;

import java.time.Instant;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.UUID;
import sillet.logbook.actions.RecordMoves;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.StringPass;

/** The moves of a pass as they were really made, one row a string. */
public final class MovesMadeModel {
  private final List<MadeRow> rows;

  public MovesMadeModel(List<StringPass> asked, LengthUnit unit) {
    rows = asked.stream().map(string -> new MadeRow(string, unit)).toList();
  }

  public List<MadeRow> rows() {
    return rows;
  }

  /** True if every row can be read and at least one saddle was moved. */
  public boolean complete() {
    return rows.stream().allMatch(row -> row.problem() == null)
        && rows.stream().anyMatch(row -> row.move(Instant.EPOCH) != null);
  }

  /** The action that records them; empty while a row cannot be read or nothing was moved. */
  public Optional<RecordMoves> action(UUID visitId, Instant at) {
    if (!complete()) {
      return Optional.empty();
    }
    return Optional.of(
        new RecordMoves(
            visitId, rows.stream().map(row -> row.move(at)).filter(Objects::nonNull).toList()));
  }
}
