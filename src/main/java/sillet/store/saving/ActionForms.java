package sillet.store.saving;

import com.google.gson.Gson;
import com.google.gson.JsonElement;
import com.google.gson.JsonParser;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
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
import sillet.store.engine.LogbookProblem;
import sillet.store.engine.ProblemKind;

/**
 * How actions are written into rows and read back, for every form there ever was. A form is never
 * changed: a record whose components change gets the next number, and the old number keeps a reader
 * of its own.
 */
public final class ActionForms {
  private static final List<Form> KNOWN =
      List.of(
          new Form("name shop", 1, NameShop.class),
          new Form("add customer", 1, AddCustomer.class),
          new Form("revise customer", 1, ReviseCustomer.class),
          new Form("add instrument", 1, AddInstrument.class),
          new Form("revise instrument", 1, ReviseInstrument.class),
          new Form("keep string set", 1, KeepStringSet.class),
          new Form("take in", 1, TakeIn.class),
          new Form("record travel", 1, RecordTravel.class),
          new Form("record checks", 1, RecordChecks.class),
          new Form("record readings", 1, RecordReadings.class),
          new Form("record moves", 1, RecordMoves.class),
          new Form("log work", 1, LogWork.class),
          new Form("write note", 1, WriteNote.class),
          new Form("record fret places", 1, RecordFretPlaces.class),
          new Form("record pickups", 1, RecordPickups.class),
          new Form("choose aim", 1, ChooseAim.class),
          new Form("forget learned", 1, ForgetLearned.class),
          new Form("hand out", 1, HandOut.class));

  private final Gson gson = ActionJson.gson();
  private final Map<String, Class<? extends Action>> readers = new HashMap<>();

  /** The forms this program knows. */
  public ActionForms() {
    KNOWN.forEach(form -> readers.put(key(form.name(), form.number()), form.reader()));
  }

  /** Name and number of every form, as in {@code take in 1}. */
  static List<String> known() {
    return KNOWN.stream().map(form -> key(form.name(), form.number())).toList();
  }

  private record Form(String name, int number, Class<? extends Action> reader) {}

  private static String key(String name, int form) {
    return name + " " + form;
  }

  /**
   * Writes the values of an action.
   *
   * @param action any
   * @return a JSON tree
   * @throws IllegalArgumentException if a number in it is not finite
   */
  JsonElement tree(Action action) {
    return gson.toJsonTree(action);
  }

  /**
   * Writes a tree as the text of a row.
   *
   * @param tree of {@link #tree}
   * @return JSON
   */
  String text(JsonElement tree) {
    return gson.toJson(tree);
  }

  /**
   * Reads a row back. What was read is written again and must say the same: nothing in the row may
   * be left over, and nothing the action needs may be missing.
   *
   * @param row a recorded action
   * @return the action
   * @throws LogbookProblem of kind UNREADABLE_ACTION if the name or form is not known, as one a
   *     newer program wrote, or the values do not fit it
   */
  public Action read(ActionRow row) {
    Class<? extends Action> reader = readers.get(key(row.name(), row.form()));
    if (reader == null) {
      throw unreadable(row, new IllegalArgumentException("no such name and form"));
    }
    Action action;
    boolean same;
    try {
      JsonElement recorded = JsonParser.parseString(row.values());
      action = gson.fromJson(recorded, reader);
      same = recorded.isJsonObject() && tree(action).equals(recorded);
    } catch (RuntimeException unfit) {
      // records refuse values in their constructors by exceptions of every kind
      throw unreadable(row, unfit);
    }
    if (!same) {
      throw unreadable(row, new IllegalArgumentException("values missing or left over"));
    }
    return action;
  }

  private static LogbookProblem unreadable(ActionRow row, RuntimeException why) {
    String what = "action " + row.sequence() + ", " + row.name() + ", form " + row.form();
    return new LogbookProblem(ProblemKind.UNREADABLE_ACTION, what, why);
  }
}
