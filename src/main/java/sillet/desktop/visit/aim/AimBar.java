package sillet.desktop.visit.aim;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import sillet.desktop.theme.Looks;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.VisitAim;

/** The switch between aims, and whether the nut can move. */
public final class AimBar extends FlowPane {
  private final AimModel model;
  private final Texts texts;
  private final Consumer<VisitAim> chosen;
  private final Map<AimChoice.Kind, ToggleButton> aims = new EnumMap<>(AimChoice.Kind.class);
  private final Map<NutMovable, ToggleButton> nuts = new EnumMap<>(NutMovable.class);
  private final TextField own = new TextField();
  private final Label said = new Label();

  /**
   * A switch.
   *
   * @param model what is chosen
   * @param texts the words
   * @param chosen called with every new choice
   */
  public AimBar(AimModel model, Texts texts, Consumer<VisitAim> chosen) {
    this.model = model;
    this.texts = texts;
    this.chosen = chosen;
    getStyleClass().add("aim-bar");
    getChildren().addAll(aimPart(), nutPart(), said);
    refresh();
  }

  private HBox aimPart() {
    ToggleGroup group = new ToggleGroup();
    HBox part = part(texts.say("visit.aim.head"), texts.say("visit.key.aim"));
    for (AimChoice.Kind kind : AimChoice.Kind.values()) {
      ToggleButton choice = choice("aim-" + kind.word(), name(kind), group);
      choice.setOnAction(pressed -> take(model.choose(kind)));
      aims.put(kind, choice);
      part.getChildren().add(choice);
    }
    part.getChildren().add(ownField());
    return part;
  }

  private HBox nutPart() {
    ToggleGroup group = new ToggleGroup();
    HBox part = part(texts.say("visit.aim.nut"), texts.say("visit.key.nut"));
    for (NutMovable nut : NutMovable.values()) {
      ToggleButton choice = choice("nut-" + nut.word(), name(nut), group);
      choice.setOnAction(pressed -> take(model.choose(nut)));
      nuts.put(nut, choice);
      part.getChildren().add(choice);
    }
    return part;
  }

  private static HBox part(String name, String key) {
    Label head = note(name);
    Label hint = note(key);
    hint.getStyleClass().add(Looks.KEY_HINT);
    HBox part = new HBox(head, hint);
    part.getStyleClass().add("terms");
    part.setAlignment(javafx.geometry.Pos.CENTER_LEFT);
    return part;
  }

  private static Label note(String text) {
    Label label = new Label(text);
    label.getStyleClass().add(Looks.NOTE);
    label.setMinWidth(Region.USE_PREF_SIZE);
    return label;
  }

  private static ToggleButton choice(String id, String name, ToggleGroup group) {
    ToggleButton choice = new ToggleButton(name);
    choice.setId(id);
    choice.getStyleClass().add(Looks.CHOICE);
    choice.setMinWidth(Region.USE_PREF_SIZE);
    choice.setToggleGroup(group);
    return choice;
  }

  private String name(AimChoice.Kind kind) {
    return switch (kind) {
      case OCTAVE -> texts.say("visit.aim.octave");
      case NECK -> texts.say("visit.aim.neck");
      case FRETS -> texts.say("visit.aim.frets");
    };
  }

  private String name(NutMovable nut) {
    return switch (nut) {
      case NO -> texts.say("visit.nut.no");
      case EACH -> texts.say("visit.nut.each");
      case WHOLE -> texts.say("visit.nut.whole");
    };
  }

  private Node ownField() {
    own.setId("aim-own");
    own.setAccessibleText(texts.say("visit.aim.own"));
    own.setMinWidth(Region.USE_PREF_SIZE);
    own.textProperty().bindBidirectional(model.own().typedProperty());
    own.setOnAction(entered -> take(model.choose(AimChoice.Kind.FRETS)));
    own.focusedProperty()
        .addListener(
            (property, before, now) -> {
              if (!now && model.aim().aim().kind() == AimChoice.Kind.FRETS) {
                take(model.choose(AimChoice.Kind.FRETS));
              }
            });
    return own;
  }

  private void take(Optional<VisitAim> wanted) {
    refresh();
    wanted.ifPresent(chosen);
  }

  /** The next aim in turn. */
  public void nextAim() {
    take(model.nextAim());
  }

  /** The next freedom of the nut in turn. */
  public void nextNut() {
    take(model.nextNut());
  }

  /** Shows what is chosen. */
  public void refresh() {
    aims.forEach((kind, choice) -> choice.setSelected(kind == model.aim().aim().kind()));
    nuts.forEach((nut, choice) -> choice.setSelected(nut == model.aim().nut()));
    Optional<Message> problem = model.own().problemProperty().get();
    own.pseudoClassStateChanged(Looks.ERROR, problem.isPresent());
    said.getStyleClass().setAll("label", problem.isPresent() ? Looks.ERROR_HEAD : Looks.NOTE);
    said.setText(problem.map(texts::say).orElse(""));
    said.setManaged(problem.isPresent());
  }
}
