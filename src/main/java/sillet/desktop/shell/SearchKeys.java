package sillet.desktop.shell;

import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;

/** Keys of the search field: down and Enter go to what was found, Escape empties it. */
final class SearchKeys {
  private SearchKeys() {}

  /**
   * Teaches the field its keys.
   *
   * @param field of the top line
   * @param typing somebody types or searches
   * @param toFinds gives the focus to what was found
   */
  static void teach(TextField field, Runnable typing, Runnable toFinds) {
    field
        .textProperty()
        .addListener(
            (property, before, now) -> {
              if (field.isFocused()) {
                typing.run();
              }
            });
    field.addEventFilter(
        KeyEvent.KEY_PRESSED,
        key -> {
          if (key.getCode() == KeyCode.DOWN || key.getCode() == KeyCode.ENTER) {
            typing.run();
            toFinds.run();
            key.consume();
          } else if (key.getCode() == KeyCode.ESCAPE && !field.getText().isEmpty()) {
            field.clear();
            key.consume();
          }
        });
  }
}
