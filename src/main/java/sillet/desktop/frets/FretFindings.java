package sillet.desktop.frets;

import java.util.Optional;
import javafx.scene.control.Label;
import javafx.scene.layout.VBox;
import sillet.acoustics.frets.BoardScale;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;
import sillet.logbook.units.Length;

/** What the measured frets say in words: their scale, the nut, the fret that costs most. */
final class FretFindings extends VBox {
  private static final double MM = 1e3;

  private final Texts texts;

  FretFindings(Texts texts) {
    this.texts = texts;
    getStyleClass().add("fret-findings");
  }

  void show(FretSheetModel model, String measuredOn) {
    getChildren().clear();
    head(texts.say("frets.says"));
    int measured = model.metres().size();
    if (measured == 0) {
      sentence(texts.say("frets.none"));
    }
    if (!measuredOn.isEmpty()) {
      note(measuredOn);
    }
    model.byRule().ifPresent(board -> byRule(board, model));
    model.byAll().ifPresent(this::byAll);
    if (measured > 0 && measured < BoardScale.LEAST_FRETS) {
      sentence(texts.say("frets.few", Integer.toString(BoardScale.LEAST_FRETS)));
    }
    model.worst().ifPresent(row -> worst(row, model));
    head(texts.say("frets.how"));
    sentence(texts.say("frets.how-measure"));
    note(texts.say("frets.costs"));
    Label caution = new Label(texts.say("frets.caution"));
    caution.getStyleClass().add(Looks.CAUTION);
    add(caution);
  }

  private void byRule(BoardScale board, FretSheetModel model) {
    String nominal =
        model.scale().value().map(Length::mm).map(mm -> Figures.fixed(mm, 1)).orElse("");
    sentence(texts.say("frets.rule-scale", Figures.fixed(board.scale() * MM, 2), nominal));
    Nut nut = nut(board);
    sentence(texts.say("frets.rule-nut", nut.mm(), nut.way(), nut.cents()));
  }

  private void byAll(BoardScale board) {
    sentence(texts.say("frets.all-scale", Figures.fixed(board.scale() * MM, 2)));
    Nut nut = nut(board);
    sentence(texts.say("frets.all-nut", nut.mm(), nut.way(), nut.cents()));
  }

  private record Nut(String mm, String way, String cents) {}

  private Nut nut(BoardScale board) {
    double mm = board.nutFar() * MM;
    String way = texts.say(mm >= 0 ? "frets.far" : "frets.near");
    return new Nut(Figures.fixed(Math.abs(mm), 2), way, Figures.signed(board.nutCents(), 1));
  }

  private void worst(FretRow row, FretSheetModel model) {
    Optional<FretRow.Off> off = row.off();
    if (off.isEmpty()) {
      return;
    }
    double mm = off.get().mm();
    String against =
        texts.say(
            model.against() == FretSheetModel.Against.FRETS
                ? "frets.against-own"
                : "frets.against-nominal");
    String way = texts.say(mm >= 0 ? "frets.near-bridge" : "frets.near-nut");
    sentence(
        texts.say(
            "frets.worst",
            Integer.toString(row.fret()),
            Figures.fixed(Math.abs(mm), 2),
            way,
            Figures.signed(off.get().cents(), 1),
            against));
  }

  private void head(String text) {
    Label head = new Label(text);
    head.getStyleClass().add(Looks.PANEL_HEAD);
    getChildren().add(head);
  }

  private void sentence(String text) {
    Label label = new Label(text);
    label.getStyleClass().add(Looks.SENTENCE);
    add(label);
  }

  private void note(String text) {
    Label label = new Label(text);
    label.getStyleClass().add(Looks.NOTE);
    add(label);
  }

  private void add(Label label) {
    label.setWrapText(true);
    label.setMinHeight(USE_PREF_SIZE);
    getChildren().add(label);
  }
}
