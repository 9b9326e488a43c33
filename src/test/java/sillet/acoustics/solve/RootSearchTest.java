package sillet.acoustics.solve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;

@DisplayName("Search for a root")
class RootSearchTest {

  private final RootSearch search = new RootSearch(1e-12, 60);

  @Test
  void findsTheRootOfACosine() {
    assertThat(search.find(Math::cos, 1, 2).orElseThrow()).isCloseTo(Math.PI / 2, within(1e-12));
  }

  @Test
  void needsFewEvaluationsForASmoothCurve() {
    AtomicInteger count = new AtomicInteger();
    search
        .find(
            x -> {
              count.incrementAndGet();
              return Math.exp(x) - 2;
            },
            -1,
            3)
        .orElseThrow();
    assertThat(count.get()).isBetween(3, 12);
  }

  @Test
  void takesAnEndThatIsARoot() {
    assertThat(search.find(x -> x, 0, 1).orElseThrow()).isZero();
    assertThat(search.find(x -> x - 1, 0, 1).orElseThrow()).isEqualTo(1.0);
  }

  @Test
  void saysThatTheSignDoesNotChange() {
    assertThat(because(search.find(x -> x * x + 1, -1, 1))).contains("no change of sign");
  }

  @Test
  void stopsAtAValueThatIsNoNumber() {
    AtomicInteger count = new AtomicInteger();
    Outcome<Double> outcome =
        search.find(
            x -> {
              count.incrementAndGet();
              return x > 0.1 && x < 0.9 ? Double.NaN : x - 0.5;
            },
            0,
            1);
    assertThat(because(outcome)).contains("no number at");
    assertThat(count.get()).isLessThan(10);
  }

  @Test
  void stopsAtAnInfiniteValue() {
    assertThat(because(search.find(x -> 1 / x, 0, 1))).contains("no number at 0.0");
  }

  @Test
  void stopsAtTheAllowedNumberOfEvaluations() {
    AtomicInteger count = new AtomicInteger();
    Outcome<Double> outcome =
        new RootSearch(1e-15, 5)
            .find(
                x -> {
                  count.incrementAndGet();
                  return Math.cbrt(x - 0.123456);
                },
                -1,
                2);
    assertThat(because(outcome)).contains("number of evaluations");
    assertThat(count.get()).isEqualTo(5);
  }

  @Test
  void refusesABracketThatIsNone() {
    assertThatThrownBy(() -> search.find(x -> x, 1, 1))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> search.find(x -> x, Double.NaN, 1))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> search.find(x -> x, 0, Double.POSITIVE_INFINITY))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void refusesAToleranceOrALimitThatCannotWork() {
    assertThatThrownBy(() -> new RootSearch(-1e-9, 100))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new RootSearch(1e-9, 2)).isInstanceOf(IllegalArgumentException.class);
  }

  private static String because(Outcome<Double> outcome) {
    assertThat(outcome).isInstanceOf(NotSolved.class);
    return ((NotSolved<Double>) outcome).because();
  }
}
