package sillet.acoustics.estimate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.wire.Construction;
import sillet.acoustics.wire.StringConstants;

/** Behaviour only: every reading is made here, no source needed. */
class NeckEstimatorTest {

  @Test
  void findsNotesBetterThanTheyWereRead() {
    List<Occasion> strings = Guitars.readThrough(0);
    NeckEstimate estimate = Guitars.estimate(strings);

    for (int string = 0; string < strings.size(); string++) {
      for (FretReading reading : strings.get(string).readings()) {
        Figure note = estimate.cents(string, reading.fret());
        assertThat(note.value()).isCloseTo(reading.cents(), within(0.45));
        assertThat(note.sd()).isLessThan(0.9 * Guitars.SD);
      }
      assertThat(estimate.cents(string, 6).sd()).isLessThan(Guitars.SD);
    }
  }

  @Test
  void aNutOutOfPlaceIsSeenOnAllStringsTogether() {
    // 0.5 mm too far from the bridge: 1731.23 x 0.5/648 = 1.34 cents sharp at every fret
    NeckEstimate all = Guitars.estimate(Guitars.readThrough(1.34));
    NeckEstimate one = Guitars.estimate(Guitars.readThrough(1.34).subList(0, 1));

    assertThat(all.nutOffset().value()).isBetween(0.2e-3, 0.55e-3);
    assertThat(all.nutOffset().sd()).isLessThan(0.95 * one.nutOffset().sd());
  }

  @Test
  void aWildReadingIsNamedAndDoesNotDrag() {
    List<Occasion> clean = Guitars.readThrough(0);
    for (int fret : new int[] {1, 7, 12}) {
      List<Occasion> wild = new ArrayList<>(clean);
      wild.set(
          1,
          Guitars.occasion(clean.get(1).lie(), Guitars.changed(clean.get(1).readings(), fret, 20)));
      NeckEstimate before = Guitars.estimate(clean);
      NeckEstimate after = Guitars.estimate(wild);

      for (int note = 1; note <= 12; note++) {
        assertThat(after.cents(1, note).value())
            .as("note at fret %d, wild at %d", note, fret)
            .isCloseTo(before.cents(1, note).value(), within(0.6));
        assertThat(after.cents(0, note).value())
            .isCloseTo(before.cents(0, note).value(), within(0.2));
      }
      for (Misfit misfit : after.misfits()) {
        boolean named = misfit.string() == 1 && misfit.fret() == fret;
        assertThat(misfit.weight() < 0.05).as(misfit.toString()).isEqualTo(named);
      }
      assertThat(after.cents(1, fret).sd()).isGreaterThan(before.cents(1, fret).sd());
    }
  }

  @Test
  void aMisplacedFretIsSeenOnAllStringsAndNotSwallowed() {
    // 0.4 mm toward the bridge at fret 5: 1731.23 x 0.4/485.5 = 1.43 cents sharp
    List<Occasion> strings =
        Guitars.readThrough(0).stream()
            .map(one -> Guitars.occasion(one.lie(), Guitars.changed(one.readings(), 5, 1.43)))
            .toList();
    NeckEstimate estimate = Guitars.estimate(strings);

    assertThat(estimate.fretPlace(5).value()).isGreaterThan(1.0e-5);
    assertThat(estimate.misfits().stream().filter(one -> one.fret() == 5))
        .allMatch(one -> one.residual() > 0.4);
    assertThat(Math.abs(estimate.fretPlace(9).value())).isLessThan(1.0e-5);
  }

  @Test
  void aSecondPassAfterAKnownMoveMakesItSurer() {
    StringLie lie = Guitars.strings().get(1);
    Occasion first = Guitars.occasion(lie, Guitars.readings(lie, 1e-3, 0));
    List<FretReading> again = Guitars.readings(lie, 2e-3, 0);
    Occasion known = Guitars.later(first, 1, OptionalDouble.of(1e-3), again);
    Occasion unknown = Guitars.later(first, 1, OptionalDouble.empty(), again);

    Figure once = note12(new StringHistory(List.of(Guitars.occasion(lie, again))));
    Figure free = note12(new StringHistory(List.of(first, unknown)));
    Figure tied = note12(new StringHistory(List.of(first, known)));

    assertThat(tied.sd()).isLessThan(0.9 * once.sd());
    assertThat(tied.sd()).isLessThan(free.sd());
    assertThat(free.sd()).isLessThanOrEqualTo(once.sd() * 1.01);
    assertThat(tied.value()).isCloseTo(once.value(), within(0.1));
  }

