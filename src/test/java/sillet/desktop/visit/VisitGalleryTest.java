package sillet.desktop.visit;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.List;
import java.util.concurrent.TimeoutException;
import java.util.function.Consumer;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.TextField;
import javafx.scene.control.ToggleButton;
import javafx.stage.Stage;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import sillet.desktop.drawing.Picture;
import sillet.desktop.theme.TextSize;
import sillet.desktop.theme.Theme;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.Neck;
import sillet.logbook.instruments.Saddle;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.shop.Customer;
import sillet.logbook.strings.FittedString;
import sillet.store.Logbook;

/** Renders the page in its shapes under target/looks, to be looked at. */
class VisitGalleryTest {
  private static final int TOP_LINE = 50;

  @BeforeAll
  static void startToolkit() throws TimeoutException {
    Picture.startToolkit();
  }

  private record Look(String name, Theme theme, int percent, int width, int height) {
    static Look light(String name) {
      return new Look(name, Theme.LIGHT, 100, 1280, 800);
    }
  }

  private static void type(Scene scene, String cell, String text) {
    TextField field = (TextField) scene.lookup(cell);
    field.requestFocus();
    field.setText(text);
    field.end();
  }

  private static void draw(Look look, Consumer<SampleVisits> told) throws IOException {
    draw(look, told, scene -> {});
  }

  private static void draw(Look look, Consumer<SampleVisits> told, Consumer<Scene> hand)
      throws IOException {
    Picture picture =
        Picture.onFxThread(
            () -> {
              try (Logbook logbook = Logbook.inMemory()) {
                told.accept(new SampleVisits(logbook));
                VisitScreen screen =
                    new VisitScreen(new TestDesk(logbook, new AtOnce()).desk(), 2417);
                Scene scene = new Scene(new Framed(screen.node()), look.width(), look.height());
                look.theme().applyTo(scene);
                new TextSize(look.percent()).applyTo(scene);
                Stage stage = new Stage();
                stage.setScene(scene);
                stage.show();
                screen.shown();
                scene.getRoot().layout();
                hand.accept(scene);
                scene.getRoot().layout();
                Picture seen = Picture.of(scene);
                stage.hide();
                return seen;
              }
            });
    picture.save("visit-" + look.name());
    assertThat(picture.countOther(picture.colourAt(2, TOP_LINE + 20))).isGreaterThan(60_000);
  }

  /** The page below a blank top line. */
  private static final class Framed extends javafx.scene.layout.BorderPane {
    Framed(javafx.scene.Node page) {
      var top = new javafx.scene.layout.Region();
      top.setMinHeight(TOP_LINE);
      getStyleClass().add("bench-ground");
      setTop(top);
      setCenter(page);
    }
  }

  private static void six(SampleVisits visits) {
    visits.takeIn(
        SampleVisits.six(),
        SampleVisits.sixStrings(648),
        SampleVisits.brackets(-0.3, 0.6, 0.6, 1.4, 1.4, 3.1));
    visits
        .check(6)
        .read(1, 12, "4.9/5.0/5.2", "3.2", "7.7/7.8/8.0", "0.3", "2.1", "-2.6")
        .read(1, 5, "1.8", "2.6", "2.6 2.8 3.3", "0.2", "0.8", "-0.9")
        .read(1, 1, "0.6", "6.4", "0.9", "0.4", "0.3", "-0.3")
        .read(1, 17, "8.4", "5.1", "12.9", "0.6", "3.4", "-4.1");
  }

  private static void sixAgain(SampleVisits visits) {
    six(visits);
    visits
        .move(1.875, 1.1875, 2.6, 0, 0.75, -0.9375)
        .read(2, 12, "0.1", "-0.2", "1.6/1.5/1.6", "0.3", "0.4", "");
  }

  @Test
  void sixStrings() throws IOException {
    draw(Look.light("6"), VisitGalleryTest::six, scene -> type(scene, "#cell-3-5", "2.6 2.8 3.3"));
    draw(new Look("6-dark", Theme.DARK, 100, 1280, 800), VisitGalleryTest::sixAgain);
    draw(new Look("6-1920", Theme.LIGHT, 100, 1920, 1080), VisitGalleryTest::six);
    draw(new Look("6-150", Theme.DARK, 150, 1280, 800), VisitGalleryTest::six);
    draw(new Look("6-150-tall", Theme.LIGHT, 150, 1280, 2400), VisitGalleryTest::six);
    draw(new Look("6-tall", Theme.LIGHT, 100, 1280, 1300), VisitGalleryTest::six);
  }

