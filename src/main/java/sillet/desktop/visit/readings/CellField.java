package sillet.desktop.visit.readings;

import javafx.geometry.Pos;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.StackPane;
import sillet.desktop.drawing.Tries;
import sillet.desktop.theme.Looks;

/**
 * One cell: shows the median, and all tries while one types. Enter and Tab go to the next cell, the
 * arrows up and down move the last try by a tenth of a cent, a space or a slash begins another try.
 */
public final class CellField extends StackPane {
  private final Cell cell;
  private final GridHand hand;
  private final TextField field = new TextField();
  private final Tries tries = new Tries(0, -1, "");
  private boolean showing;
  private int shownTries;
  private int shownWild = -1;

  /**
   * A cell.
   *
   * @param cell which one
   * @param hand told and asked
   * @param name what a screen reader calls it
   */
  public CellField(Cell cell, GridHand hand, String name) {
    this.cell = cell;
    this.hand = hand;
    field.setId("cell-" + cell.string() + "-" + cell.fret());
    field.setAccessibleText(name);
    field.getStyleClass().add(Looks.READING_CELL);
    field.setMaxSize(Double.MAX_VALUE, Double.MAX_VALUE);
    field.setPrefColumnCount(1);
    field.setMinWidth(0);
    getStyleClass().add("cell");
    tries.getStyleClass().add("tries");
    tries.setMaxSize(USE_PREF_SIZE, USE_PREF_SIZE);
    setAlignment(tries, Pos.CENTER_LEFT);
    tries.setVisible(false);
    getChildren().addAll(field, tries);
    listen();
    refresh();
  }

  public Cell cell() {
    return cell;
  }

  /** Where one types. */
  public TextField field() {
    return field;
  }

  private void listen() {
    field.addEventFilter(KeyEvent.KEY_PRESSED, this::pressed);
    field.addEventFilter(KeyEvent.KEY_TYPED, this::anotherTry);
    field
        .textProperty()
        .addListener(
            (property, before, now) -> {
              if (!showing) {
                hand.typed(cell, now);
              }
            });
    field
        .focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (now) {
                hand.entered(cell);
              } else {
                hand.done(cell);
              }
              refresh();
              if (now) {
                field.selectAll();
              }
            });
  }

  private void pressed(KeyEvent event) {
    if (event.isControlDown() || event.isAltDown() || event.isMetaDown()) {
      return;
    }
    boolean back = event.isShiftDown();
    KeyCode code = event.getCode();
    if (code == KeyCode.ENTER) {
      hand.done(cell);
      hand.go(cell, back ? Way.PREVIOUS_STRING : Way.NEXT_STRING);
      if (field.isFocused()) {
        field.selectAll();
      }
      event.consume();
    } else if (code == KeyCode.TAB) {
      if (hand.go(cell, back ? Way.PREVIOUS_FRET : Way.NEXT_FRET)) {
        event.consume();
      }
    } else if (field.isEditable() && (code == KeyCode.UP || code == KeyCode.DOWN)) {
      hand.stepped(cell, code == KeyCode.UP ? 1 : -1);
      show(hand.face(cell).typing());
      field.end();
      event.consume();
    }
  }

  /**
   * A divider typed onto a selected reading adds a try; it does not wipe those that stand there.
   */
  private void anotherTry(KeyEvent event) {
    boolean divider = event.getCharacter().equals(" ") || event.getCharacter().equals("/");
    boolean all = field.getSelectedText().equals(field.getText());
    if (divider && all && !field.getText().isEmpty()) {
      field.end();
    }
  }

  /** Shows the cell as it now is. While one types in it, the characters are left alone. */
  public void refresh() {
    CellFace face = hand.face(cell);
    boolean typing = field.isFocused();
    if (!typing) {
      show(face.text());
    } else if (!face.typing().equals(field.getText())) {
      show(face.typing());
    }
    boolean wrong = face.state() == CellFace.State.ERROR && !typing;
    field.pseudoClassStateChanged(Looks.UNREAD, face.state() == CellFace.State.UNREAD);
    field.pseudoClassStateChanged(Looks.ERROR, wrong);
    bars(typing ? 0 : face.tries(), face.wildTry().orElse(-1));
  }

  private void bars(int count, int wild) {
    if (count != shownTries || wild != shownWild) {
      shownTries = count;
      shownWild = wild;
      tries.show(count, wild, "");
      tries.setVisible(count > 1);
    }
  }

  private void show(String text) {
    if (!text.equals(field.getText())) {
      showing = true;
      field.setText(text);
      showing = false;
    }
  }

  @Override
  public void requestFocus() {
    field.requestFocus();
  }
}
