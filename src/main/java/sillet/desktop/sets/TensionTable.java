package sillet.desktop.sets;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import javafx.application.Platform;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.drawing.NoteName;
import sillet.desktop.theme.Looks;
import sillet.logbook.strings.ConstructionWords;
import sillet.logbook.strings.StringMake;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;

/** A set string by string: how it is made and how hard it pulls, beside a compared set. */
final class TensionTable extends VBox {
  private static final int FEW_STRINGS = 8;
  private static final double ROOM_EM = 3.9;
  private static final double TIGHT_ROOM_EM = 2.3;

  private final Texts texts;
  private final double limitPercent;
  private final Label measure = new Label();
  private Runnable again = () -> {};

  /**
   * An empty table.
   *
   * @param texts the words
   * @param limitPercent share of breaking from which a string is flagged
   */
  TensionTable(Texts texts, double limitPercent) {
    this.texts = texts;
    this.limitPercent = limitPercent;
    getStyleClass().add("tension-table");
    measure.setManaged(false);
    measure.setVisible(false);
    getChildren().add(measure);
    // not at once: the style sheets are being applied, and would miss what is made anew
    measure
        .fontProperty()
        .addListener(
            (property, before, now) -> {
              if (before.getSize() != now.getSize()) {
                Platform.runLater(again);
              }
            });
  }

  /** Shows a set and, where there is one, the set it is compared with. */
  void show(SetFigures figures, Optional<SetFigures> compared) {
    again = () -> show(figures, compared);
    getChildren().setAll(measure);
    double most = Math.max(figures.mostN(), compared.map(SetFigures::mostN).orElse(0.0));
    TensionScale scale = TensionScale.over(Math.max(most, figures.equalN().orElse(0)));
    double thickest =
        figures.set().strings().stream().mapToDouble(StringMake::gaugeIn).max().orElse(0);
    boolean few = figures.strings().size() <= FEW_STRINGS;
    double em = measure.getFont().getSize();
    int factor = SectionMark.factor(thickest, (few ? ROOM_EM : TIGHT_ROOM_EM) * em);
    getChildren().add(head(figures, scale, factor));
    for (StringFigures one : figures.strings()) {
      Optional<StringFigures> beside = compared.flatMap(set -> place(set, one.string().number()));
      TensionBars.Values values =
          new TensionBars.Values(
              one.tensionN(),
              beside.map(StringFigures::tensionN).orElse(OptionalDouble.empty()),
              beside.map(other -> Figures.gauge(other.string().make().gaugeIn())).orElse(""),
              figures.equalN());
      HBox row = row(one, beside, new SectionMark(gauge(one), section(one), factor), scale, values);
      row.getStyleClass().add(few ? "set-row" : "set-row-tight");
      VBox.setVgrow(row, Priority.ALWAYS);
      getChildren().add(row);
    }
    HBox foot = new HBox(new HBox(), grown(new TensionAxis(scale)), new HBox());
    foot.getChildren().get(0).getStyleClass().add("set-left");
    foot.getChildren().get(2).getStyleClass().add("set-right");
    foot.getStyleClass().add("set-foot");
    getChildren().add(foot);
  }

  private static Optional<StringFigures> place(SetFigures set, int number) {
    List<StringFigures> strings = set.strings();
    return number <= strings.size() ? Optional.of(strings.get(number - 1)) : Optional.empty();
  }

  private static double gauge(StringFigures one) {
    return one.string().make().gaugeIn();
  }

  /** A wound string whose core nobody knows is drawn with a core of half its gauge. */
  private static OptionalDouble section(StringFigures one) {
    boolean wound = ConstructionWords.wound(one.string().make().construction());
    return wound && one.coreIn().isEmpty() ? OptionalDouble.of(gauge(one) / 2) : one.coreIn();
  }

  private HBox head(SetFigures figures, TensionScale scale, int factor) {
    HBox left =
        new HBox(
            cell("set-string", note(texts.say("sets.string"))),
            cell("set-section", note(texts.say("sets.times", Integer.toString(factor)))),
            cell("set-gauge", note(texts.say("sets.gauge-in"))),
            cell("set-made", note("")),
            cell("set-core", note(texts.say("sets.core-in"))),
            cell("set-mass", note(texts.say("sets.mass"))));
    left.getStyleClass().add("set-left");
    String equal =
        figures.equalN().isPresent()
            ? texts.say("sets.equal", Figures.fixed(figures.equalN().getAsDouble(), 1))
            : "";
    TensionHead bars =
        new TensionHead(scale, texts.say("sets.tension"), equal, figures.equalN().orElse(0));
    HBox right =
        new HBox(
            cell("set-tension", note(texts.say("sets.newton"))),
            cell("set-breaking", note(texts.say("sets.of-breaking"))));
    right.getStyleClass().add("set-right");
    HBox head = new HBox(left, grown(bars), right);
    head.getStyleClass().add("set-head");
    return head;
  }