  private static void manyFrets(SampleVisits visits) {
    six(visits);
    visits
        .read(1, 2, "0.8", "4.1", "1.2", "0.3", "0.4", "-0.4")
        .read(1, 3, "1.1", "3.2", "1.7", "0.2", "0.6", "-0.6")
        .read(1, 7, "4.6", "4.3", "5.9", "2.4", "3.5", "1.1")
        .read(1, 9, "3.4", "2.8", "5.4", "0.3", "1.5", "-1.8")
        .read(1, 15, "6.9", "4.3", "10.2", "0.5", "2.9", "-3.4");
  }

  @Test
  void wholeNeck() throws IOException {
    draw(Look.light("neck"), VisitGalleryTest::manyFrets);
    draw(
        new Look("neck-dark", Theme.DARK, 100, 1280, 800),
        VisitGalleryTest::six,
        scene -> ((ToggleButton) scene.lookup("#whole-neck")).fire());
    draw(
        Look.light("aim"),
        VisitGalleryTest::manyFrets,
        scene -> {
          ((ToggleButton) scene.lookup("#aim-neck")).fire();
          ((ToggleButton) scene.lookup("#nut-each")).fire();
        });
    draw(new Look("neck-1920", Theme.LIGHT, 100, 1920, 1080), VisitGalleryTest::manyFrets);
    draw(new Look("neck-150", Theme.DARK, 150, 1280, 1600), VisitGalleryTest::manyFrets);
  }

  /** Fret 7 sharp on all strings, the slot of string 2 high: causes a saddle does not cure. */
  private static void spoilt(SampleVisits visits) {
    visits.takeIn(
        SampleVisits.six(),
        SampleVisits.sixStrings(648),
        SampleVisits.brackets(-0.3, 0.6, 0.6, 1.4, 1.4, 3.1));
    visits
        .check(6)
        .read(1, 1, "0.6", "7.4", "0.9", "0.4", "0.3", "0.1")
        .read(1, 2, "0.9", "5.1", "1.2", "0.5", "0.5", "0.0")
        .read(1, 3, "1.2", "4.0", "1.8", "0.4", "0.8", "-0.2")
        .read(1, 5, "1.8", "3.0", "2.9", "0.3", "1.0", "-0.7")
        .read(1, 7, "5.2", "5.3", "6.9", "3.0", "4.2", "1.6")
        .read(1, 9, "3.4", "2.8", "5.4", "0.3", "1.6", "-1.6")
        .read(1, 12, "4.9/5.0/5.2", "3.4", "7.7/7.8/8.0", "0.3", "2.1", "-2.6")
        .read(1, 15, "6.9", "4.3", "10.3", "0.4", "2.9", "-3.5")
        .read(1, 17, "8.4", "4.9", "12.6", "0.5", "3.4", "-4.2");
  }

  @Test
  void causes() throws IOException {
    draw(Look.light("causes"), VisitGalleryTest::spoilt);
    draw(new Look("causes-1920", Theme.DARK, 100, 1920, 1080), VisitGalleryTest::spoilt);
    draw(new Look("causes-tall", Theme.LIGHT, 100, 1280, 1300), VisitGalleryTest::spoilt);
  }

  @Test
  void whatHandsDo() throws IOException {
    draw(
        Look.light("error"),
        VisitGalleryTest::six,
        scene -> {
          type(scene, "#cell-2-12", "31o");
          scene.lookup("#cell-3-12").requestFocus();
        });
    draw(
        Look.light("made"),
        VisitGalleryTest::six,
        scene -> ((Button) scene.lookup("#moves-made")).fire());
  }

  @Test
  void nothingRead() throws IOException {
    draw(
        Look.light("empty"),
        visits -> visits.takeIn(SampleVisits.six(), SampleVisits.sixStrings(648), List.of()));
  }

