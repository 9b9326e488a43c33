package sillet.desktop.history;

import java.util.Optional;
import javafx.beans.value.ObservableBooleanValue;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Columns;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.theme.Looks;
import sillet.logbook.learned.LearnedInstrument;
import sillet.logbook.text.Texts;

/** What the readings have taught about the instrument, and a way to let go of it. */
final class LearnedPanel extends VBox {
  private final Texts texts;
  private final Label from = new Label();
  private final Button forget;
  private final VBox shared = new VBox();
  private final GridPane strings = new GridPane();

  LearnedPanel(Texts texts, ObservableBooleanValue narrow, Runnable reset) {
    this.texts = texts;
    Label head = new Label(texts.say("history.learned"));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    head.setMinWidth(Region.USE_PREF_SIZE);
    from.getStyleClass().add(Looks.SOFT);
    from.setMinWidth(0);
    from.setMinHeight(USE_PREF_SIZE);
    from.setWrapText(true);
    this.forget = new Button(texts.say("history.forget"));
    forget.setId("forget-learned");
    forget.setOnAction(pressed -> reset.run());
    Region apart = new Region();
    HBox.setHgrow(apart, Priority.ALWAYS);
    HBox line = new HBox(head, apart, KeyHint.line(forget));
    line.getStyleClass().add("panel-line");
    strings.getStyleClass().add("learned-strings");
    shared.setMinWidth(0);
    strings.setMinWidth(0);
    Columns both = new Columns(narrow, 50, 50);
    both.show(strings, shared);
    both.getStyleClass().add("learned-both");
    getStyleClass().addAll(Looks.PANEL, "learned");
    getChildren().addAll(line, from, both);
  }

  /** Shows it; nothing where no reading teaches. */
  void show(Optional<LearnedInstrument> learned) {
    forget.setVisible(learned.isPresent());
    strings.getChildren().clear();
    shared.getChildren().clear();
    from.setText(learned.isEmpty() ? texts.say("history.learned-nothing") : "");
    learned.ifPresent(known -> show(new LearnedWords(texts, known)));
  }

  private void show(LearnedWords words) {
    from.setText(words.from());
    for (String said : words.shared()) {
      Label sentence = new Label(said);
      sentence.getStyleClass().add(Looks.SENTENCE);
      sentence.setWrapText(true);
      sentence.setMinWidth(0);
      sentence.setMinHeight(USE_PREF_SIZE);
      shared.getChildren().add(sentence);
    }
    head(texts.say("history.learned-string"), 0);
    head(texts.say("history.learned-stretch"), 1);
    head(texts.say("history.learned-gap"), 2);
    head(texts.say("history.learned-passes"), 3);
    int line = 1;
    for (LearnedWords.Row row : words.rows()) {
      figure(row.number(), Looks.STRONG, 0, line);
      figure(row.stretch(), Looks.TIGHT, 1, line);
      figure(row.gap(), Looks.TIGHT, 2, line);
      figure(row.passes(), Looks.TIGHT, 3, line);
      line++;
    }
  }

  private void head(String text, int column) {
    Label label = figure(text, Looks.NOTE, column, 0);
    label.setWrapText(true);
    label.setMinWidth(0);
  }

  private Label figure(String text, String look, int column, int line) {
    Label label = new Label(text);
    label.getStyleClass().add(look);
    label.setMinWidth(Region.USE_PREF_SIZE);
    strings.add(label, column, line);
    return label;
  }
}
