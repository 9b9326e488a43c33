package sillet.logbook.moves;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Message;
import sillet.logbook.units.Figures;

/** The sentences that go with one string's figures. */
final class MoveNotes {
  private static final int OCTAVE = 12;

  /**
   * Beyond a couple of millimetres the string itself is suspect first (common practice, no source).
   */
  private static final double SUSPECT_STRING_MM = 3;

  /** Less of a nut move than a hand can file is not said (common practice, no source). */
  private static final double SMALLEST_NUT_MM = 0.05;

  private final BenchString string;
  private final List<Message> notes = new ArrayList<>();

  MoveNotes(BenchString string) {
    this.string = string;
  }

  List<Message> all() {
    return List.copyOf(notes);
  }

  /** Names each note whose tries do not agree. */
  void wildTries() {
    Disagreements.of(string).forEach(odd -> notes.add(odd.said()));
  }

  void notSolved(String because) {
    notes.add(Message.of("move.not-solved", because));
  }

  void verdict(Verdict verdict, MoveFigures figures, @Nullable Double centsLeft) {
    String mm = Figures.fixed(Math.abs(figures.saddleMm()), 2);
    Double room = string.room().toward(figures.saddleMm());
    String roomMm = room == null ? "" : Figures.fixed(room, 2);
    String stays = centsLeft == null ? "" : Figures.fixed(Math.abs(centsLeft), 1);
    boolean away = figures.direction() == Direction.AWAY;
    switch (verdict) {
      case LEAVE ->
          notes.add(movesNut(figures) ? Message.of("move.leave-saddle") : Message.of("move.leave"));
      case NO_ROOM ->
          notes.add(
              Message.of(away ? "move.no-room-away" : "move.no-room-toward", mm, roomMm, stays));
      case SLOT ->
          notes.add(Message.of(away ? "move.slot-away" : "move.slot-toward", mm, roomMm, stays));
      case MOVE -> move(figures, mm, away);
    }
    nut(figures);
    unread();
    if (verdict != Verdict.LEAVE && Math.abs(figures.saddleMm()) > SUSPECT_STRING_MM) {
      notes.add(Message.of("move.suspect-string"));
    }
  }

  private void move(MoveFigures figures, String mm, boolean away) {
    Double turns = figures.turns();
    if (string.room().onePiece()) {
      notes.add(Message.of(away ? "move.file-away" : "move.file-toward", mm));
    } else if (turns == null) {
      notes.add(Message.of(away ? "move.away" : "move.toward", mm));
    } else {
      String turned = Figures.fixed(turns, 2);
      notes.add(Message.of(away ? "move.away-turns" : "move.toward-turns", mm, turned));
    }
  }

  private static boolean movesNut(MoveFigures figures) {
    Double nut = figures.nutMm();
    return nut != null && Math.abs(nut) >= SMALLEST_NUT_MM;
  }

  /** A nut is cut once: its figure never stands alone, and is called a guess where it is one. */
  private void nut(MoveFigures figures) {
    Double nut = figures.nutMm();
    if (nut == null || !movesNut(figures)) {
      return;
    }
    String mm = Figures.fixed(Math.abs(nut), 2);
    if (!string.readings().knowTheNut()) {
      notes.add(Message.of("move.nut-guess", mm));
    } else {
      notes.add(Message.of(nut > 0 ? "move.nut-toward-bridge" : "move.nut-away", mm));
    }
  }

  private void unread() {
    var read = string.readings().frets().keySet();
    if (read.isEmpty()) {
      notes.add(Message.of("move.unread"));
    } else if (!read.contains(OCTAVE)) {
      String frets = read.stream().map(f -> Integer.toString(f)).collect(Collectors.joining(", "));
      notes.add(Message.of("move.unread-octave", frets));
    }
  }

  void strain(OptionalDouble share, double limit) {
    if (share.isPresent() && share.getAsDouble() > limit) {
      notes.add(
          Message.of(
              "move.strain",
              Figures.fixed(share.getAsDouble() * 100, 0),
              Figures.fixed(limit * 100, 0)));
    }
  }
}
