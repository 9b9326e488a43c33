package sillet.desktop.visit;

import java.util.List;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.drawing.Balloon;
import sillet.desktop.theme.Looks;
import sillet.desktop.visit.words.FindingLine;
import sillet.logbook.text.Texts;

/** What a saddle does not cure and what must be known before one is touched. */
final class FindingsPanel extends VBox {
  private final VBox lines = new VBox();
  private final Label caution = new Label();
  private @Nullable Shown shown;

  FindingsPanel(Texts texts) {
    Label head = new Label(texts.say("visit.findings"));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    lines.getStyleClass().add("finding-lines");
    caution.getStyleClass().add(Looks.CAUTION);
    caution.setWrapText(true);
    caution.setMinHeight(USE_PREF_SIZE);
    setFocusTraversable(true);
    setId("findings");
    setAccessibleText(head.getText());
    getStyleClass().addAll(Looks.PANEL, "findings");
    getChildren().addAll(head, lines, caution);
  }

  /**
   * What the panel shows.
   *
   * @param findings what was found
   * @param otherwise what to say where that is nothing
   * @param caution stands there while a saddle asks to be moved; empty for none
   */
  record Shown(List<FindingLine> findings, String otherwise, String caution) {}

  /** Shows it; at most keys nothing has changed. */
  void show(Shown wanted) {
    if (wanted.equals(shown)) {
      return;
    }
    shown = wanted;
    lines.getChildren().clear();
    for (int i = 0; i < wanted.findings().size(); i++) {
      lines.getChildren().add(line(i + 1, wanted.findings().get(i)));
    }
    if (wanted.findings().isEmpty()) {
      Label none = new Label(wanted.otherwise());
      none.getStyleClass().add(Looks.SOFT);
      none.setWrapText(true);
      none.setMinHeight(USE_PREF_SIZE);
      lines.getChildren().add(none);
    }
    caution.setText(wanted.caution());
    caution.setVisible(!wanted.caution().isEmpty());
    caution.setManaged(!wanted.caution().isEmpty());
  }

  private static void sentence(VBox words, String text, String... looks) {
    if (!text.isEmpty()) {
      Label sentence = new Label(text);
      sentence.getStyleClass().addAll(looks);
      sentence.setWrapText(true);
      sentence.setMinHeight(Region.USE_PREF_SIZE);
      words.getChildren().add(sentence);
    }
  }

  private static HBox line(int number, FindingLine finding) {
    Label head = new Label(finding.head());
    head.getStyleClass().add(Looks.STRONG);
    head.setWrapText(true);
    head.setMinHeight(Region.USE_PREF_SIZE);
    VBox words = new VBox(head);
    sentence(words, finding.sentence(), Looks.TIGHT, Looks.SENTENCE);
    sentence(words, finding.toDo(), Looks.TIGHT, Looks.SENTENCE, "to-do");
    sentence(words, finding.worth(), Looks.NOTE);
    sentence(words, finding.caution(), Looks.CAUTION, Looks.TIGHT);
    words.getStyleClass().add("finding-words");
    words.setMinWidth(0);
    HBox.setHgrow(words, Priority.ALWAYS);
    HBox line = new HBox(new Balloon(number, false, finding.head()), words);
    line.setAlignment(Pos.TOP_LEFT);
    line.setFillHeight(false);
    line.getStyleClass().add("finding-line");
    return line;
  }
}
