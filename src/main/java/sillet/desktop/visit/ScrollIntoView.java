package sillet.desktop.visit;

import javafx.geometry.Bounds;
import javafx.scene.Node;
import javafx.scene.control.ScrollPane;

/** Brings what has the focus into view: a keyboard walk may not end out of sight. */
final class ScrollIntoView {
  private static final double MARGIN_PX = 16;

  private ScrollIntoView() {}

  static void show(ScrollPane pane, Node node) {
    Node content = pane.getContent();
    if (content == null || !inside(content, node)) {
      return;
    }
    Bounds place = content.sceneToLocal(node.localToScene(node.getBoundsInLocal()));
    double window = pane.getViewportBounds().getHeight();
    double over = content.getBoundsInLocal().getHeight() - window;
    if (over <= 0) {
      return;
    }
    double top = pane.getVvalue() * over;
    if (place.getMinY() < top) {
      pane.setVvalue(Math.max(0, place.getMinY() - MARGIN_PX) / over);
    } else if (place.getMaxY() > top + window) {
      pane.setVvalue(Math.min(over, place.getMaxY() + MARGIN_PX - window) / over);
    }
  }

  private static boolean inside(Node content, Node node) {
    for (Node at = node; at != null; at = at.getParent()) {
      if (at == content) {
        return true;
      }
    }
    return false;
  }
}
