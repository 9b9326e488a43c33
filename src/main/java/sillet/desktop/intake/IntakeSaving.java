package sillet.desktop.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntConsumer;
import java.util.stream.Stream;
import sillet.desktop.controls.Desk;
import sillet.logbook.actions.Action;
import sillet.logbook.actions.AddCustomer;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.KeepStringSet;
import sillet.logbook.actions.TakeIn;
import sillet.logbook.text.Message;

/**
 * Takes in, action after action. What is on the disk when one of them fails is known from then on:
 * the next try does not add it a second time.
 */
final class IntakeSaving {
  private final Desk desk;
  private final IntakeModel model;
  private final IntConsumer taken;
  private final Runnable notTaken;
  private boolean underWay;

  /**
   * A saving.
   *
   * @param desk of the window
   * @param model what is typed
   * @param taken takes the ticket
   * @param notTaken called when it failed
   */
  IntakeSaving(Desk desk, IntakeModel model, IntConsumer taken, Runnable notTaken) {
    this.desk = desk;
    this.model = model;
    this.taken = taken;
    this.notTaken = notTaken;
  }

  boolean underWay() {
    return underWay;
  }

  /** Takes in; call after the fields were judged. */
  void begin() {
    if (!underWay) {
      underWay = true;
      desk.background()
          .run(
              () -> desk.logbook().visits().nextTicket(),
              this::under,
              why -> failed(why, List.of()));
    }
  }

  private void under(int ticket) {
    String technician = desk.atBench().technician();
    List<Action> actions = model.actions(ticket, technician);
    List<Action> done = new ArrayList<>();
    desk.background()
        .run(
            () -> {
              for (Action action : actions) {
                desk.logbook().perform(action, technician);
                done.add(action);
              }
              return ticket;
            },
            this::done,
            why -> failed(why, done));
  }

  private void done(int ticket) {
    underWay = false;
    desk.sign().saved(desk.atBench().clock().instant());
    taken.accept(ticket);
  }

  private void failed(Message why, List<Action> done) {
    underWay = false;
    for (Action action : done) {
      if (action instanceof AddCustomer added) {
        model.customer().choose(added.customer());
      } else if (action instanceof AddInstrument added) {
        model.instrument().choose(added.instrument());
      } else if (action instanceof KeepStringSet kept) {
        model.strings().kept(kept.set());
      }
    }
    desk.sign().notSaved(why);
    Optional<Integer> ticket = done.stream().flatMap(IntakeSaving::ticket).findFirst();
    ticket.ifPresentOrElse(taken::accept, notTaken);
  }

  /** The visit is there, though something went wrong behind it. */
  private static Stream<Integer> ticket(Action action) {
    return action instanceof TakeIn in ? Stream.of(in.visit().ticket()) : Stream.empty();
  }
}
