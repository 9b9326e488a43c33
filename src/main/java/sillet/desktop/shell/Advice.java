package sillet.desktop.shell;

import sillet.logbook.text.Message;
import sillet.store.engine.ProblemKind;

/** What helps when a logbook cannot be opened. */
final class Advice {
  private Advice() {}

  static Message on(ProblemKind kind) {
    return Message.of(
        switch (kind) {
          case IN_USE -> "start.in-use";
          case DAMAGED -> "start.damaged";
          case NEWER -> "start.newer";
          case READ_ONLY -> "start.read-only";
          case NO_SUCH -> "start.no-such";
          case DISK -> "start.disk";
          default -> "start.other-trouble";
        });
  }
}
