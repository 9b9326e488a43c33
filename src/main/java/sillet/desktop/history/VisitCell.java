package sillet.desktop.history;

import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Days;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.VisitRecord;

/** A visit in the list: day and ticket, what was done, by whom. */
final class VisitCell extends ListCell<VisitRecord> {
  private final Texts texts;
  private final HistoryWords words;
  private final Label day = new Label();
  private final Label ticket = new Label();
  private final Label done = new Label();
  private final Label who = new Label();
  private final Label state = new Label();
  private final VBox lines;

  VisitCell(Texts texts, HistoryWords words) {
    this.texts = texts;
    this.words = words;
    day.getStyleClass().add(Looks.STRONG);
    done.getStyleClass().add(Looks.TIGHT);
    who.getStyleClass().add(Looks.NOTE);
    this.lines = new VBox(apart(day, ticket), done, apart(who, state));
    lines.setMinWidth(0);
    setPrefWidth(0);
  }

  @Override
  protected void updateItem(@Nullable VisitRecord visit, boolean empty) {
    super.updateItem(visit, empty);
    if (empty || visit == null) {
      setGraphic(null);
      return;
    }
    day.setText(Days.full(visit.visit().arrival().takenIn()));
    ticket.setText(Integer.toString(visit.visit().ticket()));
    done.setText(words.done(visit));
    who.setText(visit.visit().arrival().takenInBy());
    boolean open = visit.visit().handedOut() == null;
    state.getStyleClass().setAll("label", open ? Looks.TIGHT : Looks.NOTE);
    state.setText(open ? texts.say("history.on-bench") : texts.say("history.handed-out"));
    setGraphic(lines);
    setAccessibleText(String.join(", ", day.getText(), ticket.getText(), done.getText()));
  }

  private static HBox apart(Label start, Label end) {
    Region between = new Region();
    HBox.setHgrow(between, Priority.ALWAYS);
    start.setMinWidth(0);
    end.setMinWidth(Region.USE_PREF_SIZE);
    return new HBox(start, between, end);
  }
}
