package sillet.desktop.sets;

import java.util.Optional;
import java.util.OptionalDouble;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;

/** What all strings of a set pull together, beside the compared set, and what a change asks for. */
final class LoadRows extends VBox {
  private static final double PERCENT = 100;

  private final Texts texts;

  LoadRows(Texts texts) {
    this.texts = texts;
    getStyleClass().add("load-rows");
  }

  void show(SetFigures figures, Optional<SetFigures> compared) {
    getChildren().clear();
    double now = figures.totalN().orElse(0);
    boolean alike =
        compared.map(set -> set.strings().size() == figures.strings().size()).orElse(false);
    double other = alike ? compared.map(set -> set.totalN().orElse(0)).orElse(0.0) : 0;
    double most = Math.max(1e-9, Math.max(now, other));
    Label head = new Label(texts.say("sets.load"));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    getChildren().add(head);
    getChildren().add(row(figures, figures.totalN(), now / most, true, ""));
    if (alike && now > 0 && other > 0) {
      SetFigures beside = compared.orElseThrow();
      String change = Figures.signed((other / now - 1) * PERCENT, 0) + "\u00a0%";
      getChildren().add(row(beside, beside.totalN(), other / most, false, change));
      String newtons = Figures.fixed(Math.abs(other - now), 0);
      sentence(
          Looks.SENTENCE,
          other < now
              ? texts.say("sets.less", figures.set().name(), beside.set().name(), newtons)
              : texts.say("sets.more", figures.set().name(), beside.set().name(), newtons));
    } else if (compared.isPresent() && !alike) {
      sentence(
          Looks.SENTENCE,
          texts.say(
              "sets.other-count",
              compared.get().set().name(),
              Integer.toString(compared.get().set().strings().size())));
    }
    sentence(Looks.CAUTION, texts.say("sets.caution"));
  }

  private HBox row(
      SetFigures figures, OptionalDouble totalN, double share, boolean full, String change) {
    Label name = new Label(figures.set().name());
    name.setMinWidth(0);
    HBox left = new HBox(name);
    left.getStyleClass().addAll("set-left", "load-name");
    LoadBar bar = new LoadBar(share, full);
    HBox.setHgrow(bar, Priority.ALWAYS);
    Label total = new Label(totalN.isPresent() ? Figures.fixed(totalN.getAsDouble(), 0) : "\u2013");
    if (full) {
      name.getStyleClass().add(Looks.STRONG);
      total.getStyleClass().addAll(Looks.STRONG, "set-gauge-figure");
    }
    HBox tension = new HBox(total);
    tension.getStyleClass().addAll("set-cell", "set-tension");
    HBox changed = new HBox(new Label(change));
    changed.getStyleClass().addAll("set-cell", "set-breaking");
    HBox right = new HBox(tension, changed);
    right.getStyleClass().add("set-right");
    HBox row = new HBox(left, bar, right);
    row.getStyleClass().add("load-row");
    return row;
  }

  private void sentence(String styleClass, String text) {
    Label label = new Label(text);
    label.getStyleClass().add(styleClass);
    label.setWrapText(true);
    label.setMinHeight(USE_PREF_SIZE);
    getChildren().add(label);
  }
}
