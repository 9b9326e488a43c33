package sillet.desktop.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import javafx.application.Platform;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.testfx.util.WaitForAsyncUtils;
import sillet.desktop.drawing.Picture;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.store.engine.LogbookProblem;
import sillet.store.engine.ProblemKind;

class WorkThreadTest {
  private final List<Throwable> unexpected = Collections.synchronizedList(new ArrayList<>());
  private final List<Object> heard = Collections.synchronizedList(new ArrayList<>());
  private final WorkThread work = new WorkThread(unexpected::add);

  @BeforeAll
  static void start() throws TimeoutException {
    Picture.startToolkit();
  }

  @AfterEach
  void finish() {
    work.finish();
  }

  @Test
  void worksOffTheWindowsThreadAndAnswersOnIt() throws TimeoutException {
    run(() -> Platform.isFxApplicationThread());
    heardSoon(1);

    assertThat(heard).containsExactly(false);
  }

  @Test
  void doesOnePieceAfterTheOther() throws TimeoutException {
    for (int i = 0; i < 50; i++) {
      int number = i;
      run(() -> number);
    }
    heardSoon(50);

    assertThat(heard).isSortedAccordingTo((a, b) -> (Integer) a - (Integer) b);
  }

  @Test
  void saysWhatStandsInTheWay() throws TimeoutException {
    run(
        () -> {
          throw new LogbookProblem(ProblemKind.DISK, "there", null);
        });
    run(
        () -> {
          throw Rejection.of("number.none", "x");
        });
    heardSoon(2);

    assertThat(heard)
        .containsExactly(Message.of("problem.disk", "there"), Message.of("number.none", "x"));
    assertThat(unexpected).isEmpty();
  }

  @Test
  void showsWhatNobodyForesawAndTellsTheScreenToo() throws TimeoutException {
    IllegalStateException odd = new IllegalStateException("odd");
    run(
        () -> {
          throw odd;
        });
    heardSoon(1);

    assertThat(unexpected).containsExactly(odd);
    assertThat(heard).containsExactly(Message.of("shell.unexpected"));
  }

  @Test
  void finishesWhatWasAskedForButTakesNothingMore() throws Exception {
    CountDownLatch hold = new CountDownLatch(1);
    run(() -> hold.await(10, TimeUnit.SECONDS));
    run(() -> "asked before");
    work.finish();
    run(() -> "asked after");
    hold.countDown();
    heardSoon(3);

    assertThat(heard).containsExactly(Message.of("shell.closing"), true, "asked before");
  }

  private <T> void run(Callable<T> piece) {
    work.run(piece, heard::add, heard::add);
  }

  private void heardSoon(int count) throws TimeoutException {
    WaitForAsyncUtils.waitFor(10, TimeUnit.SECONDS, () -> heard.size() >= count);
  }
}
