package sillet.desktop.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.TimeoutException;
import java.util.function.Consumer;
import javafx.application.Platform;
import javafx.scene.Scene;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.StackPane;
import javafx.stage.Stage;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.testfx.api.FxRobot;
import org.testfx.util.WaitForAsyncUtils;
import sillet.desktop.controls.Background;
import sillet.desktop.drawing.Picture;
import sillet.desktop.theme.TextSize;
import sillet.desktop.theme.Theme;
import sillet.desktop.visit.AtOnce;
import sillet.desktop.visit.SampleVisits;
import sillet.desktop.visit.TestDesk;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.store.Logbook;

/** The intake page under the hand. */
class IntakeScreenTest {
  private final FxRobot robot = new FxRobot();
  private final Logbook logbook = Logbook.inMemory();
  private final FailsOnRequest background = new FailsOnRequest();
  private final TestDesk desk = new TestDesk(logbook, background);
  private @Nullable Stage stage;

  /** Does work at once; lets so many pieces through and fails after that. */
  private static final class FailsOnRequest implements Background {
    private int good = Integer.MAX_VALUE;
    private Runnable before = () -> {};

    @Override
    public <T> void run(Callable<T> work, Consumer<? super T> done, Consumer<Message> failed) {
      Callable<T> tried =
          () -> {
            T value = work.call();
            before.run();
            before = () -> {};
            good--;
            if (good < 0) {
              throw Rejection.of("visit.no-such", "0");
            }
            return value;
          };
      new AtOnce().run(tried, done, failed);
    }
  }

  @BeforeAll
  static void startToolkit() throws TimeoutException {
    Picture.startToolkit();
    Platform.setImplicitExit(false);
  }

  @BeforeEach
  void aFieldfareWasHereBefore() {
    new SampleVisits(logbook).takeIn(SampleVisits.six(), SampleVisits.sixStrings(648), List.of());
  }

  @AfterEach
  void close() {
    Picture.onFxThread(
        () -> {
          if (stage != null) {
            stage.close();
          }
          return stage;
        });
    logbook.close();
  }

  private void open(@Nullable Instrument again) {
    stage =
        Picture.onFxThread(
            () -> {
              IntakeScreen screen =
                  new IntakeScreen(desk.desk(), again == null ? null : again.id());
              Scene scene = new Scene(new StackPane(screen.node()), 1280, 750);
              Theme.LIGHT.applyTo(scene);
              TextSize.USUAL.applyTo(scene);
              scene.getAccelerators().putAll(screen.keys());
              Stage shown = new Stage();
              shown.setScene(scene);
              shown.show();
              screen.shown();
              return shown;
            });
    WaitForAsyncUtils.waitForFxEvents();
  }

  private <V> V now(Callable<V> look) {
    WaitForAsyncUtils.waitForFxEvents();
    return Picture.onFxThread(look);
  }

  private String field(String query) {
    return now(() -> ((TextInputControl) stage.getScene().lookup(query)).getText());
  }

  private void fill(String query, String text) {
    now(
        () -> {
          TextInputControl field = (TextInputControl) stage.getScene().lookup(query);
          field.requestFocus();
          field.setText(text);
          return field;
        });
  }

  private void press(KeyCode... keys) {
    robot.push(keys);
    WaitForAsyncUtils.waitForFxEvents();
  }

  private String trouble() {
    return now(() -> ((Label) stage.getScene().lookup("#intake-trouble")).getText());
  }

  private void fillANewOne() {
    fill("#customer-name", "Ilkka Sandvoll");
    fill("#model", "Alder");
    fill("#scale", "25.5in");
    String[] gauges = {"10", "13", "17", "26", "36", "46"};
    for (int i = 0; i < gauges.length; i++) {
      fill("#gauge-" + (i + 1), gauges[i]);
    }
    fill("#request", "Sour");
  }

  @Test
  void offersWhoIsKnownAndWhatTheyBroughtBefore() {
    open(null);
    robot.write("mar", 0);
    press(KeyCode.DOWN);
    press(KeyCode.ENTER);
    assertThat(field("#customer-name")).isEqualTo("Maren Oduya");
    assertThat(field("#customer-phone")).isEqualTo("555 0148");
    int offered =
        now(() -> ((ListView<?>) stage.getScene().lookup("#known-instruments")).getItems().size());
    assertThat(offered).isEqualTo(1);
  }

