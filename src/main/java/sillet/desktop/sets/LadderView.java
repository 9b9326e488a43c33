package sillet.desktop.sets;

import java.util.List;
import java.util.Optional;
import javafx.scene.control.Label;
import javafx.scene.layout.VBox;
import sillet.acoustics.sets.GaugeLadder.Rung;
import sillet.desktop.controls.FigureTable;
import sillet.desktop.controls.FigureTable.Column;
import sillet.desktop.controls.TypedField;
import sillet.desktop.controls.TypedFieldModel;
import sillet.desktop.drawing.NoteName;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Rejection;
import sillet.logbook.text.Texts;
import sillet.logbook.units.DecimalText;
import sillet.logbook.units.Figures;

/** Which gauge of the same make would pull as hard on every string. */
final class LadderView extends VBox {
  private final Texts texts;
  private final TypedFieldModel<Double> wanted = TypedFieldModel.optional(LadderView::readTension);
  private final TypedField field;
  private final VBox below = new VBox();
  private Optional<SetFigures> shown = Optional.empty();

  LadderView(Texts texts) {
    this.texts = texts;
    this.field = new TypedField(wanted, texts.say("sets.wanted"), texts);
    field.input().setId("sets-wanted");
    field.input().getStyleClass().addAll(Looks.FIGURE, "newton-field");
    wanted.typedProperty().addListener((property, before, now) -> reckon());
    below.getStyleClass().add("ladder-below");
    getStyleClass().add("ladder");
    getChildren().addAll(field, below);
  }

  void focus() {
    field.input().requestFocus();
  }

  void show(Optional<SetFigures> figures) {
    shown = figures;
    reckon();
  }

  /** The set with the nearest usual gauges, where there is one for every string. */
  List<LadderLine> lines() {
    return shown
        .filter(figures -> figures.equalN().isPresent())
        .map(figures -> LadderLine.of(figures, wantedN(figures)))
        .orElse(List.of());
  }

  private double wantedN(SetFigures figures) {
    return wanted.value().orElseGet(() -> figures.equalN().orElseThrow());
  }

  private void reckon() {
    below.getChildren().clear();
    Optional<SetFigures> figures = shown.filter(one -> one.equalN().isPresent());
    if (figures.isEmpty()) {
      return;
    }
    double newtons = wantedN(figures.get());
    boolean typed = wanted.value().isPresent();
    String figure = Figures.fixed(newtons, 1);
    FigureTable table =
        new FigureTable(
            Column.WORDS,
            Column.WORDS,
            Column.FIGURE,
            Column.FIGURE,
            Column.FIGURE,
            Column.FIGURE,
            Column.FIGURE,
            Column.FIGURE,
            Column.SENTENCE);
    table.head(
        texts.say("sets.string"),
        "",
        texts.say("sets.now-in"),
        texts.say("sets.now-n"),
        texts.say("sets.exact-in"),
        texts.say("sets.nearest-in"),
        texts.say("sets.there-n"),
        texts.say("sets.misses-n"),
        "");
    lines().forEach(line -> row(table, line));
    below
        .getChildren()
        .addAll(
            sentence(
                Looks.SENTENCE, texts.say(typed ? "sets.ladder-at" : "sets.ladder-equal", figure)),
            table,
            sentence(Looks.NOTE, texts.say("sets.ladder-usual")),
            sentence(Looks.CAUTION, texts.say("sets.caution")));
  }

  private void row(FigureTable table, LadderLine line) {
    StringFigures now = line.now();
    String number = Integer.toString(now.string().number());
    String gauge = Figures.gauge(now.string().make().gaugeIn());
    String tension = Figures.fixed(now.tensionN().orElse(0), 1);
    NoteName note = new NoteName(now.string().pitch().typed(), false);
    if (line.rung().isEmpty()) {
      table.row(
          FigureTable.strong(number),
          note,
          gauge,
          tension,
          "",
          "",
          "",
          "",
          FigureTable.soft(texts.say("sets.no-rung")));
      return;
    }
    Rung rung = line.rung().orElseThrow();
    table.row(
        FigureTable.strong(number),
        note,
        gauge,
        tension,
        FigureTable.soft(Figures.gauge(line.exactIn().orElseThrow())),
        FigureTable.strong(Figures.gauge(line.usualIn().orElseThrow())),
        Figures.fixed(rung.tension(), 1),
        Figures.signed(rung.miss(), 1),
        "");
  }

  private static Label sentence(String styleClass, String text) {
    Label label = new Label(text);
    label.getStyleClass().add(styleClass);
    label.setWrapText(true);
    label.setMinHeight(USE_PREF_SIZE);
    return label;
  }

  private static double readTension(String text) {
    double newtons = DecimalText.parse(text).value();
    if (!(newtons > 0) || newtons > 1000) {
      throw Rejection.of("field.between", "0.1", "1000", "N", text.strip());
    }
    return newtons;
  }
}
