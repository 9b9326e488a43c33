package sillet.logbook.actions;

import java.util.List;
import java.util.UUID;
import sillet.logbook.visits.MadeMove;

/**
 * Writes down what was really done to saddles and nut.
 *
 * @param visitId the stay
 * @param moves at least one
 */
public record RecordMoves(UUID visitId, List<MadeMove> moves) implements Action {

  /** Copies the list. */
  public RecordMoves {
    moves = List.copyOf(moves);
  }

  @Override
  public String name() {
    return "record moves";
  }
}
