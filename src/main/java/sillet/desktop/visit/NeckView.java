package sillet.desktop.visit;

import sillet.desktop.visit.picture.ShownNeck;
import sillet.logbook.text.Texts;

/**
 * Whether the whole neck is drawn in the place of cells beside their frets, and which fret's cells
 * are open then. It must be where the cells have no room beside their frets.
 */
final class NeckView {
  private final VisitModel model;
  private final Texts texts;
  private boolean wanted;
  private boolean crowded;
  private int open;

  NeckView(VisitModel model, Texts texts) {
    this.model = model;
    this.texts = texts;
    this.open = model.walk().start(model.grid()::read).fret();
  }

  /** Whether the whole neck is drawn. */
  boolean whole() {
    return wanted || crowded;
  }

  /** Whether it must be. */
  boolean crowded() {
    return crowded;
  }

  /** Asks for the whole neck, or for cells beside their frets where these have room. */
  void want(boolean whole) {
    wanted = whole;
  }

  /** Takes whether the cells lack room beside their frets; true if that changes what is drawn. */
  boolean crowd(boolean now) {
    boolean before = whole();
    crowded = now;
    return whole() != before;
  }

  /** Opens the cells of a fret, counted from each string's own nut. */
  void open(int fret) {
    open = fret;
  }

  /** What is drawn now. */
  ShownNeck shown() {
    var frets = model.frets().frets();
    if (!whole()) {
      return cells();
    }
    int fret = frets.contains(open) ? open : frets.get(frets.size() - 1);
    String head =
        fret == 0
            ? texts.say("visit.sheet.open")
            : texts.say("visit.sheet.fret", Integer.toString(fret));
    return new ShownNeck(frets, fret, head);
  }

  /** What would be drawn with cells beside their frets. */
  ShownNeck cells() {
    return ShownNeck.cells(model.frets().frets());
  }
}