  @Test
  void takesInAKnownInstrumentAgainWithItsLastStrings() {
    open(SampleVisits.six());
    assertThat(field("#model")).isEqualTo("Fieldfare");
    assertThat(field("#customer-name")).isEqualTo("Maren Oduya");
    assertThat(field("#gauge-6")).isEqualTo(".046");
    assertThat(field("#pitch-6")).isEqualTo("E2");
    fill("#request", "Again");
    press(KeyCode.CONTROL, KeyCode.ENTER);
    assertThat(desk.went).endsWith("visit 2418");
    assertThat(logbook.visits().ofInstrument(SampleVisits.six().id())).hasSize(2);
    assertThat(logbook.shop().customers("").count()).isEqualTo(1);
  }

  @Test
  void marksWhatIsMissingAndGoesThere() {
    open(null);
    press(KeyCode.CONTROL, KeyCode.ENTER);
    assertThat(trouble()).isNotEmpty();
    assertThat(now(() -> stage.getScene().getFocusOwner().getId())).isEqualTo("customer-name");
    assertThat(logbook.visits().open()).hasSize(1);
  }

  @Test
  void whatIsUnusualIsAskedAboutAndNeverBlocks() {
    open(null);
    fillANewOne();
    fill("#scale", "2000");
    fill("#request", "Sour");
    boolean asked =
        now(
            () ->
                stage.getScene().getRoot().lookupAll(".error-head").stream()
                    .anyMatch(node -> ((Label) node).getText().contains("2000.00 mm")));
    assertThat(asked).isTrue();
    press(KeyCode.CONTROL, KeyCode.ENTER);
    assertThat(desk.went).contains("visit 2418");
  }

  @Test
  void readsAThreadThatIsOffered() {
    open(null);
    fillANewOne();
    now(
        () -> {
          ComboBox<?> screw = (ComboBox<?>) stage.getScene().lookup("#screw");
          screw.getSelectionModel().select(screw.getItems().indexOf("#6-32"));
          return screw;
        });
    press(KeyCode.CONTROL, KeyCode.ENTER);
    var taken = logbook.visits().byTicket(2418).orElseThrow();
    assertThat(taken.instrument().saddle().screwPitchMm()).isEqualTo(25.4 / 32);
  }

  @Test
  void keepsEverythingTypedWhenItFailsAndTakesInOnTheNextTry() {
    open(null);
    fillANewOne();
    background.good = 0;
    press(KeyCode.CONTROL, KeyCode.ENTER);
    assertThat(trouble()).startsWith("Not taken in");
    assertThat(desk.sign()).startsWith("not saved");
    assertThat(field("#request")).isEqualTo("Sour");
    background.good = Integer.MAX_VALUE;
    press(KeyCode.CONTROL, KeyCode.ENTER);
    assertThat(desk.went).endsWith("visit 2418");
    assertThat(desk.sign()).isEqualTo("saved");
    assertThat(trouble()).isEmpty();
  }

  @Test
  void addsNothingTwiceWhenTheTakingInAloneFailed() {
    open(null);
    fillANewOne();
    // somebody else takes in under the number this page was about to use
    background.before = () -> SampleVisits.takeInAs(logbook, 2418);
    press(KeyCode.CONTROL, KeyCode.ENTER);
    assertThat(trouble()).startsWith("Not taken in");
    assertThat(logbook.shop().customers("Ilkka").count()).isEqualTo(1);
    press(KeyCode.CONTROL, KeyCode.ENTER);
    assertThat(desk.went).endsWith("visit 2419");
    assertThat(logbook.shop().customers("Ilkka").count()).isEqualTo(1);
    assertThat(logbook.instruments().search("Alder").count()).isEqualTo(1);
  }

  @Test
  void goesToTheVisitWhereItIsThereThoughSomethingFailedBehindIt() {
    open(null);
    fillANewOne();
    background.good = 1;
    press(KeyCode.CONTROL, KeyCode.ENTER);
    assertThat(desk.sign()).startsWith("not saved");
    assertThat(desk.went).endsWith("visit 2418");
  }
}
