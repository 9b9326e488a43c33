package sillet.store;

import java.io.PrintStream;
import sillet.logbook.actions.RecordReadings;
import sillet.store.place.LogbookPlace;

/** Saves readings until it is killed, and says of each when it is saved. */
public final class SavingChild {
  static final String OPEN = "open";
  static final String SAVED = "saved ";

  private SavingChild() {}

  public static void main(String[] arguments) {
    PrintStream out =
        new PrintStream(new java.io.FileOutputStream(java.io.FileDescriptor.out), true);
    Logbook logbook = Logbook.open(LogbookPlace.of(arguments[0]));
    out.println(OPEN);
    while (true) {
      long sequence =
          logbook
              .perform(
                  new RecordReadings(BenchDay.SECOND_VISIT_ID, BenchDay.readings()),
                  BenchDay.TECHNICIAN)
              .sequence();
      out.println(SAVED + sequence);
    }
  }
}
