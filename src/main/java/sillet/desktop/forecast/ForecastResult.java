package sillet.desktop.forecast;

import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/** What stands at the end of a string's row: tension and feel, fret 12 left alone, the saddle. */
final class ForecastResult {
  private final Texts texts;
  private final Label newtons = label("");
  private final Label feel = label(Looks.NOTE);
  private final Label alone = label("");
  private final Label move = label(Looks.STRONG);
  private final Label interval = label(Looks.NOTE);
  private final VBox tension = new VBox(newtons, feel);
  private final VBox saddle = new VBox(move, interval);

  ForecastResult(Texts texts) {
    this.texts = texts;
    tension.setAlignment(Pos.CENTER_LEFT);
    saddle.setAlignment(Pos.CENTER_LEFT);
    alone.getStyleClass().add("forecast-figure");
  }

  private static Label label(String look) {
    Label label = new Label();
    if (!look.isEmpty()) {
      label.getStyleClass().add(look);
    }
    label.setMinWidth(Region.USE_PREF_SIZE);
    return label;
  }

  VBox tension() {
    return tension;
  }

  Label leftAlone() {
    return alone;
  }

  VBox saddle() {
    return saddle;
  }

  void show(ForecastLine line) {
    newtons.setText(
        line.tensionNow().isEmpty()
            ? ""
            : texts.say("forecast.newtons", line.tensionNow(), line.tensionThen()));
    feel.setText(
        line.breaking().isEmpty()
            ? line.feel()
            : texts.say("forecast.feel", line.feel(), line.breaking()));
    alone.setText(line.leftAlone());
    move.setText(line.move());
    move.getStyleClass()
        .setAll("label", Looks.STRONG, line.needsHand() ? Looks.NEEDS_HAND : "inside");
    interval.setText(line.nut().isEmpty() ? line.interval() : line.interval() + " · " + line.nut());
  }
}
