package sillet.logbook.actions;

import java.util.UUID;
import sillet.logbook.visits.VisitAim;

/**
 * Says what a visit is reckoned for; the newest choice holds.
 *
 * @param visitId the stay
 * @param aim what shall become true, and whether the nut can move
 */
public record ChooseAim(UUID visitId, VisitAim aim) implements Action {

  @Override
  public String name() {
    return "choose aim";
  }
}
