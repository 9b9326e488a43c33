package sillet.desktop.sets;

import java.util.DoubleSummaryStatistics;
import java.util.function.Predicate;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.theme.Looks;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;

/** A set in the list: its name, from which gauge to which, how many strings, and if compared. */
final class SetCell extends ListCell<StringSet> {
  private final Texts texts;
  private final Predicate<StringSet> isCompared;
  private final Label name = new Label();
  private final Label gauges = new Label();
  private final Label count = new Label();
  private final VBox lines;

  SetCell(Texts texts, Predicate<StringSet> isCompared) {
    this.texts = texts;
    this.isCompared = isCompared;
    gauges.getStyleClass().add(Looks.NOTE);
    count.getStyleClass().add(Looks.NOTE);
    this.lines = new VBox(name, apart(gauges, count));
    lines.getStyleClass().add("set-cell-lines");
    lines.setMinWidth(0);
    setPrefWidth(0);
  }

  @Override
  protected void updateItem(@Nullable StringSet set, boolean empty) {
    super.updateItem(set, empty);
    if (empty || set == null) {
      setGraphic(null);
      return;
    }
    boolean compared = isCompared.test(set);
    name.setText(set.name());
    name.getStyleClass().setAll("label");
    if (compared || isSelected()) {
      name.getStyleClass().add(Looks.STRONG);
    }
    int strings = set.strings().size();
    gauges.setText(strings == 0 ? "" : range(set));
    String many =
        strings == 1
            ? texts.say("sets.one-string")
            : texts.say("sets.strings", Integer.toString(strings));
    count.setText(compared ? texts.say("sets.compared") : many);
    setGraphic(lines);
    setAccessibleText(
        String.join(", ", name.getText(), gauges.getText(), many, compared ? count.getText() : ""));
  }

  private static String range(StringSet set) {
    DoubleSummaryStatistics gauges =
        set.strings().stream().mapToDouble(StringMake::gaugeIn).summaryStatistics();
    return Figures.gauge(gauges.getMin()) + " \u2013 " + Figures.gauge(gauges.getMax());
  }

  private static HBox apart(Label start, Label end) {
    Region between = new Region();
    HBox.setHgrow(between, Priority.ALWAYS);
    start.setMinWidth(0);
    end.setMinWidth(Region.USE_PREF_SIZE);
    HBox line = new HBox(start, between, end);
    line.getStyleClass().add("apart-line");
    return line;
  }
}
