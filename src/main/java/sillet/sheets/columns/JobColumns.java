package sillet.sheets.columns;

import java.util.List;

/** The columns of a job sheet, in their order; cents by fret follow them. */
public final class JobColumns {
  /** Every column there always is. */
  public static final List<String> ALL =
      List.of(
          "ticket",
          "taken_in",
          "handed_out",
          "technician",
          "customer",
          "instrument",
          "serial",
          "string",
          "pitch",
          "scale_mm",
          "gauge_in",
          "construction",
          "set",
          "pass",
          "against",
          "cents12",
          "tries",
          "sd_cents",
          "saddle_move_mm",
          "turns",
          "direction",
          "nut_move_mm",
          "verdict",
          "findings",
          "cents12_predicted",
          "cents12_left",
          "action12_received_mm",
          "action12_left_mm",
          "relief_received_mm",
          "relief_left_mm",
          "humidity_pct",
          "temperature_c",
          "note");

  private JobColumns() {}
}
