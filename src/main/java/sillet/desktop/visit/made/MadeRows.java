package sillet.desktop.visit.made;

import java.util.ArrayList;
import java.util.List;
import javafx.scene.Node;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import sillet.logbook.text.Texts;

/** The rows in which the moves made are confirmed or changed; Enter goes down the strings. */
public final class MadeRows {
  private final List<MadeRowView> rows = new ArrayList<>();

  /**
   * Rows for the moves of a pass.
   *
   * @param model the moves
   * @param texts the words
   * @param changed told of each change
   * @param last what Enter does after the last string
   */
  public MadeRows(MovesMadeModel model, Texts texts, Runnable changed, Runnable last) {
    for (MadeRow row : model.rows()) {
      rows.add(new MadeRowView(row, texts, changed));
    }
    for (int i = 0; i < rows.size(); i++) {
      Runnable next = i + 1 < rows.size() ? rows.get(i + 1).size()::requestFocus : last;
      rows.get(i)
          .size()
          .addEventFilter(
              KeyEvent.KEY_PRESSED,
              event -> {
                if (event.getCode() == KeyCode.ENTER && !event.isControlDown()) {
                  next.run();
                  event.consume();
                }
              });
    }
  }

  /** The nodes, string 1 first. */
  public List<Node> nodes() {
    return List.copyOf(rows);
  }

  /** Puts the focus where the hand goes first. */
  public void focus() {
    rows.get(0).size().requestFocus();
  }
}
