package sillet.desktop.shell;

import java.util.Optional;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;
import javafx.scene.control.ButtonType;
import javafx.scene.control.Dialog;
import javafx.scene.control.DialogPane;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.VBox;
import javafx.stage.Modality;
import javafx.stage.Window;
import sillet.desktop.theme.Looks;

/** Makes the few windows over the window: dressed like it, focus back afterwards. */
final class Dialogs {
  private static final double SHARE_OF_WINDOW = 0.6;

  private final Window owner;
  private final ObservableValue<Settings> settings;

  Dialogs(Window owner, ObservableValue<Settings> settings) {
    this.owner = owner;
    this.settings = settings;
  }

  /**
   * Shows a head and a sentence and waits.
   *
   * @param head what it is about
   * @param said the sentence
   * @param buttons the ways out; the first is the usual one
   * @return the way taken
   */
  Optional<ButtonType> show(String head, String said, ButtonType... buttons) {
    Label sentence = new Label(said);
    sentence.getStyleClass().add(Looks.SENTENCE);
    sentence.setWrapText(true);
    return show(head, sentence, buttons);
  }

  /** Shows a head and whatever belongs under it and waits. */
  Optional<ButtonType> show(String head, Node body, ButtonType... buttons) {
    Dialog<ButtonType> dialog = new Dialog<>();
    Node focusBefore = owner.getScene() == null ? null : owner.getScene().getFocusOwner();
    if (owner.isShowing()) {
      dialog.initOwner(owner);
    }
    dialog.initModality(Modality.WINDOW_MODAL);
    dialog.setTitle(head);
    DialogPane pane = dialog.getDialogPane();
    Label headLine = new Label(head);
    headLine.getStyleClass().add(Looks.PANEL_HEAD);
    headLine.setWrapText(true);
    VBox content = new VBox(headLine, body);
    content.getStyleClass().add("dialog-said");
    pane.setContent(content);
    pane.getButtonTypes().addAll(buttons);
    dress(pane);
    Optional<ButtonType> taken = dialog.showAndWait();
    if (focusBefore != null) {
      focusBefore.requestFocus();
    }
    return taken;
  }

  /** A long sheet, which scrolls where it would stand out of the window. */
  ScrollPane sheet(Node sheet) {
    ScrollPane pane = new ScrollPane(sheet);
    pane.setFitToWidth(true);
    pane.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
    pane.setMaxHeight(owner.getHeight() * SHARE_OF_WINDOW);
    return pane;
  }

  private void dress(DialogPane pane) {
    ShellSheet.dress(pane.getScene(), settings.getValue());
    pane.lookupButton(pane.getButtonTypes().get(0)).getStyleClass().add(Looks.PRIMARY);
  }
}
