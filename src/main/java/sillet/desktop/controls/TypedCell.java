package sillet.desktop.controls;

import javafx.scene.control.TextField;
import sillet.desktop.theme.Looks;

/** A field of a table: bare, its message stands elsewhere. */
public final class TypedCell {
  private TypedCell() {}

  /**
   * Makes a field that shows and fills a model, is taken whole when one comes to it, judged when
   * one leaves it, and marked while it is wrong.
   *
   * @param model what is typed
   */
  public static TextField of(TypedFieldModel<?> model) {
    TextField input = new TextField();
    input.textProperty().bindBidirectional(model.typedProperty());
    input
        .focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (now) {
                input.selectAll();
              } else {
                model.leave();
              }
            });
    model
        .problemProperty()
        .addListener(
            (property, before, now) -> input.pseudoClassStateChanged(Looks.ERROR, now.isPresent()));
    input.pseudoClassStateChanged(Looks.ERROR, model.problemProperty().get().isPresent());
    return input;
  }
}
