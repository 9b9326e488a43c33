package sillet.sheets.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import sillet.sheets.columns.JobColumns;

/** The names of the columns a bench sheet can have. */
final class Columns {
  static final int FRETS = 24;

  static final String INSTRUMENT = "instrument";
  static final String STRING = "string";
  static final String PITCH = "pitch";
  static final String SCALE = "scale_mm";
  static final String GAUGE = "gauge_in";
  static final String CONSTRUCTION = "construction";
  static final String CORE = "core_in";
  static final String UNIT_MASS = "unit_mass_g_m";
  static final String ACTION_12 = "action12_mm";
  static final String NUT_GAP_1 = "nutgap1_mm";
  static final String RELIEF = "relief_mm";
  static final String AGAINST = "against";
  static final String SD = "sd_cents";
  static final String OPEN = "f0";
  static final String SCREW = "screw_mm";
  static final String ROOM_BACK = "room_back_mm";
  static final String ROOM_FORWARD = "room_forward_mm";
  static final String NUT_MOVABLE = "nut_movable";

  static final String TO_PITCH = "to_pitch";
  static final String TO_GAUGE = "to_gauge_in";
  static final String TO_CONSTRUCTION = "to_construction";
  static final String TO_CORE = "to_core_in";
  static final String TO_UNIT_MASS = "to_unit_mass_g_m";
  static final String TO_ACTION_12 = "to_action12_mm";

  /** Only a job sheet has it: which round of reading a row belongs to. */
  static final String PASS = "pass";

  static final String TICKET = "ticket";
  static final String SERIAL = "serial";

  /** Without these there is no string. */
  static final List<String> REQUIRED =
      List.of(INSTRUMENT, STRING, PITCH, SCALE, GAUGE, CONSTRUCTION);

  private static final List<String> OPTIONAL =
      List.of(
          CORE,
          UNIT_MASS,
          ACTION_12,
          NUT_GAP_1,
          RELIEF,
          AGAINST,
          SD,
          SCREW,
          ROOM_BACK,
          ROOM_FORWARD,
          NUT_MOVABLE);

  /** What a string will be; only a forecast reads it. */
  private static final List<String> FORECAST =
      List.of(TO_PITCH, TO_GAUGE, TO_CONSTRUCTION, TO_CORE, TO_UNIT_MASS, TO_ACTION_12);

  /** Every name there is. */
  static final List<String> KNOWN = known();

  private Columns() {}

  static String fret(int fret) {
    return "f" + fret;
  }

  private static List<String> known() {
    List<String> names = new ArrayList<>(REQUIRED);
    names.addAll(OPTIONAL);
    IntStream.rangeClosed(0, FRETS).mapToObj(Columns::fret).forEach(names::add);
    names.addAll(FORECAST);
    // what a job sheet says beside the readings; nothing is reckoned from it again
    JobColumns.ALL.stream().filter(name -> !names.contains(name)).forEach(names::add);
    return List.copyOf(names);
  }
}
