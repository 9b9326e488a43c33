package sillet.desktop.visit;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.function.Consumer;
import org.junit.jupiter.api.Test;
import sillet.desktop.controls.Background;
import sillet.desktop.controls.SaveSign;
import sillet.logbook.actions.Action;
import sillet.logbook.actions.LogWork;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.logbook.visits.VisitRecord;
import sillet.logbook.visits.WorkLine;

class SavesTest {
  private final VisitRecord record = TestVisits.six(List.of());
  private final List<Action> tried = new ArrayList<>();
  private final List<String> signs = new ArrayList<>();
  private final Deque<Runnable> work = new ArrayDeque<>();
  private boolean diskFull;
  private boolean unreadable;

  private final Background later =
      new Background() {
        @Override
        public <T> void run(Callable<T> piece, Consumer<? super T> done, Consumer<Message> failed) {
          work.add(() -> new AtOnce().run(piece, done, failed));
        }
      };

  private final SaveSign sign =
      new SaveSign() {
        @Override
        public void saved(Instant at) {
          signs.add("saved");
        }

        @Override
        public void draft(Instant since) {
          signs.add("draft");
        }

        @Override
        public void notSaved(Message why) {
          signs.add("not saved " + why.key());
        }
      };

  private final Saves saves =
      new Saves(
          later,
          sign,
          Clock.fixed(TestDesk.NOW, ZoneOffset.UTC),
          this::perform,
          this::read,
          kept -> {});

  private void perform(Action action) {
    tried.add(action);
    if (diskFull) {
      throw Rejection.of("visit.no-such", "0");
    }
  }

  private VisitRecord read() {
    if (unreadable) {
      throw Rejection.of("visit.no-such", "1");
    }
    return record;
  }

  private Action work(String text) {
    return new LogWork(record.visit().id(), new WorkLine(TestDesk.NOW, "Noor", text));
  }

  private void doAll() {
    while (!work.isEmpty()) {
      work.remove().run();
    }
  }

  @Test
  void keepsActionsInTheirOrderOneAfterTheOther() {
    saves.keep(work("one"));
    saves.keep(work("two"));
    assertThat(work).as("handed on at once, so that closing waits behind both").hasSize(2);
    assertThat(saves.pending()).isTrue();
    doAll();
    assertThat(tried).containsExactly(work("one"), work("two"));
    assertThat(signs).containsExactly("saved", "saved");
    assertThat(saves.pending()).isFalse();
  }

  @Test
  void showsAFailureAndKeepsTheActionForTheNextTry() {
    diskFull = true;
    saves.keep(work("one"));
    doAll();
    assertThat(signs).containsExactly("not saved visit.no-such");
    assertThat(saves.pending()).isTrue();
    assertThat(saves.failure()).isNotNull();
    diskFull = false;
    saves.keep(work("two"));
    doAll();
    assertThat(tried).containsExactly(work("one"), work("one"), work("two"));
    assertThat(signs).endsWith("saved", "saved");
    assertThat(saves.failure()).isNull();
  }

  @Test
  void triesAgainWhenAsked() {
    diskFull = true;
    saves.keep(work("one"));
    doAll();
    diskFull = false;
    saves.tryAgain();
    doAll();
    assertThat(saves.pending()).isFalse();
    assertThat(signs).endsWith("saved");
  }

  @Test
  void letsNothingOvertakeWhatFailed() {
    diskFull = true;
    saves.keep(work("one"));
    saves.keep(work("two"));
    doAll();
    assertThat(tried).containsExactly(work("one"));
    diskFull = false;
    saves.tryAgain();
    doAll();
    assertThat(tried).containsExactly(work("one"), work("one"), work("two"));
    assertThat(saves.pending()).isFalse();
  }

  @Test
  void doesNothingTwiceWhenOnlyReadingAnewFails() {
    unreadable = true;
    saves.keep(work("one"));
    doAll();
    assertThat(saves.pending()).isFalse();
    assertThat(signs).containsExactly("saved");
    saves.tryAgain();
    doAll();
    assertThat(tried).containsExactly(work("one"));
  }
}
