package sillet.acoustics.neck;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.acoustics.tables.Row;
import sillet.acoustics.tables.Tables;

@DisplayName("three-term fit against a general least-squares library")
class GeneralLeastSquaresTest {
  /** Both sides state the same minimum of the same sum; what differs is rounding. */
  private static final double SAME = 1e-8;

  static List<Row> fits() {
    return Tables.read("scipy-three-terms.csv");
  }

  @ParameterizedTest(name = "string {0}")
  @MethodSource("fits")
  void findsTheSameMinimum(Row row) {
    int[] frets = IntStream.rangeClosed(1, 12).toArray();
    double[] cents =
        Tables.read("hjerrild-2019-frets.csv").stream()
            .mapToDouble(read -> read.number("string" + row.text("string")))
            .toArray();
    boolean equal = row.text("weights").equals("equal");
    double[] sds = IntStream.of(frets).mapToDouble(fret -> equal ? 1 : 0.5 + 0.1 * fret).toArray();
    CurveFit fit = CurveFit.of(frets, cents, sds).orElseThrow();
    assertThat(fit.nutHeight().cents()).isCloseTo(row.number("p"), within(SAME));
    assertThat(fit.offset().cents()).isCloseTo(row.number("q"), within(SAME));
    assertThat(fit.slope().cents()).isCloseTo(row.number("r"), within(SAME));
    assertThat(fit.nutHeight().sd()).isCloseTo(row.number("sd_p"), within(SAME));
    assertThat(fit.offset().sd()).isCloseTo(row.number("sd_q"), within(SAME));
    assertThat(fit.slope().sd()).isCloseTo(row.number("sd_r"), within(SAME));
    assertThat(fit.residualRms()).isCloseTo(row.number("rms"), within(SAME));
  }
}
