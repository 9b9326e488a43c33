package sillet.acoustics.forecast;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sillet.acoustics.estimate.Figure;
import sillet.acoustics.estimate.HeightSds;
import sillet.acoustics.estimate.InstrumentEvidence;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.NeckEstimator;
import sillet.acoustics.estimate.Occasion;
import sillet.acoustics.estimate.StringHistory;
import sillet.acoustics.moves.Aim;
import sillet.acoustics.moves.MoveSolver;
import sillet.acoustics.moves.NutFreedom;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.wire.Construction;
import sillet.acoustics.wire.CoreShape;
import sillet.acoustics.wire.StringSpec;

class ForecasterTest {
  private static final double INCH = 0.0254;
  private static final double SCALE = 0.648;
  private static final Clearances HEIGHTS = new Clearances(1.7e-3, 4e-4, 1.5e-4);
  private static final List<Stringing> SET =
      List.of(
          plain(.010, -5),
          plain(.013, -10),
          plain(.017, -14),
          wound(.026, -19),
          wound(.036, -24),
          wound(.046, -29));
  private static final NeckEstimate READ = estimate(1.5, 2.5, 4, 5, 6);
  private static final NeckEstimate UNREAD = estimate();

  @Test
  void leavesAStringThatStaysWhereItsReadingsWantIt() {
    InstrumentForecast forecast = forecast(READ, stay());
    for (int i = 0; i < SET.size(); i++) {
      double wanted =
          MoveSolver.solve(READ, Aim.OCTAVE, NutFreedom.FIXED).orElseThrow().get(i).saddleMove();
      Figure move = forecast.strings().get(i).saddleMove();
      assertThat(move.value()).isCloseTo(wanted, within(2.5e-4));
      assertThat(forecast.strings().get(i).feel()).isEqualTo(Feel.SAME);
      assertThat(forecast.strings().get(i).cents12After().value()).isCloseTo(0, within(1e-4));
    }
    assertThat(forecast.pull().share()).isCloseTo(0, within(0.01));
  }

  @Test
  void sendsASlackerStringBack() {
    List<StringChange> changes = stay();
    changes.set(2, change(2, SET.get(2).tunedBy(-3)));
    StringForecast slack = forecast(READ, changes).strings().get(2);
    StringForecast before = forecast(READ, stay()).strings().get(2);
    assertThat(slack.saddleMove().value()).isGreaterThan(before.saddleMove().value() + 5e-4);
    assertThat(slack.cents12IfLeft().value()).isGreaterThan(before.cents12IfLeft().value() + 1);
    assertThat(slack.feel()).isEqualTo(Feel.LIGHTER);
    assertThat(slack.then().tension() / slack.now().tension())
        .isCloseTo(Math.pow(2, -6 / 12.0), within(0.02));
  }

  /** A plain third is stiff: a wound one of the same pitch wants its saddle farther forward [P]. */
  @Test
  void sendsAWoundThirdForward() {
    List<StringChange> changes = stay();
    changes.set(2, change(2, wound(.020, -14)));
    StringForecast then = forecast(READ, changes).strings().get(2);
    StringForecast now = forecast(READ, stay()).strings().get(2);
    assertThat(then.setbackThen().value()).isLessThan(now.setbackThen().value() - 5e-4);
  }

  @Test
  void sendsAHigherStringBack() {
    List<StringChange> changes = stay();
    changes.set(
        5, new StringChange(SET.get(5), SET.get(5), OptionalDouble.of(2.7e-3), Reference.OPEN));
    StringForecast high = forecast(READ, changes).strings().get(5);
    StringForecast now = forecast(READ, stay()).strings().get(5);
    assertThat(high.saddleMove().value()).isGreaterThan(now.saddleMove().value() + 1e-3);
    assertThat(high.cents12IfLeft().value()).isGreaterThan(now.cents12IfLeft().value() + 3);
  }

  @Test
  void isSurerOfAStringWhoseCoreIsKnown() {
    List<StringChange> guessed = stay();
    guessed.set(5, change(5, wound(.049, -29)));
    List<StringChange> known = stay();
    StringSpec core =
        StringSpec.of(.049 * INCH, Construction.WOUND_NICKEL)
            .withCore(CoreShape.ROUND, .018 * INCH);
    known.set(5, change(5, new Stringing(core, note(-29), SCALE)));
    double wide = forecast(READ, guessed).strings().get(5).saddleMove().sd();
    double narrow = forecast(READ, known).strings().get(5).saddleMove().sd();
    assertThat(narrow).isLessThan(0.7 * wide);
  }

