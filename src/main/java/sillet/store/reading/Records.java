package sillet.store.reading;

import java.sql.SQLException;
import java.util.UUID;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.wire.Construction;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.Neck;
import sillet.logbook.instruments.Saddle;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.shop.Customer;
import sillet.logbook.strings.StringMake;
import sillet.store.columns.Row;

/** Rows to the records that several questions answer with, and the columns they need. */
final class Records {
  /** Columns of a customer c, told apart from those of other tables. */
  static final String CUSTOMER =
      "c.id AS c_id, c.name AS c_name, c.phone AS c_phone, c.email AS c_email, c.note AS c_note";

  /** Columns of an instrument i, told apart from those of other tables. */
  static final String INSTRUMENT =
      """
      i.id AS i_id, i.version AS i_version, i.customer_id AS i_customer_id, i.kind AS i_kind,
      i.maker AS i_maker, i.model AS i_model, i.serial AS i_serial, i.tag AS i_tag,
      i.strings AS i_strings, i.scale_treble_mm AS i_scale_treble_mm,
      i.scale_bass_mm AS i_scale_bass_mm, i.frets AS i_frets, i.radius_mm AS i_radius_mm,
      i.left_handed AS i_left_handed, i.saddle_kind AS i_saddle_kind,
      i.screw_pitch_mm AS i_screw_pitch_mm, i.screw_sense AS i_screw_sense,
      i.saddle_thickness_mm AS i_saddle_thickness_mm
      """;

  private Records() {}

  static Customer customer(Row row) throws SQLException {
    return customer(row, row.id("c_id"));
  }

  /** Reads the customer of an outer join. */
  static @Nullable Customer customerOrNull(Row row) throws SQLException {
    UUID id = row.idOrNull("c_id");
    return id == null ? null : customer(row, id);
  }

  private static Customer customer(Row row, UUID id) throws SQLException {
    return new Customer(
        id, row.text("c_name"), row.text("c_phone"), row.text("c_email"), row.text("c_note"));
  }

  static Instrument instrument(Row row) throws SQLException {
    return new Instrument(
        row.id("i_id"),
        row.idOrNull("i_customer_id"),
        row.kind("i_kind", InstrumentKind.class),
        row.text("i_maker"),
        row.text("i_model"),
        row.text("i_serial"),
        row.text("i_tag"),
        new Neck(
            row.integer("i_strings"),
            row.number("i_scale_treble_mm"),
            row.number("i_scale_bass_mm"),
            row.integer("i_frets"),
            row.numberOrNull("i_radius_mm"),
            row.truth("i_left_handed")),
        new Saddle(
            row.kind("i_saddle_kind", SaddleKind.class),
            row.numberOrNull("i_screw_pitch_mm"),
            row.kind("i_screw_sense", ScrewSense.class),
            row.numberOrNull("i_saddle_thickness_mm")));
  }

  static StringMake make(Row row) throws SQLException {
    return new StringMake(
        row.number("gauge_in"),
        row.kind("construction", Construction.class),
        row.numberOrNull("core_in"),
        row.numberOrNull("unit_mass_g_m"));
  }
}
