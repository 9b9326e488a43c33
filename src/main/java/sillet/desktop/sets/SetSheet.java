package sillet.desktop.sets;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.theme.Looks;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;

/** The chosen set: its tensions, the gauges of equal tension, or what strings are made of. */
final class SetSheet extends VBox {
  private enum View {
    TENSION,
    LADDER,
    MATERIALS
  }

  private final SetsModel model;
  private final Texts texts;
  private final Label name = new Label();
  private final Label said = new Label();
  private final Button copy;
  private final Button change;
  private final Button ladderSet;
  private final TermsLine terms;
  private final TensionTable table;
  private final LoadRows load;
  private final Label guessed = new Label();
  private final Label breaking = new Label();
  private final LadderView ladder;
  private final MaterialsView materials;
  private final Map<View, ToggleButton> choices = new EnumMap<>(View.class);
  private final double limitPercent;
  private final ScrollPane pane = new ScrollPane();
  private final VBox content = new VBox();
  private final VBox tensions;
  private View view = View.TENSION;
  private @Nullable SetEditor editor;

  /**
   * The sheet.
   *
   * @param model of the drawer
   * @param desk of the window
   * @param startCopy begins a copy of the chosen set
   * @param startChange begins a change of it
   * @param startLadder begins a set of the ladder's gauges
   */
  SetSheet(
      SetsModel model, Desk desk, Runnable startCopy, Runnable startChange, Runnable startLadder) {
    this.model = model;
    this.texts = desk.texts();
    this.limitPercent = desk.atBench().shop().breakingSharePercent();
    this.copy = KeyHint.button(texts.say("sets.copy"), texts.say("sets.copy-key"), startCopy);
    this.change =
        KeyHint.button(texts.say("sets.change-it"), texts.say("sets.change-key"), startChange);
    this.ladderSet = new Button(texts.say("sets.ladder-keep"));
    ladderSet.setId("ladder-set");
    ladderSet.setOnAction(pressed -> startLadder.run());
    double a4 = desk.atBench().shop().referenceHz();
    String reference = Figures.fixed(a4, a4 == Math.rint(a4) ? 0 : 1);
    this.terms = new TermsLine(model, texts, reference, this::show);
    this.table = new TensionTable(texts, limitPercent);
    this.load = new LoadRows(texts);
    this.ladder = new LadderView(texts);
    this.materials = new MaterialsView(texts);
    guessed.getStyleClass().add(Looks.NOTE);
    breaking.getStyleClass().add(Looks.NEEDS_HAND);
    for (Label sentence : List.of(guessed, breaking)) {
      sentence.setWrapText(true);
      sentence.setMinHeight(Region.USE_PREF_SIZE);
    }
    VBox.setVgrow(table, Priority.ALWAYS);
    this.tensions = new VBox(table, breaking, guessed, load);
    tensions.getStyleClass().add("tensions");
    said.setId("sets-said");
    said.setWrapText(true);
    layOut();
  }

  private void layOut() {
    name.setId("set-name");
    name.getStyleClass().add(Looks.PAGE_NAME);
    name.setMinWidth(0);
    copy.setId("copy-set");
    change.setId("change-set");
    Region between = new Region();
    HBox.setHgrow(between, Priority.ALWAYS);
    HBox head = new HBox(name, between, KeyHint.line(change, copy));
    head.getStyleClass().add("set-sheet-head");
    FlowPane views = new FlowPane();
    views.getStyleClass().add("choice-flow");
    ToggleGroup group = new ToggleGroup();
    for (View one : View.values()) {
      views.getChildren().add(choice(one, group));
    }
    Label key = new Label(texts.say("sets.view-key"));
    key.getStyleClass().add(Looks.KEY_HINT);
    views.getChildren().add(key);
    content.getChildren().addAll(head, terms, views);
    content.getStyleClass().add("set-content");
    pane.setFitToWidth(true);
    pane.setFitToHeight(true);
    pane.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
    pane.setContent(content);
    VBox.setVgrow(pane, Priority.ALWAYS);
    getStyleClass().addAll(Looks.PANEL, "set-sheet");
    setMinWidth(0);
    getChildren().addAll(said, pane);
  }

  private ToggleButton choice(View one, ToggleGroup group) {
    ToggleButton button = new ToggleButton(texts.say(key(one)));
    button.setId(key(one).replace('.', '-'));
    button.getStyleClass().add(Looks.CHOICE);
    button.setToggleGroup(group);
    button.setSelected(one == view);
    button.setOnAction(
        pressed -> {
          view = one;
          show();
        });
    choices.put(one, button);
    return button;
  }

  private static String key(View view) {
    return switch (view) {
      case TENSION -> "sets.view-tension";
      case LADDER -> "sets.view-ladder";
      case MATERIALS -> "sets.view-materials";
    };
  }