  private HBox row(
      StringFigures one,
      Optional<StringFigures> beside,
      SectionMark section,
      TensionScale scale,
      TensionBars.Values values) {
    StringMake make = one.string().make();
    Label number = new Label(Integer.toString(one.string().number()));
    number.getStyleClass().add(Looks.STRONG);
    Label gauge = new Label(Figures.gauge(make.gaugeIn()));
    gauge.getStyleClass().addAll(Looks.STRONG, "set-gauge-figure");
    HBox left =
        new HBox(
            cell("set-string", number, new NoteName(one.string().pitch().typed(), false)),
            cell("set-section", section),
            cell("set-gauge", gauge),
            cell("set-made", new Label(made(make))),
            cell("set-core", guess(core(one), one.coreGuessed())),
            cell("set-mass", guess(Figures.fixed(one.massGPerM(), 2), one.massGuessed())));
    left.getStyleClass().add("set-left");
    TensionBars bars = new TensionBars(scale, values);
    HBox right =
        new HBox(
            cell("set-tension", tension(one, beside)), cell("set-breaking", breaking(one, beside)));
    right.getStyleClass().add("set-right");
    HBox row = new HBox(left, grown(bars), right);
    row.setAccessibleText(said(one));
    return row;
  }

  private static String made(StringMake make) {
    return ConstructionWords.of(make.construction()).replace('-', ' ');
  }

  /** An en dash where a plain string has none, a blank where it is not known. */
  private static String core(StringFigures one) {
    if (!ConstructionWords.wound(one.string().make().construction())) {
      return "\u2013";
    }
    return one.coreIn().isPresent()
        ? Figures.gauge(Math.round(one.coreIn().getAsDouble() * 1e3) / 1e3)
        : "";
  }

  private static Label guess(String figure, boolean guessed) {
    boolean marked = guessed && !figure.isEmpty() && !figure.equals("\u2013");
    Label label = new Label(marked ? "~" + figure : figure);
    if (marked) {
      label.getStyleClass().add(Looks.SOFT);
    }
    return label;
  }

  private VBox tension(StringFigures one, Optional<StringFigures> beside) {
    Label now = new Label(newtons(one.tensionN()));
    now.getStyleClass().addAll(Looks.STRONG, "set-gauge-figure");
    return pair(now, beside.map(other -> newtons(other.tensionN())));
  }

  private VBox breaking(StringFigures one, Optional<StringFigures> beside) {
    Function<StringFigures, String> percent =
        string ->
            string.breakingPercent().isPresent()
                ? Figures.fixed(string.breakingPercent().getAsDouble(), 0) + "\u00a0%"
                : "";
    Label now = new Label(percent.apply(one));
    if (one.breakingPercent().orElse(0) > limitPercent) {
      now.getStyleClass().add(Looks.NEEDS_HAND);
    }
    return pair(now, beside.map(percent));
  }

  private static VBox pair(Label now, Optional<String> other) {
    VBox both = new VBox(now);
    other.ifPresent(
        text -> {
          Label below = new Label(text);
          below.getStyleClass().add(Looks.NOTE);
          both.getChildren().add(below);
        });
    both.getStyleClass().add("set-pair");
    both.getChildren().forEach(label -> ((Region) label).setMinWidth(Region.USE_PREF_SIZE));
    return both;
  }

  private static String newtons(OptionalDouble tensionN) {
    return tensionN.isPresent() ? Figures.fixed(tensionN.getAsDouble(), 1) : "\u2013";
  }

  private String said(StringFigures one) {
    return texts.say(
        "sets.string-said",
        Integer.toString(one.string().number()),
        one.string().pitch().typed(),
        Figures.gauge(gauge(one)),
        made(one.string().make()),
        newtons(one.tensionN()));
  }

  private static Label note(String text) {
    Label label = new Label(text);
    label.getStyleClass().add(Looks.NOTE);
    label.setMinWidth(Region.USE_PREF_SIZE);
    return label;
  }

  private static HBox cell(String styleClass, Node... nodes) {
    HBox cell = new HBox(nodes);
    cell.getStyleClass().addAll("set-cell", styleClass);
    return cell;
  }

  private static Node grown(Region drawing) {
    HBox.setHgrow(drawing, Priority.ALWAYS);
    return drawing;
  }
}
