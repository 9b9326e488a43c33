package sillet.acoustics.estimate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.tables.Row;
import sillet.acoustics.tables.Tables;
import sillet.acoustics.wire.StringConstants;

/**
 * Two strings of one neck, nine frets read, one reading wild, against another program that shares
 * no line with this one and minimises by a general library; see the table's header.
 */
@DisplayName("the joint estimate against a general library [D]")
class IndependentEstimateTest {
  /** Cents. Both stop near the same optimum; this one when a step is a thousandth of an sd. */
  private static final double SAME_CENTS = 0.005;

  private static final NeckEstimate ESTIMATE = estimate();

  static List<Row> notes() {
    return Tables.read("scipy-neck-notes.csv");
  }

  static List<Row> figures() {
    return Tables.read("scipy-neck-figures.csv");
  }

  @ParameterizedTest(name = "string and fret {0}")
  @MethodSource("notes")
  void findsTheSameNotes(Row row) {
    Figure note = ESTIMATE.cents((int) row.number("string") - 1, (int) row.number("fret"));
    assertThat(note.value()).isCloseTo(row.number("cents"), within(SAME_CENTS));
    assertThat(note.sd()).isCloseTo(row.number("sd"), within(SAME_CENTS));
  }

  /** Millimetres, cents and a weight; the wild reading is that of string 1 at fret 7. */
  @Test
  void findsTheSamePlacesAndTheSameWildReading() {
    for (Row row : figures()) {
      Figure found = figure(row.text("figure"));
      assertThat(found.value())
          .as(row.text("figure"))
          .isCloseTo(row.number("value"), within(0.002));
      assertThat(found.sd()).as(row.text("figure")).isCloseTo(row.number("sd"), within(0.002));
    }
    assertThat(figures()).hasSize(5);
  }

  private static Figure figure(String name) {
    return switch (name) {
      case "saddle 1 mm" -> millimetres(ESTIMATE.saddleSetback(0));
      case "saddle 2 mm" -> millimetres(ESTIMATE.saddleSetback(1));
      case "nut mm" -> millimetres(ESTIMATE.nutOffset());
      case "straying cents" -> new Figure(ESTIMATE.strayCents(), 0);
      case "weight of the wild reading" -> new Figure(wildWeight(), 0);
      default -> throw new IllegalArgumentException(name);
    };
  }

  private static Figure millimetres(Figure metres) {
    return new Figure(1e3 * metres.value(), 1e3 * metres.sd());
  }

  private static double wildWeight() {
    Misfit wild =
        ESTIMATE.misfits().stream()
            .min((one, other) -> Double.compare(one.weight(), other.weight()))
            .orElseThrow();
    assertThat(wild.string()).isZero();
    assertThat(wild.fret()).isEqualTo(7);
    return wild.weight();
  }

  private static NeckEstimate estimate() {
    StringLie third =
        StringLie.nominal(
            new StringConstants(1.149542e-3, 29287.69, 3.412954e-4, 0.03),
            195.9977,
            0.648,
            new Clearances(1.6e-3, 0.42e-3, 0.2e-3));
    StringLie sixth =
        StringLie.nominal(
            new StringConstants(7.635858e-3, 32834.64, 4.289679e-4, 0.24),
            82.4069,
            0.648,
            new Clearances(1.9e-3, 0.5e-3, 0.2e-3));
    List<StringHistory> strings =
        List.of(
            history(third, 3.1, 2.6, 2.5, 1.9, 6.9, 1.0, 0.4, -1.6, -2.1),
            history(sixth, 2.6, 2.4, 1.4, 1.9, 1.2, 1.6, 1.1, 0.9, 1.5));
    return NeckEstimator.estimate(new InstrumentEvidence(strings)).orElseThrow();
  }

  private static StringHistory history(StringLie lie, double... cents) {
    int[] frets = {1, 2, 3, 5, 7, 9, 12, 15, 17};
    List<FretReading> readings = new ArrayList<>();
    for (int i = 0; i < frets.length; i++) {
      readings.add(new FretReading(frets[i], cents[i], 0.4));
    }
    return StringHistory.of(Occasion.first(lie, HeightSds.measured(), Reference.OPEN, readings));
  }
}
