package sillet.desktop.controls;

import javafx.scene.control.Button;
import javafx.scene.control.ButtonBase;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.Label;
import javafx.scene.control.ToggleButton;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import sillet.desktop.theme.Looks;

/** The key that does the same, written beside a button's name. */
public final class KeyHint {
  private KeyHint() {}

  /**
   * Makes a button.
   *
   * @param name what it does
   * @param key the key that does it too
   * @param action what happens
   */
  public static Button button(String name, String key, Runnable action) {
    return hinted(new Button(name), key, action);
  }

  /**
   * Makes a button that stays pressed; whoever owns it says which.
   *
   * @param name what it shows
   * @param key the key that does it too
   * @param action what happens
   */
  public static ToggleButton toggle(String name, String key, Runnable action) {
    return hinted(new ToggleButton(name), key, action);
  }

  private static <B extends ButtonBase> B hinted(B button, String key, Runnable action) {
    Label hint = new Label(key);
    hint.getStyleClass().add(Looks.KEY_HINT);
    button.setGraphic(hint);
    button.setContentDisplay(ContentDisplay.RIGHT);
    button.setMnemonicParsing(false);
    button.setAccessibleText(button.getText() + ", " + key);
    button.setOnAction(pressed -> action.run());
    return button;
  }

  /** Buttons side by side that give no width away, however long the words beside them are. */
  public static HBox line(Button... buttons) {
    HBox line = new HBox(buttons);
    line.getStyleClass().add("button-line");
    line.setMinWidth(Region.USE_PREF_SIZE);
    return line;
  }
}
