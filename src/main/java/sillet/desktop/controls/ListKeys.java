package sillet.desktop.controls;

import javafx.scene.control.ListView;
import javafx.scene.input.KeyCode;

/** Keys of a list that one goes on from: Enter and a double click open, Escape leads back. */
public final class ListKeys {
  private ListKeys() {}

  /**
   * Teaches a list.
   *
   * @param list what is looked through
   * @param open opens what is chosen
   * @param back leads back; a list keeps Escape to itself otherwise
   */
  public static void teach(ListView<?> list, Runnable open, Runnable back) {
    list.setOnKeyPressed(
        key -> {
          if (key.getCode() == KeyCode.ENTER) {
            open.run();
            key.consume();
          } else if (key.getCode() == KeyCode.ESCAPE) {
            back.run();
            key.consume();
          }
        });
    list.setOnMouseClicked(
        click -> {
          if (click.getClickCount() == 2) {
            open.run();
          }
        });
  }
}
