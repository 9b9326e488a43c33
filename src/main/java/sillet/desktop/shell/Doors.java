package sillet.desktop.shell;

import java.nio.file.Path;
import java.time.Clock;
import java.time.LocalDate;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Background;
import sillet.desktop.start.Ways;
import sillet.logbook.shop.Shop;
import sillet.logbook.text.Message;
import sillet.store.engine.LogbookProblem;
import sillet.store.place.LogbookPlace;

/** Opens and closes logbooks, one at a time. Whatever is open is closed before another opens. */
final class Doors implements Ways {
  /** Who is told what came of it, on the window's thread. */
  interface House {
    /** A logbook is open. */
    void enter(OpenLogbook open);

    /** None is there: a first start. */
    void start();

    /** One cannot be opened. */
    void refused(LogbookProblem problem);

    /** Work is under way, or over. */
    void busy(boolean under);

    /** Opening broke off in a way nobody foresaw, or what was open could not be closed. */
    void broken(Message what);
  }

  private final Logbooks logbooks;
  private final Background background;
  private final Clock clock;
  private final House house;
  private @Nullable OpenLogbook open;

  Doors(Logbooks logbooks, Background background, Clock clock, House house) {
    this.logbooks = logbooks;
    this.background = background;
    this.clock = clock;
    this.house = house;
  }

  @Override
  public void begin(Shop shop) {
    open(() -> Optional.of(logbooks.begin(shop)));
  }

  @Override
  public void demo() {
    open(() -> Optional.of(logbooks.demo(LocalDate.now(clock))));
  }

  @Override
  public void open(Path file) {
    open(() -> logbooks.open(new LogbookPlace(file)));
  }

  @Override
  public void again() {
    open(() -> logbooks.find(logbooks.own()));
  }

  /** Closes what is open, if anything is. */
  void close(Runnable then, Consumer<Message> failed) {
    OpenLogbook before = takeOpen();
    background.run(() -> closed(before), closed -> then.run(), failed);
  }

  private void open(Supplier<Optional<OpenLogbook>> opener) {
    OpenLogbook before = takeOpen();
    house.busy(true);
    background.run(
        () -> {
          closed(before);
          return attempt(opener);
        },
        this::opened,
        why -> {
          house.busy(false);
          house.broken(why);
        });
  }

  private void opened(Opening opening) {
    house.busy(false);
    if (opening instanceof Opening.Opened opened) {
      open = opened.open();
      house.enter(opened.open());
    } else if (opening instanceof Opening.Refused refused) {
      house.refused(refused.problem());
    } else {
      house.start();
    }
  }

  private static Opening attempt(Supplier<Optional<OpenLogbook>> opener) {
    try {
      Optional<OpenLogbook> found = opener.get();
      return found.isPresent() ? new Opening.Opened(found.get()) : new Opening.Nothing();
    } catch (LogbookProblem problem) {
      return new Opening.Refused(problem);
    }
  }

  private static boolean closed(@Nullable OpenLogbook before) {
    if (before != null) {
      before.logbook().close();
    }
    return true;
  }

  private @Nullable OpenLogbook takeOpen() {
    OpenLogbook before = open;
    open = null;
    return before;
  }
}
