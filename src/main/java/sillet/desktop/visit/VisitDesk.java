package sillet.desktop.visit;

import java.time.Clock;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.SaveSign;
import sillet.logbook.text.Texts;

/**
 * What the parts of the page share.
 *
 * @param desk of the window
 * @param model the visit
 * @param saves what is on its way to the disk
 */
record VisitDesk(Desk desk, VisitModel model, Saves saves) {
  Texts texts() {
    return desk.texts();
  }

  SaveSign sign() {
    return desk.sign();
  }

  Clock clock() {
    return desk.atBench().clock();
  }
}
