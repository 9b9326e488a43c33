package sillet.desktop.shell;

import java.util.ArrayList;
import java.util.List;
import javafx.geometry.Bounds;
import javafx.geometry.Orientation;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javafx.scene.control.Labeled;
import javafx.scene.control.ScrollBar;
import javafx.scene.text.Text;

/** Finds what is not where it can be read: outside the window, or cut although it is a heading. */
final class Misplaced {
  private final Scene scene;
  private final List<String> found = new ArrayList<>();

  private Misplaced(Scene scene) {
    this.scene = scene;
  }

  static List<String> in(Scene scene) {
    Misplaced misplaced = new Misplaced(scene);
    misplaced.look(scene.getRoot());
    return misplaced.found;
  }

  private void look(Node node) {
    if (!node.isVisible()) {
      return;
    }
    if (node instanceof ScrollBar bar && bar.getOrientation() == Orientation.HORIZONTAL) {
      found.add("level scroll bar in " + bar.getParent());
    }
    if (node instanceof Labeled labeled && labeled.getText() != null) {
      if (!labeled.getText().isEmpty()) {
        inside(labeled);
        whole(labeled);
      }
    }
    if (node instanceof Parent parent) {
      parent.getChildrenUnmodifiable().forEach(this::look);
    }
  }

  private void inside(Labeled labeled) {
    Bounds bounds = labeled.localToScene(labeled.getLayoutBounds());
    if (bounds.getMinX() < -1 || bounds.getMaxX() > scene.getWidth() + 1) {
      found.add("outside: " + labeled.getText() + " at " + bounds);
    }
  }

  /** Only what people typed may be cut short in a row: a name, a request, facts. */
  private void whole(Labeled labeled) {
    boolean mayBeCut = labeled.getText().length() > 24;
    for (Node child : labeled.getChildrenUnmodifiable()) {
      if (child instanceof Text drawn && !drawn.getText().equals(labeled.getText()) && !mayBeCut) {
        found.add("cut: " + labeled.getText() + " to " + drawn.getText());
      }
    }
  }
}