  /** Goes to the next view; true where the focus went into it. */
  boolean nextView() {
    if (editor == null) {
      view =
          switch (view) {
            case TENSION -> View.LADDER;
            case LADDER -> View.MATERIALS;
            case MATERIALS -> View.TENSION;
          };
      show();
      if (view == View.LADDER && model.figures().isPresent()) {
        applyCss();
        layout();
        ladder.focus();
        return true;
      }
    }
    return editor != null;
  }

  /** Shows the model as it now is. */
  void show() {
    Optional<StringSet> chosen = model.chosenProperty().get();
    said.setText(
        model
            .troubleProperty()
            .get()
            .map(texts::say)
            .orElse(chosen.isEmpty() ? texts.say("sets.empty") : ""));
    boolean speaks = editor == null && !said.getText().isEmpty();
    shows(said, speaks);
    shows(pane, editor == null && !speaks);
    choices.forEach((one, button) -> button.setSelected(one == view));
    name.setText(chosen.map(StringSet::name).orElse(""));
    Node part = part();
    if (content.getChildren().size() > 3) {
      content.getChildren().remove(3);
    }
    content.getChildren().add(part);
    VBox.setVgrow(part, Priority.ALWAYS);
    shows(terms, view != View.MATERIALS);
  }

  private Node part() {
    Optional<SetFigures> figures = model.figures();
    if (view == View.MATERIALS) {
      return materials;
    }
    if (figures.isEmpty()) {
      Label wait = new Label(texts.say("sets.no-terms"));
      wait.getStyleClass().add(Looks.SENTENCE);
      return wait;
    }
    if (view == View.LADDER) {
      ladder.show(figures);
      VBox both = new VBox(ladder, ladderSet);
      both.getStyleClass().add("tensions");
      return both;
    }
    Optional<SetFigures> compared = model.comparedFigures();
    table.show(figures.get(), compared);
    load.show(figures.get(), compared);
    guesses(figures.get());
    nearBreaking(figures.get());
    return tensions;
  }

  private void guesses(SetFigures figures) {
    List<String> sentences = new ArrayList<>();
    if (figures.strings().stream().anyMatch(one -> one.massGuessed() || one.coreGuessed())) {
      sentences.add(texts.say("sets.guessed"));
    }
    boolean own =
        figures.strings().stream()
            .anyMatch(one -> one.string().scaleMm() < figures.strings().get(0).string().scaleMm());
    if (own) {
      sentences.add(texts.say("sets.short-string"));
    }
    if (figures.balance().isEmpty()) {
      sentences.add(texts.say("sets.no-tension"));
    }
    guessed.setText(String.join(" ", sentences));
    shows(guessed, !sentences.isEmpty());
  }

  private void nearBreaking(SetFigures figures) {
    List<String> numbers = new ArrayList<>();
    for (StringFigures one : figures.strings()) {
      if (one.breakingPercent().orElse(0) > limitPercent) {
        numbers.add(Integer.toString(one.string().number()));
      }
    }
    breaking.setText(
        numbers.isEmpty()
            ? ""
            : texts.say(
                "sets.near-breaking", String.join(", ", numbers), Figures.fixed(limitPercent, 0)));
    shows(breaking, !numbers.isEmpty());
  }

  /** The chosen set in the nearest usual gauges; where there is none, as it is. */
  List<StringMake> ladderMakes() {
    List<StringMake> makes = new ArrayList<>();
    for (LadderLine line : ladder.lines()) {
      StringMake now = line.now().string().make();
      double gauge = line.usualIn().orElse(now.gaugeIn());
      boolean same = Figures.gauge(gauge).equals(Figures.gauge(now.gaugeIn()));
      makes.add(same ? now : StringMake.of(gauge, now.construction()));
    }
    return makes;
  }

  /** Puts the fields of a set in place of the sheet. */
  void edit(SetEditorModel set, Runnable keep, Runnable leave) {
    SetEditor fields = new SetEditor(set, texts, keep, leave);
    editor = fields;
    ScrollPane scroll = new ScrollPane(fields);
    scroll.setFitToWidth(true);
    scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
    VBox.setVgrow(scroll, Priority.ALWAYS);
    getChildren().setAll(said, pane, scroll);
    show();
    // what lies in a scroll pane can take the focus once it is laid out
    applyCss();
    layout();
    fields.focus();
  }

  void endEdit() {
    editor = null;
    getChildren().setAll(said, pane);
    show();
  }

  void focusEditor() {
    SetEditor fields = editor;
    if (fields != null) {
      fields.focus();
    }
  }

  void focusFirstProblem() {
    SetEditor fields = editor;
    if (fields != null) {
      fields.focusProblem();
    }
  }

  private static void shows(Node node, boolean visible) {
    node.setVisible(visible);
    node.setManaged(visible);
  }
}
