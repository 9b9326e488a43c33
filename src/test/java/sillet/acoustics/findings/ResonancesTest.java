package sillet.acoustics.findings;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.virtual.Kind;

class ResonancesTest {
  private static final NeckEstimate GUITAR =
      new Readout(Readout.build(Kind.ACOUSTIC, 1), 1).estimate(1, 5, 12);

  /** A2 is the open fifth string and the fifth fret of the sixth (strings counted from 0). */
  @Test
  void joinsTheSamePitchOnTwoStrings() {
    NeckCase notes = NeckCases.of(GUITAR);
    int sixthAtFive = row(notes, 5, 5);
    int fifthAtTwelve = row(notes, 4, 12);
    List<double[]> shapes = new Resonances(GUITAR, notes.rows()).shapes();
    double[] pitch = shapes.stream().filter(one -> one[sixthAtFive] > 0).findFirst().orElseThrow();
    assertThat(pitch[fifthAtTwelve]).isNegative();
    assertThat(pitch[row(notes, 4, 1)]).isEqualTo(pitch[fifthAtTwelve]);
    assertThat(pitch[row(notes, 0, 1)]).isZero();
  }

  @Test
  void hasOneShapeForEachPitch() {
    NeckCase notes = NeckCases.of(GUITAR);
    Resonances resonances = new Resonances(GUITAR, notes.rows());
    assertThat(resonances.shapes()).hasSameSizeAs(resonances.low()).hasSizeBetween(15, 24);
    assertThat(resonances.low().get(0)).isTrue();
    assertThat(resonances.low().get(resonances.low().size() - 1)).isFalse();
  }

  private static int row(NeckCase notes, int string, int fret) {
    for (int i = 0; i < notes.rows().size(); i++) {
      NeckCase.Row row = notes.rows().get(i);
      if (row.string() == string && row.fret() == fret) {
        return i;
      }
    }
    throw new IllegalArgumentException("not read: " + string + ", " + fret);
  }
}
