package sillet.desktop.shell;

import java.time.Clock;
import java.util.Optional;
import java.util.function.UnaryOperator;
import javafx.scene.Scene;
import javafx.stage.Stage;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Ask;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.GoTo;
import sillet.desktop.controls.Screen;
import sillet.desktop.start.ShopScreen;
import sillet.desktop.start.StartModel;
import sillet.desktop.start.StartScreen;
import sillet.desktop.start.TroubleScreen;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.store.engine.LogbookProblem;
import sillet.store.place.LogbookPlace;

/** The window: one logbook at a time, one place at a time. Everything here runs on its thread. */
final class ShopWindow implements Doors.House, Keys.Does {
  private static final double WIDTH_EM = 91.4;
  private static final double HEIGHT_EM = 57.1;

  private final Stage stage;
  private final Clock clock;
  private final Texts texts = Texts.english();
  private final WindowFrame frame = new WindowFrame(texts);
  private final SaveSignModel sign;
  private final WorkThread work;
  private final Unexpected unexpected;
  private final KeySheet keySheet;
  private final WindowLook look;
  private final Ask ask;
  private final Keys keys;
  private final Logbooks logbooks;
  private final Doors doors;
  private @Nullable Screen screen;
  private @Nullable Navigator navigator;
  private @Nullable StartModel startModel;
  private boolean closing;

  /**
   * Builds the window, not shown yet.
   *
   * @param stage to stand on
   * @param own where the shop's logbook lies or will lie
   * @param clock with the shop's time zone
   * @param asking the ask to use in place of the system's
   */
  ShopWindow(Stage stage, LogbookPlace own, Clock clock, UnaryOperator<Ask> asking) {
    this.stage = stage;
    this.clock = clock;
    this.sign = new SaveSignModel(clock);
    this.logbooks = new Logbooks(own);
    this.work = new WorkThread(this::unexpected);
    this.look = new WindowLook(new SettingsFile(logbooks.folder()), work, sign::notSaved);
    Dialogs dialogs = new Dialogs(stage, look.settingsProperty());
    this.unexpected = new Unexpected(dialogs, texts);
    this.keySheet = new KeySheet(dialogs, texts);
    this.ask = asking.apply(new SystemAsk(stage, dialogs, texts));
    double em = Settings.USUAL.textSize().emPx();
    Scene scene = new Scene(frame, WIDTH_EM * em, HEIGHT_EM * em);
    this.keys = new Keys(scene, this, look);
    this.doors = new Doors(logbooks, work, clock, this);
    ShellSheet.dress(scene, Settings.USUAL);
    look.settingsProperty().addListener((property, before, now) -> ShellSheet.dress(scene, now));
    sign.signProperty().addListener((property, before, now) -> frame.say(now));
    frame.say(sign.signProperty().get());
    topLine();
    stage.setScene(scene);
    stage.setTitle(texts.say("shell.title"));
    stage.setOnCloseRequest(
        request -> {
          request.consume();
          close();
        });
  }

  /** Shows the window and opens the shop's logbook, or the first start where there is none. */
  void open() {
    Thread.currentThread().setUncaughtExceptionHandler((thread, trouble) -> unexpected(trouble));
    stage.show();
    look.fetch();
    doors.again();
  }

  /** Closes the logbook once and cleanly, then the window. */
  void close() {
    if (closing) {
      return;
    }
    closing = true;
    leaveScreen();
    doors.close(
        this::gone,
        why -> {
          ask.problem(why);
          gone();
        });
  }

  /** The toolkit ends, whether by {@link #close} or by the system's own way to quit. */
  void ended() {
    close();
    work.finish();
    work.awaitEnd();
  }

  @Override
  public void enter(OpenLogbook open) {
    startModel = null;
    sign.clear();
    BenchNow now = new BenchNow(open.shop(), clock);
    frame.topLine().technicians(open.shop().technicians(), now);
    frame.topLine().search().clear();
    frame.demo(open.shop().demo());
    navigator = new Navigator(goTo -> screens(open, now, goTo), this::show, doors::again);
    navigator.bench();
  }

  private Screens screens(OpenLogbook open, BenchNow now, GoTo goTo) {
    Desk desk = new Desk(open.logbook(), work, goTo, ask, sign, texts, now);
    Screen shop =
        new ShopScreen(
            desk,
            doors,
            renamed -> {
              now.rename(renamed);
              frame.topLine().technicians(renamed.technicians(), now);
            });
    return new AllScreens(desk, frame.topLine().search().textProperty(), shop);
  }

  @Override
  public void start() {
    StartModel model = new StartModel();
    startModel = model;
    showAlone(new StartScreen(model, doors, ask, texts, logbooks.own().file().toString()));
  }

  @Override
  public void refused(LogbookProblem problem) {
    StartModel model = startModel;
    if (model == null) {
      Message advice = Advice.on(problem.kind());
      showAlone(new TroubleScreen(problem.reason(), advice, doors, ask, texts));
    } else {
      model.troubleProperty().set(Optional.of(problem.reason()));
    }
  }

  @Override
  public void busy(boolean under) {
    if (startModel != null) {
      startModel.busyProperty().set(under);
    }
  }

  @Override
  public void broken(Message what) {
    showAlone(new TroubleScreen(what, Message.of("start.other-trouble"), doors, ask, texts));
  }

  @Override
  public void bench() {
    if (navigator != null) {
      navigator.bench();
    }
  }

  @Override
  public void instruments() {
    if (navigator != null) {
      navigator.instruments();
    }
  }

  @Override
  public void sets() {
    if (navigator != null) {
      navigator.sets();
    }
  }

  @Override
  public void shop() {
    if (navigator != null) {
      navigator.shop();
    }
  }

  @Override
  public void keySheet() {
    keySheet.show();
  }

  @Override
  public void search() {
    if (navigator != null) {
      frame.topLine().search().requestFocus();
      frame.topLine().search().selectAll();
    }
  }

  @Override
  public void back() {
    if (navigator != null) {
      navigator.back();
    }
  }

  private void topLine() {
    frame.onLeaveDemo(doors::again);
    frame.topLine().onBench(this::bench);
    frame.topLine().onInstruments(this::instruments);
    frame.topLine().onSets(this::sets);
    frame.topLine().onShop(this::shop);
    SearchKeys.teach(frame.topLine().search(), this::searching, this::toScreen);
  }

  /** Somebody types in the search field: the finds are shown, the focus stays where it types. */
  private void searching() {
    if (navigator != null && !(navigator.here() instanceof Place.Instruments)) {
      navigator.instruments();
      frame.topLine().search().requestFocus();
      frame.topLine().search().end();
    }
  }

  private void toScreen() {
    if (screen != null) {
      frame.requestFocus();
      screen.shown();
    }
  }

  private void show(Screen next, Place place) {
    leaveScreen();
    screen = next;
    frame.show(next, place);
    keys.of(next);
    next.shown();
  }

  private void showAlone(Screen next) {
    leaveScreen();
    navigator = null;
    screen = next;
    frame.showAlone(next);
    keys.of(next);
    next.shown();
  }

  private void leaveScreen() {
    Screen before = screen;
    screen = null;
    if (before != null) {
      before.left();
    }
  }

  private void gone() {
    work.finish();
    stage.hide();
  }

  private void unexpected(Throwable trouble) {
    unexpected.accept(trouble);
  }
}
