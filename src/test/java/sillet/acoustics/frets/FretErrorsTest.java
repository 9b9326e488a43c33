package sillet.acoustics.frets;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sillet.acoustics.pitch.FretPositions;

@DisplayName("What misplaced frets cost")
class FretErrorsTest {

  private static final double SCALE = 0.648;

  /** Cents per 0.1 mm at 648 mm: first-order form C 2^(n/12) e / X0 [D]. */
  @ParameterizedTest(name = "fret {0}: 0.1 mm costs {1} cents")
  @CsvSource({"1, 0.28", "5, 0.36", "12, 0.53", "19, 0.80", "22, 0.95"})
  void costsWhatIsKnownPerTenth(int fret, double cents) {
    FretErrors.Line sharp = line(fret, 0.1e-3);
    FretErrors.Line flat = line(fret, -0.1e-3);

    assertThat(sharp.cents()).isCloseTo(cents, within(0.006));
    assertThat(flat.cents()).isCloseTo(-cents, within(0.006));
    assertThat(sharp.error()).isCloseTo(0.1e-3, within(1e-12));
  }

  /** A slip of .003 in costs 0.2 to 0.7 cent (a repairer's text; read as such, trade practice). */
  @Test
  void threeThousandthsCostUpToSevenTenths() {
    assertThat(line(1, .003 * 0.0254).cents()).isBetween(0.15, 0.25);
    assertThat(line(22, .003 * 0.0254).cents()).isBetween(0.65, 0.75);
  }

  private static FretErrors.Line line(int fret, double error) {
    Map<Integer, Double> places = Map.of(fret, FretPositions.fromNut(SCALE, fret) + error);
    return FretErrors.of(SCALE, 0, places).lines().get(0);
  }

  /** A nut 0.5 mm too far makes every fretted note 1.3 cents sharp at 648 mm [D]. */
  @Test
  void aNutTooFarShowsByItself() {
    BoardScale board = BoardScale.byFirstAndThirteenth(places(0.5e-3, 0)).orElseThrow();

    assertThat(board.scale()).isCloseTo(SCALE, within(1e-9));
    assertThat(board.nutFar()).isCloseTo(0.5e-3, within(1e-9));
    assertThat(board.nutCents()).isCloseTo(1.3, within(0.05));
    assertThat(board.errors(places(0.5e-3, 0)).lines())
        .allSatisfy(one -> assertThat(one.cents()).isCloseTo(0, within(1e-6)));
  }

  @Test
  void theRuleOfFretsOneAndThirteenNeedsBoth() {
    SortedMap<Integer, Double> places = places(0, 0);
    places.remove(13);

    assertThat(BoardScale.byFirstAndThirteenth(places)).isEmpty();
  }

  @Test
  void oneBadFretDragsNeitherScaleNorNut() {
    SortedMap<Integer, Double> places = places(0.4e-3, 0.5e-3);

    BoardScale board = BoardScale.byAllFrets(places).orElseThrow();
    FretErrors errors = board.errors(places);

    assertThat(board.scale()).isCloseTo(SCALE, within(0.02e-3));
    assertThat(board.nutFar()).isCloseTo(0.4e-3, within(0.02e-3));
    assertThat(errors.lines().get(6).error()).isCloseTo(0.5e-3, within(0.02e-3));
    assertThat(errors.lines().get(7).error()).isCloseTo(0, within(0.02e-3));
  }

  @Test
  void tooFewFretsGiveNoScale() {
    SortedMap<Integer, Double> three = places(0, 0).headMap(4);

    assertThat(BoardScale.byAllFrets(three)).isEmpty();
    assertThat(BoardScale.byAllFrets(new TreeMap<>())).isEmpty();
  }

  @Test
  void refusesAFretBehindTheBridge() {
    assertThatThrownBy(() -> FretErrors.of(SCALE, 0, Map.of(12, 0.7)))
        .isInstanceOf(IllegalArgumentException.class);
  }

  /** A board of 22 frets measured from a nut that stands too far, fret 7 misplaced. */
  private static SortedMap<Integer, Double> places(double nutFar, double atSeven) {
    SortedMap<Integer, Double> places = new TreeMap<>();
    for (int fret = 1; fret <= 22; fret++) {
      double error = fret == 7 ? atSeven : 0;
      places.put(fret, FretPositions.fromNut(SCALE, fret) + nutFar + error);
    }
    return places;
  }
}
