package sillet.acoustics.virtual;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.QRDecomposition;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.RealVector;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class VirtualStringTest {
  @Test
  void aFlexibleStringWithoutStretchIsTrueAtTheNominalPlace() {
    double[] none = new double[VirtualNeck.FRETS + 1];
    VirtualNeck neck = VirtualNeck.bent(0.648, 0, 14, none, none);
    Ends ends = new Ends(StringEnd.firm(0), StringEnd.firm(0), StringEnd.firm(0));
    VirtualString.Rest rest = new VirtualString.Rest(1e-9, 2e-9, 0, ends, 0, 0, 0);
    VirtualString string =
        new VirtualString(
            new VirtualWire(4e-4, 1e4, 1e-12),
            neck,
            rest,
            new Finger(0.3, 1e-9),
            VirtualString.Sound.plain(330));
    for (int fret = 1; fret <= 12; fret++) {
      assertThat(string.centsAgainstOpen(fret, 0, 0)).isCloseTo(0, within(1e-4));
    }
    // the length alone: 1200 log2((648 + 2)/(324 + 2)) - 1200 = -5.327 cents
    double length = 1200 * Math.log(650 / 326.0) / Math.log(2) - 1200;
    assertThat(string.centsAgainstOpen(12, 2e-3, 0)).isCloseTo(length, within(1e-3));
  }

  @Test
  void aNeckBendsToTheGivenDepth() {
    double[] none = new double[VirtualNeck.FRETS + 1];
    VirtualNeck neck = VirtualNeck.bent(0.648, 2e-4, 14, none, none);
    double deepest = 0;
    for (int fret = 1; fret <= VirtualNeck.FRETS; fret++) {
      deepest = Math.min(deepest, neck.y(fret));
    }
    assertThat(deepest).isCloseTo(-2e-4, within(2e-6));
    assertThat(neck.y(14)).isZero();
    assertThat(neck.x(12)).isCloseTo(0.324, within(1e-12));
  }

  @ParameterizedTest
  @EnumSource(Kind.class)
  void instrumentsBehaveLikeInstruments(Kind kind) {
    Workshop workshop = new Workshop(new Luck(5), 0);
    for (int i = 0; i < 5; i++) {
      VirtualInstrument instrument = workshop.build(kind);
      for (VirtualInstrument.Course course : instrument.strings()) {
        VirtualString string = course.string();
        double atZero = string.centsAgainstOpen(12, 0, 0);
        double back = string.centsAgainstOpen(12, 1e-3, 0);
        double plain = 1731.234 / instrument.neck().scale() * 1e-3;
        assertThat(atZero).isBetween(-2.0, 60.0);
        assertThat((atZero - back) / plain).isBetween(0.97, 1.12);
        assertThat(string.clearance(12)).isBetween(1e-3, 5e-3);
        assertThat(string.clearance(1)).isBetween(1e-4, 1e-3);
      }
    }
  }

  @Test
  void theSameSeedMakesTheSameInstrument() {
    double one = new Workshop(new Luck(9), 0).build(Kind.BASS).strings().get(2).string().rms(0, 0);
    double two = new Workshop(new Luck(9), 0).build(Kind.BASS).strings().get(2).string().rms(0, 0);
    assertThat(one).isEqualTo(two);
  }

  /**
   * J. M. Hjerrild, M. G. Christensen, ICASSP 2019, open data of a flat-top guitar [S]: rms of the
   * notes at frets 1 to 12 about a smooth curve of three terms 1.32 1.18 0.76 0.60 0.33 0.50 cents
   * [D], 0.78 in the mean. Part of that is the scatter of their readings, so the virtual guitars
   * may stray less, not more.
   */
  @Test
  void aTopMakesNotesStrayAsMeasuredOnes() {
    Workshop workshop = new Workshop(new Luck(21), 0);
    double sum = 0;
    int count = 0;
    for (int i = 0; i < 40; i++) {
      for (VirtualInstrument.Course course : workshop.build(Kind.ACOUSTIC).strings()) {
        sum += roughness(course.string().curve(3e-3, 0));
        count++;
      }
    }
    assertThat(sum / count).isBetween(0.2, 0.8);
  }

  private static double roughness(double[] cents) {
    double[][] shapes = new double[cents.length][];
    for (int i = 0; i < cents.length; i++) {
      double rise = Math.pow(2, (i + 1) / 12.0) - 1;
      shapes[i] = new double[] {1 / rise, 1, rise};
    }
    RealMatrix matrix = MatrixUtils.createRealMatrix(shapes);
    RealVector notes = MatrixUtils.createRealVector(cents);
    RealVector smooth = matrix.operate(new QRDecomposition(matrix).getSolver().solve(notes));
    return notes.subtract(smooth).getNorm() / Math.sqrt(cents.length);
  }
}
