package sillet.logbook.forecast;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.Direction;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.text.Message;
import sillet.logbook.units.Figures;

/** The sentences of one string's forecast, the most important first. */
final class StringOutlookWords {
  private static final double MM_PER_M = 1e3;
  private static final double PERCENT = 100;

  private final FutureString future;
  private final @Nullable StringTension tension;
  private final double breakingShare;
  private final List<Message> notes = new ArrayList<>();

  StringOutlookWords(FutureString future, @Nullable StringTension tension, double breakingShare) {
    this.future = future;
    this.tension = tension;
    this.breakingShare = breakingShare;
  }

  List<Message> all(InstrumentChange change) {
    Outlook outlook = future.outlook();
    MoveFigures figures = future.figures();
    if (outlook == null || figures == null || tension == null) {
      notes.add(Message.of("move.not-solved", future.because()));
      return notes;
    }
    tension(tension);
    strain(tension);
    if (future.breaks()) {
      return notes;
    }
    saddle(figures);
    action(outlook);
    nutSlot();
    if (change.capoFret() > 0) {
      notes.add(
          Message.of(
              "outlook.capo",
              Integer.toString(change.capoFret()),
              Figures.signed(outlook.octaveAboveCapo(change.capoFret()), 1)));
    }
    return notes;
  }

  private void tension(StringTension now) {
    String[] newtons = {Figures.fixed(now.nowN(), 1), Figures.fixed(now.thenN(), 1)};
    notes.add(
        switch (now.feel()) {
          case LIGHTER -> Message.of("outlook.lighter", newtons);
          case SAME -> Message.of("outlook.same", newtons);
          case HEAVIER -> Message.of("outlook.heavier", newtons);
        });
  }

  private void strain(StringTension then) {
    Double share = then.breakingShareThen();
    if (share != null && share > breakingShare) {
      String limit = Figures.fixed(breakingShare * PERCENT, 0);
      notes.add(
          share >= 1
              ? Message.of("outlook.breaks", Figures.fixed(share * PERCENT, 0))
              : Message.of("outlook.strain", Figures.fixed(share * PERCENT, 0), limit));
    }
  }

  private void saddle(MoveFigures figures) {
    String mm = Figures.fixed(Math.abs(figures.saddleMm()), 2);
    String reach = Figures.fixed((figures.highMm() - figures.lowMm()) / 2, 2);
    String left = Figures.signed(figures.cents12Before(), 1);
    Double room = future.now().room().toward(figures.saddleMm());
    String roomMm = room == null ? "" : Figures.fixed(room, 2);
    boolean away = figures.direction() == Direction.AWAY;
    notes.add(
        switch (future.verdict()) {
          case LEAVE -> Message.of("outlook.leave", left);
          case MOVE -> Message.of(away ? "outlook.away" : "outlook.toward", mm, reach, left);
          case NO_ROOM ->
              Message.of(
                  away ? "outlook.no-room-away" : "outlook.no-room-toward",
                  mm,
                  reach,
                  roomMm,
                  left);
          case SLOT ->
              Message.of(
                  away ? "outlook.slot-away" : "outlook.slot-toward", mm, reach, roomMm, left);
        });
  }

  private void action(Outlook outlook) {
    if (outlook.change().actionThen().isPresent()) {
      notes.add(
          Message.of(
              "outlook.action",
              Figures.fixed(outlook.actionNow() * MM_PER_M, 2),
              Figures.fixed(outlook.change().actionThen().getAsDouble() * MM_PER_M, 2),
              Figures.signed(outlook.actionAlone(), 1)));
    }
  }

  private void nutSlot() {
    double now = future.now().string().make().gaugeIn();
    double then = future.then().make().gaugeIn();
    if (then > now) {
      notes.add(Message.of("outlook.nut-slot", Figures.gauge(now), Figures.gauge(then)));
    }
  }
}
