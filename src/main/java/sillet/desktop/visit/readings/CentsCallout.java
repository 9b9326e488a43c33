package sillet.desktop.visit.readings;

import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.theme.Looks;

/** Why a cell cannot be taken, joined to it by a leader. */
public final class CentsCallout extends HBox {
  private final Label rule = new Label();
  private final Label example = new Label();

  /**
   * A callout that says nothing yet.
   *
   * @param expected what can be typed
   */
  public CentsCallout(String expected) {
    example.setText(expected);
    Region dot = new Region();
    dot.getStyleClass().add("callout-dot");
    Region line = new Region();
    line.getStyleClass().add("callout-line");
    rule.getStyleClass().add(Looks.ERROR_HEAD);
    example.getStyleClass().add(Looks.ERROR_DETAIL);
    VBox words = new VBox(rule, example);
    words.getStyleClass().add("callout-words");
    getStyleClass().add("callout");
    getChildren().addAll(dot, line, words);
    setMouseTransparent(true);
    setVisible(false);
  }

  /** Says what is wrong. */
  public void say(String text) {
    rule.setText(text);
    setVisible(true);
  }
}
