package sillet.acoustics.estimate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;

class EvidenceTest {
  private static final StringLie LIE = Guitars.strings().get(0);

  @Test
  void findsAReadingByItsFret() {
    FretReading five = new FretReading(5, 1, 0.5);
    Occasion occasion = Guitars.occasion(LIE, List.of(new FretReading(12, 2, 0.5), five));

    assertThat(occasion.at(5)).isEqualTo(five);
    assertThat(occasion.at(7)).isNull();
  }

  @Test
  void refusesAFretReadTwice() {
    assertThatThrownBy(
            () ->
                Guitars.occasion(
                    LIE, List.of(new FretReading(5, 1, 0.5), new FretReading(5, 2, 0.5))))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("fret 5");
  }

  @Test
  void refusesOccasionsOutOfOrderAndNone() {
    Occasion first = Guitars.occasion(LIE, List.of());
    Occasion second = Guitars.later(first, 1, OptionalDouble.empty(), List.of());
    assertThat(new StringHistory(List.of(first, second)).now()).isEqualTo(second);
    assertThatThrownBy(() -> new StringHistory(List.of(second, first)))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new StringHistory(List.of()))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new InstrumentEvidence(List.of()))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void refusesFiguresThatAreNoNumbers() {
    assertThatThrownBy(() -> new Figure(Double.NaN, 1))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new Figure(1, -1)).isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new HeightSds(0, 1e-5, 1e-5))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> FretPlaces.of(0, Double.NaN))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
