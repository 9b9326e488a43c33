package sillet.desktop.controls;

import javafx.scene.Node;

/** A place in the window. The node is made once. */
public interface Screen {
  /** What fills the window below the top line. */
  Node node();

  /** The node is in the window now: put the focus where the hand goes first. */
  void shown();

  /** Another place is about to be shown: last chance to keep a draft. */
  void left();
}
