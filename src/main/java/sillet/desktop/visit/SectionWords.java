package sillet.desktop.visit;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.Label;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import sillet.desktop.drawing.Mark;
import sillet.desktop.theme.Looks;

/** One line of words that name the parts of the page, say how far each is, and lead there. */
final class SectionWords extends FlowPane {
  private final List<Section> sections;
  private final List<Button> buttons = new ArrayList<>();
  private final Map<Integer, Section.State> shown = new HashMap<>();

  SectionWords(List<Section> sections) {
    this.sections = List.copyOf(sections);
    getStyleClass().add("section-words");
    for (Section section : sections) {
      Button button = new Button(section.name());
      button.setId("section-" + section.id());
      button.getStyleClass().add(Looks.SECTION_WORD);
      button.setContentDisplay(ContentDisplay.RIGHT);
      button.setMinWidth(USE_PREF_SIZE);
      button.setOnAction(pressed -> section.focus().run());
      buttons.add(button);
    }
    getChildren().addAll(buttons);
  }

  /**
   * Says how far each part is.
   *
   * @param brief only what needs a hand keeps its count
   */
  void refresh(boolean brief) {
    for (int i = 0; i < buttons.size(); i++) {
      Section.State state = sections.get(i).state().now().brief(brief);
      if (state.equals(shown.put(i, state))) {
        continue;
      }
      Label count = new Label(state.count());
      count.getStyleClass().add(state.needsHand() ? Looks.NEEDS_HAND_NOTE : Looks.NOTE);
      HBox behind = new HBox(Mark.small(state.mark(), ""));
      if (!state.count().isEmpty()) {
        behind.getChildren().add(count);
      }
      behind.getStyleClass().add("section-state");
      behind.setAlignment(Pos.CENTER_LEFT);
      buttons.get(i).setGraphic(behind);
      buttons.get(i).setAccessibleText(sections.get(i).name() + " " + state.count());
    }
  }

  /** Marks the part the focus is in. */
  void current(Node focused) {
    for (int i = 0; i < buttons.size(); i++) {
      boolean inside = holds(sections.get(i).node(), focused);
      buttons.get(i).pseudoClassStateChanged(Looks.CURRENT, inside);
    }
  }

  /** Puts the focus into the next part, or the one before. */
  void walk(Node focused, int step) {
    int at = 0;
    for (int i = 0; i < sections.size(); i++) {
      if (holds(sections.get(i).node(), focused)) {
        at = i + step;
      }
    }
    sections.get(Math.floorMod(at, sections.size())).focus().run();
  }

  private static boolean holds(Node part, Node focused) {
    for (Node node = focused; node != null; node = node.getParent()) {
      if (node == part) {
        return true;
      }
    }
    return false;
  }
}
