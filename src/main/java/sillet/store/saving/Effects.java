package sillet.store.saving;

import sillet.logbook.actions.Action;
import sillet.logbook.actions.AddCustomer;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.ChooseAim;
import sillet.logbook.actions.ForgetLearned;
import sillet.logbook.actions.HandOut;
import sillet.logbook.actions.KeepStringSet;
import sillet.logbook.actions.LogWork;
import sillet.logbook.actions.NameShop;
import sillet.logbook.actions.RecordChecks;
import sillet.logbook.actions.RecordFretPlaces;
import sillet.logbook.actions.RecordMoves;
import sillet.logbook.actions.RecordPickups;
import sillet.logbook.actions.RecordReadings;
import sillet.logbook.actions.RecordTravel;
import sillet.logbook.actions.ReviseCustomer;
import sillet.logbook.actions.ReviseInstrument;
import sillet.logbook.actions.TakeIn;
import sillet.logbook.actions.WriteNote;

/** Finds what an action does to the tables. */
final class Effects {
  private Effects() {}

  /** Does it, inside the transaction of the change. */
  static void apply(Change change, Action action) {
    if (action instanceof NameShop a) {
      ShopEffects.name(change, a.shop());
    } else if (action instanceof AddCustomer a) {
      ShopEffects.add(change, a.customer());
    } else if (action instanceof ReviseCustomer a) {
      ShopEffects.revise(change, a.customer(), a.version());
    } else if (action instanceof AddInstrument a) {
      InstrumentEffects.add(change, a.instrument());
    } else if (action instanceof ReviseInstrument a) {
      InstrumentEffects.revise(change, a.instrument(), a.version());
    } else if (action instanceof KeepStringSet a) {
      StringSetEffects.keep(change, a.set());
    } else if (action instanceof TakeIn a) {
      VisitEffects.takeIn(change, a.visit());
    } else if (action instanceof RecordTravel a) {
      VisitEffects.travel(change, a.visitId(), a.travel());
    } else if (action instanceof HandOut a) {
      VisitEffects.handOut(change, a.visitId(), a.day());
    } else {
      onTheBench(change, action);
    }
  }

  private static void onTheBench(Change change, Action action) {
    if (action instanceof RecordChecks a) {
      BenchEffects.checks(change, a.visitId(), a.checks());
    } else if (action instanceof RecordReadings a) {
      BenchEffects.readings(change, a.visitId(), a.readings());
    } else if (action instanceof RecordMoves a) {
      BenchEffects.moves(change, a.visitId(), a.moves());
    } else if (action instanceof LogWork a) {
      BenchEffects.work(change, a.visitId(), a.line());
    } else if (action instanceof WriteNote a) {
      BenchEffects.note(change, a.visitId(), a.note());
    } else if (action instanceof RecordFretPlaces a) {
      PartsEffects.frets(change, a.instrumentId(), a.measured());
    } else if (action instanceof RecordPickups a) {
      PartsEffects.pickups(change, a.instrumentId(), a.measured());
    } else if (action instanceof ChooseAim a) {
      LearningEffects.aim(change, a.visitId(), a.aim());
    } else if (action instanceof ForgetLearned a) {
      LearningEffects.reset(change, a.instrumentId(), a.from());
    } else {
      throw new IllegalArgumentException("no effect known for " + action.name());
    }
  }
}