  @Test
  void answersWithoutAnyReadingOnlyLessSurely() {
    List<StringChange> changes = stay();
    changes.set(0, change(0, plain(.011, -5)));
    Figure read = forecast(READ, changes).strings().get(0).saddleMove();
    Figure unread = forecast(UNREAD, changes).strings().get(0).saddleMove();
    assertThat(unread.sd()).isGreaterThan(3 * read.sd());
    assertThat(unread.sd()).isLessThan(0.02);
    // a saddle expected where fret 12 is true need move only by what the gauge asks
    assertThat(unread.value()).isBetween(0.0, 1e-3);
  }

  @Test
  void movesEachNutEdgeOrTheWholeNut() {
    InstrumentForecast each = Forecaster.of(READ, stay(), Aim.NECK, NutFreedom.EACH).orElseThrow();
    InstrumentForecast whole =
        Forecaster.of(READ, stay(), Aim.NECK, NutFreedom.WHOLE).orElseThrow();
    assertThat(each.strings())
        .extracting(string -> string.nutMove().value())
        .doesNotHaveDuplicates();
    double there = whole.strings().get(0).nutMove().value() - READ.situation(0).lie().nutSetback();
    for (int i = 0; i < SET.size(); i++) {
      double own = whole.strings().get(i).nutMove().value() - READ.situation(i).lie().nutSetback();
      assertThat(own).isCloseTo(there, within(1e-9));
    }
    assertThat(forecast(READ, stay()).strings().get(3).nutMove()).isEqualTo(new Figure(0, 0));
  }

  /** The harmonic stands sharp of the octave, so that the fretted note must come up to it. */
  @Test
  void aimsAtTheHarmonicWhereAsked() {
    List<StringChange> changes = new ArrayList<>();
    for (Stringing string : SET) {
      changes.add(new StringChange(string, string, OptionalDouble.empty(), Reference.HARMONIC));
    }
    StringForecast harmonic = forecast(READ, changes).strings().get(2);
    StringForecast open = forecast(READ, stay()).strings().get(2);
    assertThat(harmonic.saddleMove().value()).isLessThan(open.saddleMove().value());
    assertThat(harmonic.cents12Now().value()).isLessThan(open.cents12Now().value());
  }

  @Test
  void refusesWhatItCannotForecast() {
    assertThatThrownBy(() -> Forecaster.of(READ, List.of(), Aim.OCTAVE, NutFreedom.FIXED))
        .isInstanceOf(IllegalArgumentException.class);
    List<StringChange> changes = stay();
    changes.set(0, change(0, new Stringing(spec(.150, Construction.PLAIN_STEEL), 5, SCALE)));
    assertThat(Forecaster.of(READ, changes, Aim.OCTAVE, NutFreedom.FIXED))
        .isInstanceOf(NotSolved.class);
  }

  private static InstrumentForecast forecast(NeckEstimate estimate, List<StringChange> changes) {
    return Forecaster.of(estimate, changes, Aim.OCTAVE, NutFreedom.FIXED).orElseThrow();
  }

  private static List<StringChange> stay() {
    List<StringChange> changes = new ArrayList<>();
    for (int i = 0; i < SET.size(); i++) {
      changes.add(change(i, SET.get(i)));
    }
    return changes;
  }

  private static StringChange change(int string, Stringing then) {
    return new StringChange(SET.get(string), then, OptionalDouble.empty(), Reference.OPEN);
  }

  /** Every string with the same cents at frets 1, 3, 5, 7 and 12, or unread. */
  private static NeckEstimate estimate(double... cents) {
    int[] frets = {1, 3, 5, 7, 12};
    List<StringHistory> strings = new ArrayList<>();
    for (Stringing string : SET) {
      List<FretReading> readings = new ArrayList<>();
      for (int i = 0; i < cents.length; i++) {
        readings.add(new FretReading(frets[i], cents[i], 0.3));
      }
      StringLie lie =
          StringLie.nominal(string.constants(), string.openHz(), string.scale(), HEIGHTS);
      strings.add(
          StringHistory.of(Occasion.first(lie, HeightSds.measured(), Reference.OPEN, readings)));
    }
    return NeckEstimator.estimate(new InstrumentEvidence(strings)).orElseThrow();
  }

  private static Stringing plain(double gauge, int semitones) {
    return new Stringing(spec(gauge, Construction.PLAIN_STEEL), note(semitones), SCALE);
  }

  private static Stringing wound(double gauge, int semitones) {
    return new Stringing(spec(gauge, Construction.WOUND_NICKEL), note(semitones), SCALE);
  }

  private static StringSpec spec(double gauge, Construction construction) {
    return StringSpec.of(gauge * INCH, construction);
  }

  private static double note(int semitones) {
    return EqualTemperament.frequency(semitones, 440);
  }
}
