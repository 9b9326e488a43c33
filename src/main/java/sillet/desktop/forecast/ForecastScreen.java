package sillet.desktop.forecast;

import java.util.List;
import java.util.Map;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.StackPane;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.Screen;
import sillet.desktop.theme.Looks;
import sillet.logbook.forecast.Forecaster;
import sillet.logbook.strings.StringSet;
import sillet.logbook.text.Rejection;
import sillet.logbook.visits.InstrumentPast;
import sillet.logbook.visits.VisitRecord;

/** What a change would ask of the instrument of a visit. Nothing is saved here. */
public final class ForecastScreen implements Screen {
  private final Desk desk;
  private final int ticket;
  private final StackPane pane = new StackPane();
  private final Label waiting = new Label();
  private @Nullable ForecastPage page;
  private boolean shown;

  private record Read(VisitRecord record, InstrumentPast past, List<StringSet> drawer) {}

  /**
   * A forecast for what is on the instrument of a visit.
   *
   * @param desk of the window
   * @param ticket number of the visit
   */
  public ForecastScreen(Desk desk, int ticket) {
    this.desk = desk;
    this.ticket = ticket;
    waiting.getStyleClass().add(Looks.SOFT);
    pane.getChildren().add(waiting);
    desk.background().run(this::read, this::loaded, why -> waiting.setText(desk.texts().say(why)));
  }

  private Read read() {
    VisitRecord record =
        desk.logbook()
            .visits()
            .byTicket(ticket)
            .orElseThrow(() -> Rejection.of("visit.no-such", Integer.toString(ticket)));
    return new Read(
        record, desk.logbook().visits().past(record), desk.logbook().stringSets().all());
  }

  private void loaded(Read read) {
    var shop = desk.atBench().shop();
    Forecaster forecaster = new Forecaster(shop.breakingSharePercent());
    ForecastModel model =
        new ForecastModel(read.record().visit().strings(), shop.lengthUnit(), desk.texts());
    ForecastPage made =
        new ForecastPage(
            name(read.record()),
            model,
            read.drawer(),
            desk.texts(),
            change -> forecaster.ofVisit(read.record(), read.past(), change));
    page = made;
    pane.getChildren().setAll(made);
    if (shown) {
      begin(made);
    }
  }

  private String name(VisitRecord record) {
    return desk.texts().say("forecast.of", record.instrument().name(), Integer.toString(ticket));
  }

  @Override
  public Node node() {
    return pane;
  }

  @Override
  public void shown() {
    shown = true;
    if (page != null) {
      begin(page);
    }
  }

  /** A scroll pane takes its content in when it is styled; before that nothing can be lit. */
  private static void begin(ForecastPage made) {
    made.applyCss();
    made.layout();
    made.focus();
  }

  @Override
  public void left() {
    // nothing is kept: a forecast can be typed again in seconds
  }

  @Override
  public Map<KeyCombination, Runnable> keys() {
    return Map.of();
  }
}
