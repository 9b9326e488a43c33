package sillet.acoustics.moves;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.acoustics.estimate.HeightSds;
import sillet.acoustics.estimate.InstrumentEvidence;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.NeckEstimator;
import sillet.acoustics.estimate.Occasion;
import sillet.acoustics.estimate.StringHistory;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;

class StraightSaddleTest {
  @Test
  void twoStringsEachGetTheirOwnBestPlace() {
    NeckEstimate estimate = read(5, -2);
    StraightSaddleMove line = StraightSaddle.solve(estimate, Aim.NECK).orElseThrow();
    List<MoveEstimate> each = MoveSolver.solve(estimate, Aim.NECK, NutFreedom.FIXED).orElseThrow();

    assertThat(line.first()).isCloseTo(each.get(0).saddleMove(), within(1e-7));
    assertThat(line.last()).isCloseTo(each.get(1).saddleMove(), within(1e-7));
  }

  @Test
  void aLineLeavesWhatAStringInTheMiddleNeeds() {
    NeckEstimate estimate = read(5, 0, 5);
    StraightSaddleMove line = StraightSaddle.solve(estimate, Aim.OCTAVE).orElseThrow();

    double middle = line.strings().get(1).saddleMove();
    assertThat(middle).isCloseTo((line.first() + line.last()) / 2, within(1e-12));
    // least squares of a level line through 5 0 5: about 3.33 cents are taken from each
    assertThat(line.strings().get(0).cents12After()).isCloseTo(5 - 10 / 3.0, within(0.1));
    assertThat(line.strings().get(1).cents12After()).isCloseTo(-10 / 3.0, within(0.1));
  }

  @Test
  void saysWhatGivenEndsLeave() {
    NeckEstimate estimate = read(5, 0, 5);
    StraightSaddleMove given = StraightSaddle.given(estimate, 1e-3, 3e-3).orElseThrow();

    assertThat(given.strings().get(1).saddleMove()).isCloseTo(2e-3, within(1e-12));
    assertThat(given.strings().get(0).cents12After()).isCloseTo(5 - 2.7, within(0.1));
    assertThatThrownBy(() -> StraightSaddle.given(estimate, Double.NaN, 0))
        .isInstanceOf(IllegalArgumentException.class);
  }

  private static NeckEstimate read(double... octaves) {
    List<StringLie> lies = List.of(Strings.thin(), Strings.thick(), Strings.wound());
    List<StringHistory> strings = new ArrayList<>();
    for (int i = 0; i < octaves.length; i++) {
      List<FretReading> readings = List.of(new FretReading(12, octaves[i], 0.1));
      strings.add(
          StringHistory.of(
              Occasion.first(lies.get(i), HeightSds.measured(), Reference.OPEN, readings)));
    }
    return NeckEstimator.estimate(new InstrumentEvidence(strings)).orElseThrow();
  }
}