  @Test
  void aStringTeachesLittleOfTheNextInItsPlaceAndMuchOfItself() {
    StringLie lie = Guitars.strings().get(2);
    Occasion first = Guitars.occasion(lie, Guitars.readings(lie, 1e-3, 0));
    Occasion same = Guitars.later(first, 1, OptionalDouble.empty(), List.of());
    Occasion other = Guitars.later(first, 2, OptionalDouble.empty(), List.of());

    double alone = stiffness(List.of(Guitars.occasion(lie, List.of())));
    double ofTheSame = stiffness(List.of(first, same));
    double ofAnother = stiffness(List.of(first, other));

    assertThat(ofTheSame).isLessThan(ofAnother);
    assertThat(ofAnother).isLessThan(alone);
  }

  @Test
  void whatWasNotMeasuredOrReadWidens() {
    StringLie lie = Guitars.strings().get(0);
    List<FretReading> readings = Guitars.readings(lie, 1e-3, 0).subList(3, 6);
    Occasion guessed =
        Occasion.first(lie, HeightSds.unknown(Construction.PLAIN_STEEL), Reference.OPEN, readings);

    double measured = Guitars.estimate(List.of(Guitars.occasion(lie, readings))).cents(0, 1).sd();
    double unmeasured = Guitars.estimate(List.of(guessed)).cents(0, 1).sd();
    Figure unread = Guitars.estimate(List.of(Guitars.occasion(lie, List.of()))).cents(0, 12);

    assertThat(unmeasured).isGreaterThan(1.05 * measured);
    assertThat(unread.sd()).isBetween(9.0, 12.0);
    assertThat(unread.value()).isCloseTo(0, within(0.01));
  }

  @Test
  void twoReadingsThatCannotBothBeLeaveAWideInterval() {
    StringLie lie = Guitars.strings().get(0);
    List<FretReading> torn = List.of(new FretReading(5, 40, 0.5), new FretReading(7, -40, 0.5));
    NeckEstimate estimate = Guitars.estimate(List.of(Guitars.occasion(lie, torn)));

    assertThat(estimate.cents(0, 12).sd()).isGreaterThan(5);
    assertThat(estimate.misfits()).anyMatch(misfit -> misfit.weight() < 0.05);
  }

  @Test
  void doesNotSolveAStringThatNoTensionBringsToPitch() {
    StringLie rod = Guitars.lie(new StringConstants(1e-3, 1e5, 1e3, 0), 30);
    InstrumentEvidence evidence =
        new InstrumentEvidence(List.of(StringHistory.of(Guitars.occasion(rod, List.of()))));

    assertThat(NeckEstimator.estimate(evidence)).isInstanceOf(NotSolved.class);
  }

  @Test
  void carriesWhatIsNotKnownIntoAnyFigure() {
    NeckEstimate estimate = Guitars.estimate(Guitars.readThrough(0));

    Figure curve = estimate.figure(1, situation -> situation.cents(12));
    Figure note = estimate.cents(1, 12);
    assertThat(curve.value()).isCloseTo(note.value(), within(0.3));
    assertThat(curve.sd()).isBetween(0.5 * note.sd(), 1.5 * note.sd());
    assertThat(estimate.figure(1, situation -> 7).sd()).isZero();
    assertThat(estimate.gapAtFirst(1).value()).isCloseTo(0.45e-3, within(0.05e-3));
    assertThat(estimate.gapAtFirst(1).sd()).isLessThanOrEqualTo(0.025e-3);
  }

  private static Figure note12(StringHistory history) {
    return Guitars.histories(List.of(history)).cents(0, 12);
  }

  private static double stiffness(List<Occasion> occasions) {
    return Guitars.histories(List.of(new StringHistory(occasions))).stiffnessFactor(0).sd();
  }
}
