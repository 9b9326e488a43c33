package sillet.logbook.actions;

/**
 * Something a technician does to the logbook. Identities and times lie inside, so that doing the
 * same actions again in the same order gives the same logbook. The name and the form of each action
 * are part of what is stored: a record whose components change gets a new form and keeps the old
 * one readable.
 */
public sealed interface Action
    permits NameShop,
        AddCustomer,
        ReviseCustomer,
        AddInstrument,
        ReviseInstrument,
        KeepStringSet,
        TakeIn,
        RecordTravel,
        RecordFretPlaces,
        RecordPickups,
        RecordChecks,
        RecordReadings,
        RecordMoves,
        LogWork,
        WriteNote,
        ChooseAim,
        ForgetLearned,
        HandOut {

  /**
   * The name it is stored under.
   *
   * @return stable words
   */
  String name();

  /**
   * The version of the form its values are written in.
   *
   * @return 1 or more
   */
  default int form() {
    return 1;
  }
}
