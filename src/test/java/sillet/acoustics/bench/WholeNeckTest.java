package sillet.acoustics.bench;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import sillet.acoustics.moves.NutFreedom;
import sillet.acoustics.virtual.Kind;
import sillet.acoustics.virtual.Mishap;

/**
 * A small run of {@link WholeNeckTable} against looser bars, so that no change spoils it unnoticed.
 */
class WholeNeckTest {
  private static Score score;

  @BeforeAll
  static void moveOnce() {
    List<Task> moves = List.of(new OctaveTask(), new NeckTask(), new ForecastTask());
    score = new WholeNeckRun(40, 1, moves).run();
    score.addAll(new WholeNeckRun(20, 1, List.of(new FindingTask())).run());
  }

  @Test
  void triesEnoughStringsOfEveryKind() {
    assertThat(score.of(OctaveTask.MODEL).size()).isGreaterThanOrEqualTo(200);
    for (Kind kind : Kind.values()) {
      assertThat(score.of(OctaveTask.MODEL, kind).size()).as(kind.name()).isGreaterThan(35);
    }
  }

  @Test
  void leavesFretTwelveTrue() {
    for (Row row : List.of(OctaveTask.MODEL, OctaveTask.TWO_PASSES, OctaveTask.RAMP)) {
      assertThat(score.of(row).median()).as(row.way()).isLessThanOrEqualTo(0.10);
      assertThat(score.of(row).ninetyFifth()).as(row.way()).isLessThanOrEqualTo(0.30);
      assertThat(score.of(row).coverage()).as(row.way()).isBetween(0.92, 0.99);
    }
    for (Kind kind : Kind.values()) {
      Tally own = score.of(OctaveTask.MODEL, kind);
      assertThat(own.ninetyFifth()).as(kind.name()).isLessThanOrEqualTo(0.30);
      assertThat(own.coverage()).as(kind.name()).isBetween(0.88, 1.0);
    }
  }

  @Test
  void staysTrueOverLongMoves() {
    assertThat(score.of(OctaveTask.FAR).ninetyFifth()).isLessThanOrEqualTo(0.30);
    assertThat(score.of(OctaveTask.FAR).coverage()).isBetween(0.91, 0.99);
    assertThat(score.of(OctaveTask.FAR_RULE).ninetyFifth()).isGreaterThan(0.45);
    assertThat(score.of(OctaveTask.RULE).coverage()).isLessThan(0.92);
  }

  @Test
  void aSecondPassGoesAsPredicted() {
    assertThat(score.of(OctaveTask.STRANGE).share()).isLessThan(0.01);
  }

  @Test
  void holdsTheBestPlaceWhereFretTwelveWasNotRead() {
    assertThat(score.of(OctaveTask.UNREAD).coverage()).isGreaterThan(0.90);
    assertThat(score.of(OctaveTask.UNREAD).width())
        .isGreaterThan(5 * score.of(OctaveTask.MODEL).width());
  }

  @Test
  void comesNearTheBestPlacesForTheNeck() {
    neck(NutFreedom.FIXED, 1.02);
    neck(NutFreedom.EACH, 1.23);
    neck(NutFreedom.WHOLE, 1.08);
    assertThat(score.of(NeckTask.row(NutFreedom.FIXED, NeckTask.RULE)).ratio()).isGreaterThan(1.08);
    assertThat(score.of(NeckTask.row(NutFreedom.EACH, NeckTask.RULE)).ratio()).isGreaterThan(3);
  }

  @Test
  void namesFaultsAndLeavesSoundStringsAlone() {
    for (Mishap mishap : Mishap.values()) {
      Tally tally = score.of(FindingTask.row(true, FindingTask.name(mishap)));
      assertThat(tally.size()).isEqualTo(20);
      assertThat(tally.share()).as(mishap.name()).isGreaterThanOrEqualTo(0.60);
    }
    assertThat(score.of(FindingTask.row(true, FindingTask.CLEAN)).share()).isLessThan(0.12);
    assertThat(score.of(FindingTask.row(true, FindingTask.BESIDE)).share()).isLessThan(0.10);
  }

  @Test
  void forecastsWhereSaddlesWillHaveToStand() {
    Tally tally = score.of(ForecastTask.MEASURED);
    assertThat(tally.median()).isLessThanOrEqualTo(1.6);
    assertThat(tally.ninetyFifth()).isLessThanOrEqualTo(10);
    assertThat(tally.coverage()).isBetween(0.88, 0.995);
    assertThat(score.of(ForecastTask.UNREAD).coverage()).isGreaterThan(0.88);
  }

  private static void neck(NutFreedom nut, double atMost) {
    Tally tally = score.of(NeckTask.row(nut, NeckTask.MODEL));
    assertThat(tally.ratio()).as(nut.name()).isLessThanOrEqualTo(atMost);
    assertThat(tally.coverage()).as(nut.name()).isBetween(0.90, 0.995);
  }
}
