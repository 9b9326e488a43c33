package sillet.desktop.visit;

import javafx.scene.control.ToggleButton;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.theme.Looks;
import sillet.desktop.visit.aim.AimBar;
import sillet.desktop.visit.aim.AimModel;
import sillet.logbook.text.Texts;

/** Under the drawing: which frets, how they are read, and what the moves serve. */
final class ReadingsFoot extends VBox {
  private final VisitModel model;
  private final AimModel aimModel;
  private final AimBar aim;
  private final ToggleButton wholeNeck;

  /**
   * What the foot can change.
   *
   * @param frets other frets have cells
   * @param terms readings are taken otherwise
   * @param neck the whole neck is wanted or not
   * @param aim another aim was chosen
   */
  record Changed(Runnable frets, Runnable terms, Runnable neck, Runnable aim) {}

  ReadingsFoot(VisitDesk desk, Changed changed) {
    Texts texts = desk.texts();
    this.model = desk.model();
    this.wholeNeck =
        KeyHint.toggle(texts.say("visit.neck.whole"), texts.say("visit.key.neck"), changed.neck());
    wholeNeck.setId("whole-neck");
    wholeNeck.getStyleClass().add(Looks.CHOICE);
    wholeNeck.setMinWidth(Region.USE_PREF_SIZE);
    this.aimModel = new AimModel(model.aim());
    this.aim =
        new AimBar(
            aimModel,
            texts,
            wanted -> {
              desk.saves().keep(model.aimAt(wanted));
              changed.aim().run();
            });
    getChildren()
        .addAll(
            new ReadingTermsBar(model, texts, wholeNeck, changed.frets(), changed.terms()), aim);
  }

  AimBar aim() {
    return aim;
  }

  /** Shows what is chosen now. */
  void refresh(NeckView neck) {
    wholeNeck.setSelected(neck.whole());
    wholeNeck.setDisable(neck.crowded());
    if (!aimModel.aim().equals(model.aim())) {
      aimModel.take(model.aim());
    }
    aim.refresh();
    aim.setDisable(!model.open());
  }
}