  @Test
  void fourStrings() throws IOException {
    Instrument bass =
        SampleVisits.electric(
            "Ostwick",
            "Trawler",
            new Neck(4, 863.6, 863.6, 20, 254.0, false),
            new Saddle(SaddleKind.SCREW, 0.7, ScrewSense.NOT_KNOWN, null));
    draw(
        Look.light("4"),
        visits -> {
          visits.takeIn(
              bass,
              SampleVisits.strings(863.6, "G2 .045 w", "D2 .065 w", "A1 .085 w", "E1 .105 w"),
              SampleVisits.travel(4, 1.5, 3));
          visits.read(1, 12, "3.9", "8.7", "-1.8", "0.4").read(1, 5, "1.2", "2", "", "");
        });
  }

  @Test
  void twelveStrings() throws IOException {
    Instrument twelve =
        SampleVisits.electric(
            "Marrowby", "Twelvefold", new Neck(12, 648, 648, 22, 305.0, false), screws());
    List<FittedString> strings =
        SampleVisits.strings(
            648,
            "E4 .010 p",
            "E4 .010 p",
            "B3 .013 p",
            "B3 .013 p",
            "G3 .017 p",
            "G4 .008 p",
            "D3 .026 w",
            "D4 .012 p",
            "A2 .036 w",
            "A3 .018 p",
            "E2 .046 w",
            "E3 .026 w");
    draw(
        Look.light("12"),
        visits -> {
          visits.takeIn(twelve, strings, SampleVisits.travel(12, 6.5, 2));
          visits.read(
              1, 12, "2.1", "2.4", "3.3", "3.0", "4.4/4.6/4.7", "-3.2", "0.3", "-1.9", "1.4");
        });
  }

  private static Saddle screws() {
    return new Saddle(SaddleKind.SCREW, 0.5, ScrewSense.NOT_KNOWN, null);
  }

  @Test
  void onePiece() throws IOException {
    Instrument parlour =
        new Instrument(
            SampleVisits.id("alder"),
            SampleVisits.id("maren"),
            InstrumentKind.STEEL_STRING,
            "Marrowby",
            "Alder",
            "1190",
            "",
            new Neck(6, 645.2, 645.2, 20, 406.0, false),
            new Saddle(SaddleKind.ONE_PIECE, null, ScrewSense.NOT_KNOWN, 3.2));
    List<FittedString> strings =
        SampleVisits.strings(
            645.2, "E4 .012 p", "B3 .016 p", "G3 .024 b", "D3 .032 b", "A2 .042 b", "E2 .053 b");
    draw(
        Look.light("one-piece"),
        visits -> {
          visits.takeIn(parlour, strings, SampleVisits.travel(6, 1.2, 1.2));
          visits
              .check(6)
              .read(1, 12, "1.3", "2.9/2.8/3.0", "-2.8", "-0.4", "1.6", "4.8/4.7/4.8")
              .read(1, 5, "0.6", "1.1", "-0.8", "0.1", "0.7", "1.8");
        });
  }

  @Test
  void leftHandedWithLongNames() throws IOException {
    Instrument lefty =
        SampleVisits.electric(
            "The Extraordinarily Long Named Instrument Works of Nether Wallop",
            "Grand Orchestral Fieldfare Deluxe Anniversary",
            new Neck(6, 648, 648, 22, 305.0, true),
            SampleVisits.six().saddle());
    Customer customer =
        new Customer(
            SampleVisits.id("maren"),
            "Wilhelmina Featherstonehaugh-Cholmondeley von und zu Hohenberg",
            "+44 1632 960 001 extension 4711",
            "",
            "Rings back only on Tuesdays between four and five in the afternoon");
    draw(
        Look.light("left-handed"),
        visits -> {
          visits.takeIn(
              lefty,
              SampleVisits.sixStrings(648),
              SampleVisits.travel(6, 1.5, 0.4),
              customer,
              "It sounds wrong when I play up there, and my teacher says that it is the guitar and"
                  + " not me, and could you please also have a look at the scratch near the jack?");
          visits.read(1, 12, "4.9", "3.2", "7.8", "0.3/0.4/9.1", "", "-2.6");
        });
  }
}
