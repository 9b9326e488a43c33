package sillet.desktop.visit.checks;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.UUID;
import sillet.logbook.actions.RecordTravel;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.strings.FittedString;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.Travel;
import sillet.logbook.visits.VisitRecord;

/** The room at the saddles. It is typed as it stands now and kept as it was on arrival. */
public final class RoomModel {
  private final List<RoomRow> rows = new ArrayList<>();
  private final boolean onePiece;

  /**
   * The room of a visit.
   *
   * @param record what the logbook holds
   * @param unit the shop's
   */
  public RoomModel(VisitRecord record, LengthUnit unit) {
    this.onePiece = record.instrument().saddle().kind() == SaddleKind.ONE_PIECE;
    for (FittedString string : record.visit().strings().strings()) {
      rows.add(new RoomRow(string.number(), unit));
    }
    take(record);
  }

  /** Whether all strings share a fixed saddle, whose edges must be kept. */
  boolean onePiece() {
    return onePiece;
  }

  /** A row for each string. */
  public List<RoomRow> rows() {
    return List.copyOf(rows);
  }

  /** Takes what the logbook now holds. */
  public void take(VisitRecord record) {
    for (RoomRow row : rows) {
      double moved =
          record.moves().stream()
              .filter(move -> move.string() == row.string())
              .mapToDouble(MadeMove::saddleMm)
              .sum();
      Travel known =
          record.visit().travel().stream()
              .filter(travel -> travel.string() == row.string())
              .findFirst()
              .orElse(null);
      row.take(known, moved);
    }
  }

  /** The action that saves a row; empty if there is nothing new or it cannot be read. */
  public Optional<RecordTravel> commit(RoomRow row, UUID visitId) {
    return row.toSave().map(travel -> new RecordTravel(visitId, List.of(travel)));
  }
}
