package sillet.desktop.visit;

import javafx.scene.Node;
import sillet.desktop.drawing.MarkShape;

/**
 * A part of the page as the line of words names it.
 *
 * @param id in the style of an identifier
 * @param name in words
 * @param node what it is
 * @param focus puts the focus into it
 * @param state where it stands now
 */
record Section(String id, String name, Node node, Runnable focus, StateOf state) {

  /** How far a part is. */
  interface StateOf {
    State now();
  }

  /**
   * How far a part is.
   *
   * @param mark drawn behind its name
   * @param count in words; may be empty
   * @param needsHand in pencil
   */
  record State(MarkShape mark, String count, boolean needsHand) {

    /** Without its count, unless that needs a hand. */
    State brief(boolean wanted) {
      return wanted && !needsHand ? new State(mark, "", false) : this;
    }
  }
}
