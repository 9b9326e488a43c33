package sillet.desktop.shell;

import java.time.Clock;
import java.time.Instant;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import java.util.Optional;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import sillet.desktop.controls.SaveSign;
import sillet.logbook.text.Message;

/** What the square in the top line says. */
final class SaveSignModel implements SaveSign {
  private static final DateTimeFormatter TIME = DateTimeFormatter.ofPattern("HH:mm", Locale.ROOT);

  /** Full, half-filled and crossed square; nothing before the first save. */
  enum Shape {
    NOTHING,
    FULL,
    HALF,
    CROSSED
  }

  /**
   * Shape, words and reason.
   *
   * @param shape the square
   * @param words what stands beside it
   * @param why why it is not saved
   */
  record Sign(Shape shape, Message words, Optional<Message> why) {}

  private static final Sign NOTHING =
      new Sign(Shape.NOTHING, Message.of("shell.nothing-to-save"), Optional.empty());

  private final ReadOnlyObjectWrapper<Sign> sign =
      new ReadOnlyObjectWrapper<>(this, "sign", NOTHING);
  private final Clock clock;

  SaveSignModel(Clock clock) {
    this.clock = clock;
  }

  @Override
  public void saved(Instant at) {
    sign.set(new Sign(Shape.FULL, Message.of("shell.saved", time(at)), Optional.empty()));
  }

  @Override
  public void draft(Instant since) {
    sign.set(new Sign(Shape.HALF, Message.of("shell.draft", time(since)), Optional.empty()));
  }

  @Override
  public void notSaved(Message why) {
    sign.set(new Sign(Shape.CROSSED, Message.of("shell.not-saved"), Optional.of(why)));
  }

  /** Another logbook is open: nothing of it was saved yet. */
  void clear() {
    sign.set(NOTHING);
  }

  ReadOnlyObjectProperty<Sign> signProperty() {
    return sign.getReadOnlyProperty();
  }

  private String time(Instant at) {
    return TIME.format(at.atZone(clock.getZone()));
  }
}
