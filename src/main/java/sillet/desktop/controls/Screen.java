package sillet.desktop.controls;

import java.util.Map;
import javafx.scene.Node;
import javafx.scene.input.KeyCombination;

/** A place in the window. The node is made once. */
public interface Screen {
  /** What fills the window below the top line. */
  Node node();

  /** The node is in the window now: put the focus where the hand goes first. */
  void shown();

  /** Keys that work while this place is shown, wherever the focus is. */
  default Map<KeyCombination, Runnable> keys() {
    return Map.of();
  }

  /** Another place is about to be shown: last chance to keep a draft. */
  void left();
}
