package sillet.desktop.intake;

import java.util.List;
import java.util.function.Consumer;
import java.util.function.Function;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;

/**
 * What the logbook knows that fits what is being typed: the arrow down goes into the list, Enter
 * takes what is chosen.
 *
 * @param <T> what is offered
 */
final class Suggestions<T> extends ListView<T> {
  private static final int MOST_ROWS = 4;

  private final Function<T, String> words;
  private final Consumer<T> chosen;

  /**
   * An empty list.
   *
   * @param id in the style of an identifier
   * @param words of each suggestion
   * @param chosen takes the one that is chosen
   */
  Suggestions(String id, Function<T, String> words, Consumer<T> chosen) {
    this.words = words;
    this.chosen = chosen;
    setId(id);
    getStyleClass().add("suggestions");
    setCellFactory(list -> new WordsCell());
    setOnMouseClicked(click -> take());
    offer(List.of());
  }

  /** Stands under a field: the arrow down leads here, Escape back. */
  Suggestions<T> under(TextField field) {
    field.addEventFilter(
        KeyEvent.KEY_PRESSED,
        key -> {
          if (key.getCode() == KeyCode.DOWN && isManaged()) {
            requestFocus();
            getSelectionModel().selectFirst();
            key.consume();
          }
        });
    setOnKeyPressed(
        key -> {
          if (key.getCode() == KeyCode.ENTER) {
            take();
            key.consume();
          } else if (key.getCode() == KeyCode.ESCAPE) {
            field.requestFocus();
            key.consume();
          }
        });
    return this;
  }

  private void take() {
    T selected = getSelectionModel().getSelectedItem();
    if (selected != null) {
      chosen.accept(selected);
    }
  }

  /** Offers these, or hides where there are none. */
  void offer(List<T> found) {
    getItems().setAll(found.subList(0, Math.min(MOST_ROWS, found.size())));
    boolean any = !found.isEmpty();
    setVisible(any);
    setManaged(any);
    getStyleClass().removeIf(name -> name.startsWith("suggestions-"));
    getStyleClass().add("suggestions-" + getItems().size());
  }

  private final class WordsCell extends ListCell<T> {
    @Override
    protected void updateItem(T item, boolean empty) {
      super.updateItem(item, empty);
      setText(empty || item == null ? "" : words.apply(item));
    }
  }
}
