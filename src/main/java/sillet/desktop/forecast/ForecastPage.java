package sillet.desktop.forecast;

import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Function;
import javafx.application.Platform;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Narrow;
import sillet.desktop.theme.Looks;
import sillet.logbook.forecast.InstrumentChange;
import sillet.logbook.forecast.InstrumentForecast;
import sillet.logbook.strings.StringSet;
import sillet.logbook.text.Rejection;
import sillet.logbook.text.Texts;

/** The page of a forecast: what changes above, what that asks for beside each string and below. */
final class ForecastPage extends ScrollPane {
  private static final String SHEET = sheet();

  private final ForecastModel model;
  private final Texts texts;
  private final Function<InstrumentChange, InstrumentForecast> forecaster;
  private final ForecastWords words;
  private final ForecastTable table;
  private final ForecastPanels panels;
  private final Label wrong = new Label();
  private @Nullable InstrumentChange shown;
  private boolean due;

  /**
   * A page.
   *
   * @param of the instrument, as named
   * @param model what is typed
   * @param drawer the sets one has
   * @param texts the words
   * @param forecaster reckons a change
   */
  ForecastPage(
      String of,
      ForecastModel model,
      List<StringSet> drawer,
      Texts texts,
      Function<InstrumentChange, InstrumentForecast> forecaster) {
    this.model = model;
    this.texts = texts;
    this.forecaster = forecaster;
    this.words = new ForecastWords(texts);
    VBox page = new VBox();
    Narrow narrow = new Narrow(page);
    this.table = new ForecastTable(model, texts, narrow.narrowProperty(), this::changed);
    this.panels = new ForecastPanels(texts, narrow.narrowProperty());
    wrong.getStyleClass().add(Looks.ERROR_HEAD);
    wrong.setWrapText(true);
    ForecastTerms terms = new ForecastTerms(model, drawer, texts, this::changed);
    VBox changes = new VBox(head(of), terms, wrong, table);
    changes.getStyleClass().addAll(Looks.PANEL, "forecast-changes");
    page.getChildren().addAll(changes, panels.node(), narrow.measure());
    page.getStyleClass().addAll(Looks.PAGE, "forecast-page");
    setContent(page);
    setFitToWidth(true);
    setHbarPolicy(ScrollBarPolicy.NEVER);
    getStylesheets().add(SHEET);
    getStyleClass().add("forecast-pane");
    look();
  }

  private static String sheet() {
    var place = ForecastPage.class.getResource("/sillet/desktop/forecast.css");
    return Objects.requireNonNull(place, "forecast.css is missing from the program")
        .toExternalForm();
  }

  private HBox head(String of) {
    Label name = new Label(texts.say("forecast.forecast"));
    name.getStyleClass().add(Looks.PAGE_NAME);
    name.setMinWidth(USE_PREF_SIZE);
    Label what = new Label(of);
    what.getStyleClass().add(Looks.STRONG);
    Label before = new Label(texts.say("forecast.before"));
    before.getStyleClass().add(Looks.SOFT);
    before.setMinWidth(0);
    HBox line = new HBox(name, what, before);
    line.getStyleClass().add("forecast-head");
    return line;
  }

  /** Several fields may change at once, as with a tuning: they are reckoned once. */
  private void changed() {
    if (!due) {
      due = true;
      Platform.runLater(this::look);
    }
  }

  /** Reckons anew, if something that can be read has changed. */
  private void look() {
    due = false;
    Optional<InstrumentChange> change = model.change();
    wrong.setText(model.problem().map(texts::say).orElse(""));
    wrong.setManaged(!wrong.getText().isEmpty());
    if (change.isPresent() && !change.get().equals(shown)) {
      shown = change.get();
      reckon(change.get());
    }
  }

  /** A string that cannot be so is named; what was reckoned before stays. */
  private void reckon(InstrumentChange change) {
    try {
      InstrumentForecast forecast = forecaster.apply(change);
      table.show(forecast, words);
      panels.show(forecast, words);
    } catch (Rejection rejected) {
      wrong.setText(texts.say(rejected.reason()));
      wrong.setManaged(true);
    }
  }

  /** Puts the focus where one begins. */
  void focus() {
    table.focus();
  }
}
