package sillet.desktop.drawing.strings;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.concurrent.TimeoutException;
import javafx.scene.Scene;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import sillet.desktop.drawing.MarkShape;
import sillet.desktop.drawing.Picture;
import sillet.desktop.theme.TextSize;
import sillet.desktop.theme.Theme;

/** Pencil stands where a hand is needed and nowhere else; a finished sheet has no colour in it. */
class StringsColoursTest {
  private static final String LIGHT_INK = "#151C1B";
  private static final String LIGHT_PENCIL = "#AB3208";
  private static final String DARK_INK = "#EEF0EB";
  private static final String DARK_PENCIL = "#FF9466";
  private static final SheetWords WORDS = new SheetWords("String", "nut", (along, across) -> "x6");

  @BeforeAll
  static void startToolkit() throws TimeoutException {
    Picture.startToolkit();
  }

  private static StringsPicture of(SaddleMark saddle, FretMark... marks) {
    return new StringsPicture(
        List.of(Samples.with(Samples.row(1, "E4", 0.010, 648), saddle, marks)),
        StringsPicture.Board.of(22, Samples.FRETS),
        new Bridge.SingleSaddles("648.0"),
        Lie.USUAL,
        List.of(),
        java.util.OptionalDouble.empty());
  }

  private static Picture draw(StringsPicture picture) {
    return Picture.of(() -> new StringsDrawing(picture, WORDS, 96), Theme.LIGHT, 100, 1200, 200);
  }

  @Test
  void aMoveIsDrawnInPencil() {
    Picture seen = draw(of(SaddleMark.at(1).within(-1, 7).to(3, 2.8, 3.2)));
    assertThat(seen.countBetween(LIGHT_PENCIL, 680, 900)).isGreaterThan(100);
    assertThat(seen.countBetween(LIGHT_PENCIL, 0, 640)).isZero();
  }

  @Test
  void aFinishedStringHasNoPencilInIt() {
    StringsPicture done =
        of(
            SaddleMark.at(3).within(-1, 7).from(1).leave(2.8, 3.2),
            FretMark.read(1, 0.4).after(5).expecting(0.2),
            FretMark.read(12, 0.1).after(5).expecting(0));
    Picture seen = draw(done);
    assertThat(seen.count(LIGHT_PENCIL)).isZero();
    assertThat(seen.count(LIGHT_INK)).isGreaterThan(500);
  }

  @Test
  void aPredictionIsATickInPencilUnlessTheDiamondStays() {
    SaddleMark still = SaddleMark.at(3);
    int stays = draw(of(still, FretMark.read(12, 0.4).expecting(-0.2))).count(LIGHT_PENCIL);
    int moves = draw(of(still, FretMark.read(12, 5).expecting(0))).count(LIGHT_PENCIL);
    assertThat(stays).isZero();
    assertThat(moves).isGreaterThan(20);
  }

  @Test
  void sharpStandsAboveTheStringAndFlatBelow() {
    StringsPicture sharp = of(SaddleMark.at(3), FretMark.read(12, 6));
    StringsPicture flat = of(SaddleMark.at(3), FretMark.read(12, -6));
    SheetGeometry sheet =
        new SheetGeometry(
            sharp,
            SheetMeasures.of(SheetShape.USUAL, sharp),
            new SheetGeometry.Frame(1200, 14, 96));
    int x = (int) sheet.strip().fretX(0, 12);
    int y = (int) sheet.rows().y(0);
    assertThat(isInk(draw(sharp), x + 2, y - 8)).isTrue();
    assertThat(isInk(draw(sharp), x + 2, y + 8)).isFalse();
    assertThat(isInk(draw(flat), x + 2, y + 8)).isTrue();
    assertThat(isInk(draw(flat), x + 2, y - 8)).isFalse();
  }

  private static boolean isInk(Picture picture, int x, int y) {
    return picture.colourAt(x, y).getBrightness() < 0.2;
  }

  @Test
  void aStaleBarStandsInTheGreyOfLines() {
    Picture fresh = draw(of(SaddleMark.at(3), FretMark.read(12, 8)));
    Picture stale = draw(of(SaddleMark.at(3), FretMark.read(12, 8).gone()));
    assertThat(stale.count(LIGHT_INK)).isLessThan(fresh.count(LIGHT_INK) - 80);
    assertThat(stale.count("#6A7672")).isGreaterThan(fresh.count("#6A7672") + 80);
  }

  @Test
  void outOfTravelTheTargetStandsAtTheBracketWithTheRestBroken() {
    SaddleMark beyond = SaddleMark.at(1).within(-1, 3).to(4.5, 4.3, 4.7);
    assertThat(beyond.reachableMm()).isEqualTo(3);
    StringsPicture picture = of(beyond);
    SheetGeometry sheet =
        new SheetGeometry(
            picture,
            SheetMeasures.of(SheetShape.USUAL, picture),
            new SheetGeometry.Frame(1200, 14, 96));
    int bracket = (int) sheet.plan().x(3) + 6;
    int wanted = (int) sheet.plan().x(4.5) + 2;
    assertThat(draw(picture).countBetween(LIGHT_PENCIL, bracket, wanted)).isGreaterThan(20);
  }

  @Test
  void themeAndTextSizeReachADrawingThatStands() {
    int[] seen =
        Picture.onFxThread(
            () -> {
              StringsPicture picture = of(SaddleMark.at(1).within(-1, 7).to(3, 2.8, 3.2));
              StringsDrawing drawing = new StringsDrawing(picture, WORDS, 96);
              Scene scene = new Scene(drawing, 1200, 200);
              Theme.LIGHT.applyTo(scene);
              TextSize.USUAL.applyTo(scene);
              Picture light = Picture.of(scene);
              Theme.DARK.applyTo(scene);
              Picture dark = Picture.of(scene);
              new TextSize(110).applyTo(scene);
              Picture.of(scene);
              return new int[] {
                light.count(LIGHT_PENCIL),
                dark.count(DARK_PENCIL),
                dark.count(DARK_INK),
                dark.count(LIGHT_PENCIL),
                (int) Math.rint(drawing.em() * 10)
              };
            });
    assertThat(seen[0]).isGreaterThan(100);
    assertThat(seen[1]).isGreaterThan(100);
    assertThat(seen[2]).isGreaterThan(500);
    assertThat(seen[3]).isZero();
    assertThat(seen[4]).isEqualTo(154);
  }

  @Test
  void wordsAreSaidWholeToAScreenReader() {
    String aloud =
        MoveText.move(MarkShape.ARROW_RIGHT, "3\u00be", "turns", "away from neck")
            .below("1.86 mm", "1.65 to 2.07", "4.7 mm left")
            .aloud();
    assertThat(aloud).isEqualTo("away from neck 3\u00be turns 1.86 mm 1.65 to 2.07 4.7 mm left");
  }
}
