package sillet.desktop.bench;

import java.time.LocalDate;
import java.util.List;
import javafx.css.PseudoClass;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Days;
import sillet.desktop.controls.Narrow;
import sillet.desktop.drawing.Mark;
import sillet.desktop.drawing.MarkShape;
import sillet.desktop.drawing.StringTally;
import sillet.desktop.theme.Looks;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.text.Texts;

/** A row of the bench, with the day in the margin where a new one begins. */
final class BenchCell extends ListCell<BenchRow> {
  private static final PseudoClass OPENS_GROUP = PseudoClass.getPseudoClass("opens-group");

  private final BenchModel model;
  private final Texts texts;
  private final Narrow narrow;
  private final Label groupHead = new Label();
  private final Label groupDay = new Label();
  private final Label ticket = new Label();
  private final Label instrument = new Label();
  private final Label kind = new Label();
  private final Label customer = new Label();
  private final Label asked = new Label();
  private final StringTally tally = new StringTally(List.of(), "");
  private final Mark mark = new Mark(MarkShape.NOT_YET, "");
  private final Label next = new Label();
  private final HBox line;

  BenchCell(BenchModel model, Texts texts, Narrow narrow) {
    this.model = model;
    this.texts = texts;
    this.narrow = narrow;
    groupDay.getStyleClass().add(Looks.NOTE);
    ticket.getStyleClass().addAll(Looks.STRONG, "bench-ticket");
    HBox number = new HBox(ticket);
    kind.getStyleClass().add(Looks.NOTE);
    asked.getStyleClass().add(Looks.CUSTOMER_WORDS);
    asked.setWrapText(true);
    VBox margin = new VBox(groupHead, groupDay);
    margin.getStyleClass().add("bench-margin");
    HBox strings = new HBox(tally);
    HBox asks = new HBox(mark, next);
    HBox row =
        BenchColumns.row(
            narrow, number, new VBox(instrument, kind), customer, asked, strings, asks);
    row.getStyleClass().addAll("bench-row", "bench-sheet");
    HBox.setHgrow(row, Priority.ALWAYS);
    this.line = new HBox(margin, row);
    line.setMinWidth(0);
    setPrefWidth(0);
    narrow.narrowProperty().addListener((property, before, now) -> under());
  }

  @Override
  protected void updateItem(@Nullable BenchRow row, boolean empty) {
    super.updateItem(row, empty);
    if (empty || row == null) {
      setGraphic(null);
      return;
    }
    boolean opens = model.opensGroup(getIndex());
    pseudoClassStateChanged(OPENS_GROUP, opens);
    group(row, opens);
    ticket.setText(Integer.toString(row.ticket()));
    instrument.setText(row.visit().instrument().name());
    customer.setText(row.customer());
    asked.setText(row.request());
    under();
    next(row);
    setGraphic(line);
    setAccessibleText(
        texts.say(
            "bench.row", ticket.getText(), instrument.getText(), row.customer(), next.getText()));
  }

  /** The second line under the instrument: its kind, and where there is no column its customer. */
  private void under() {
    BenchRow row = getItem();
    if (row == null) {
      return;
    }
    Instrument what = row.visit().instrument();
    String kindWord = texts.say(what.kind().key());
    boolean both = narrow.narrowProperty().get() && !row.customer().isEmpty();
    kind.setText(both ? row.customer() : kindWord);
  }

  private void group(BenchRow row, boolean opens) {
    DayGroup group = row.group();
    boolean late = group.kind() == DayGroup.Kind.LATE;
    groupHead.getStyleClass().setAll("label", late ? Looks.NEEDS_HAND : Looks.STRONG, "bench-day");
    LocalDate day = group.day();
    String near = day == null ? "" : Days.near(day);
    groupHead.setText(
        switch (group.kind()) {
          case LATE -> texts.say("bench.late");
          case TODAY -> texts.say("bench.today");
          case TOMORROW -> texts.say("bench.tomorrow");
          case THIS_WEEK -> day == null ? "" : Days.weekday(day);
          case LATER -> texts.say("bench.later");
          case NO_DAY -> texts.say("bench.no-day");
        });
    groupDay.setText(
        switch (group.kind()) {
          case LATE, LATER -> texts.say("bench.from", near);
          case TODAY, TOMORROW, THIS_WEEK -> near;
          case NO_DAY -> "";
        });
    groupHead.setVisible(opens);
    groupDay.setVisible(opens);
  }

  private void next(BenchRow row) {
    StringState asks = row.next();
    String word =
        switch (asks) {
          case UNREAD ->
              row.count(StringState.UNREAD) == row.strings().size()
                  ? texts.say("bench.read")
                  : texts.say("bench.read-more", Integer.toString(row.count(asks)));
          case READ_AGAIN -> texts.say("bench.read-again", Integer.toString(row.count(asks)));
          case OFF -> texts.say("bench.off", Integer.toString(row.count(asks)));
          case NEAR -> texts.say("bench.hand-out");
        };
    MarkShape shape =
        switch (asks) {
          case UNREAD -> MarkShape.NOT_YET;
          case READ_AGAIN -> MarkShape.READ_AGAIN;
          case OFF -> MarkShape.MOVE;
          case NEAR -> MarkShape.DONE;
        };
    mark.show(shape, word);
    next.setText(word);
    boolean hand = asks == StringState.OFF || asks == StringState.READ_AGAIN;
    next.getStyleClass().setAll("label", hand ? Looks.NEEDS_HAND : Looks.TIGHT);
    tally.show(row.strings().stream().map(BenchCell::tallied).toList(), word);
  }

  private static StringTally.State tallied(StringState state) {
    return switch (state) {
      case UNREAD -> StringTally.State.UNREAD;
      case READ_AGAIN -> StringTally.State.STALE;
      case OFF -> StringTally.State.TO_MOVE;
      case NEAR -> StringTally.State.DONE;
    };
  }
}
