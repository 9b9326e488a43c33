package sillet.acoustics.moves;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.SortedSet;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;
import sillet.acoustics.wire.StringConstants;

class AnyReadingsTest {
  @Test
  void trustsAKnownStringMore() {
    assertThat(share(0)).isCloseTo(0.005, within(1e-12));
    assertThat(share(0.03)).isLessThan(0.0052);
    assertThat(share(0.24)).isBetween(0.008, 0.01);
    assertThat(share(100)).isEqualTo(1);
  }

  /** Any readings a sheet may hold, in any number: an answer in order, or a reason, always. */
  @Test
  void alwaysComesBack() {
    Random random = new Random(17);
    List<StringLie> lies = List.of(Strings.thin(), Strings.thick(), Strings.wound());
    int solved = 0;
    int rounds = 1500;
    for (int round = 0; round < rounds; round++) {
      StringLie lie = lies.get(random.nextInt(lies.size()));
      Aim aim = random.nextBoolean() ? Aim.OCTAVE : Aim.NECK;
      Reference against = random.nextBoolean() ? Reference.OPEN : Reference.HARMONIC;
      MoveTask task = new MoveTask(lie, anyReadings(random), against, aim, random.nextBoolean());
      Outcome<MoveEstimate> outcome = task.solve();
      if (outcome instanceof Solved<MoveEstimate> answer) {
        solved++;
        MoveEstimate estimate = answer.value();
        assertThat(estimate.saddleLow()).isLessThan(estimate.saddleMove());
        assertThat(estimate.saddleMove()).isLessThan(estimate.saddleHigh());
        assertThat(estimate.centsPerMetre()).isNegative();
        assertThat(estimate.rmsAfter()).isFinite();
      }
    }
    assertThat(solved).isGreaterThan(rounds * 99 / 100);
  }

  private static List<FretReading> anyReadings(Random random) {
    SortedSet<Integer> frets = new TreeSet<>();
    int count = random.nextInt(13);
    while (frets.size() < count) {
      frets.add(1 + random.nextInt(24));
    }
    double scatter = random.nextBoolean() ? 5 : 60;
    List<FretReading> readings = new ArrayList<>();
    for (int fret : frets) {
      double cents = Math.max(-100, Math.min(100, scatter * random.nextGaussian()));
      readings.add(new FretReading(fret, cents, 0.05 + random.nextDouble()));
    }
    return readings;
  }

  private static double share(double relativeSd) {
    return ModelShare.of(new StringConstants(1e-3, 1e4, 1e-4, relativeSd));
  }
}
