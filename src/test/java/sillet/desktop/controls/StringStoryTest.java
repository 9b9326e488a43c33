package sillet.desktop.controls;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sillet.logbook.visits.VisitRecord;

class StringStoryTest {
  @Test
  void takesTheFirstPassAsReceivedAndTheLastAsLeft() {
    StringStory story =
        first(
            Visits.ticket(1)
                .read(1, 1, "5.0/4.8/5.1")
                .moved(1, 1, 1.8)
                .read(2, 1, "1.6")
                .moved(2, 1, 0.5)
                .read(3, 1, "0.2")
                .record());

    assertThat(story.received()).hasValue(5.0);
    assertThat(story.left()).hasValue(0.2);
    assertThat(story.newest()).hasValue(0.2);
    assertThat(story.movedSince()).isFalse();
  }

  @Test
  void hasNothingLeftAfterOnePass() {
    StringStory story = first(Visits.ticket(1).read(1, 1, "5.0").record());

    assertThat(story.left()).isEqualTo(OptionalDouble.empty());
    assertThat(story.newest()).hasValue(5.0);
  }

  @Test
  void takesTheNewerReadingOfTheSameNote() {
    StringStory story = first(Visits.ticket(1).read(1, 1, "5.0").read(1, 1, "4.0").record());

    assertThat(story.received()).hasValue(4.0);
  }

  @Test
  void dropsAReadingThatWasTakenBack() {
    StringStory story = first(Visits.ticket(1).read(1, 1, "5.0").read(1, 1, null).record());

    assertThat(story.received()).isEmpty();
  }

  @Test
  void countsFretTwelveAlone() {
    StringStory story = first(Visits.ticket(1).read(1, 1, 5, "5.0").record());

    assertThat(story.received()).isEmpty();
  }

  @Test
  void knowsThatItsSaddleWasMovedSince() {
    VisitRecord visit = Visits.ticket(1).read(1, 1, "5").read(1, 2, "3").moved(1, 1, 1.8).record();

    assertThat(StringStory.of(visit))
        .extracting(StringStory::movedSince)
        .containsExactly(true, false);
  }

  private static StringStory first(VisitRecord visit) {
    return StringStory.of(visit).get(0);
  }
}
