package sillet.desktop.visit;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntConsumer;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.Region;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/** The passes of a visit to choose from, or the name of the only one. */
final class PassChoices {
  private PassChoices() {}

  static Node[] of(VisitModel model, Texts texts, IntConsumer look) {
    if (model.lastPass() == 1) {
      Label only = new Label(texts.say("visit.pass", "1"));
      only.getStyleClass().add(Looks.SOFT);
      return new Node[] {only};
    }
    List<Node> choices = new ArrayList<>();
    ToggleGroup group = new ToggleGroup();
    for (int pass = 1; pass <= model.lastPass(); pass++) {
      int wanted = pass;
      ToggleButton choice = new ToggleButton(texts.say("visit.pass", Integer.toString(pass)));
      choice.setId("pass-" + pass);
      choice.getStyleClass().addAll(Looks.CHOICE, "pass-choice");
      choice.setMinWidth(Region.USE_PREF_SIZE);
      choice.setToggleGroup(group);
      choice.setSelected(pass == model.pass());
      choice.setOnAction(pressed -> look.accept(wanted));
      choices.add(choice);
    }
    return choices.toArray(Node[]::new);
  }
}
