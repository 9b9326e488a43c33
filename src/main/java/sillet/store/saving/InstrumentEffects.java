package sillet.store.saving;

import sillet.logbook.instruments.Instrument;
import sillet.store.columns.SearchText;

/** What actions do to instruments. */
final class InstrumentEffects {
  private static final String INSERT =
      """
      INSERT INTO instrument (id, version, customer_id, kind, maker, model, serial, tag,
        strings, scale_treble_mm, scale_bass_mm, frets, radius_mm, left_handed,
        saddle_kind, screw_pitch_mm, screw_sense, saddle_thickness_mm, search_key, last_action)
      VALUES (:id, 1, :customerId, :kind, :maker, :model, :serial, :tag,
        :neck.strings, :neck.scaleTrebleMm, :neck.scaleBassMm, :neck.frets, :neck.radiusMm,
        :neck.leftHanded, :saddle.kind, :saddle.screwPitchMm, :saddle.screwSense,
        :saddle.thicknessMm, :searchKey, :sequence)
      """;
  private static final String UPDATE =
      """
      UPDATE instrument SET version = version + 1, customer_id = :customerId, kind = :kind,
        maker = :maker, model = :model, serial = :serial, tag = :tag, strings = :neck.strings,
        scale_treble_mm = :neck.scaleTrebleMm, scale_bass_mm = :neck.scaleBassMm,
        frets = :neck.frets, radius_mm = :neck.radiusMm, left_handed = :neck.leftHanded,
        saddle_kind = :saddle.kind, screw_pitch_mm = :saddle.screwPitchMm,
        screw_sense = :saddle.screwSense, saddle_thickness_mm = :saddle.thicknessMm,
        search_key = :searchKey, last_action = :sequence
      WHERE id = :id AND version = :version
      """;

  private InstrumentEffects() {}

  static void add(Change change, Instrument instrument) {
    change
        .handle()
        .createUpdate(INSERT)
        .bindMethods(instrument)
        .bind("searchKey", searchKey(instrument))
        .bind("sequence", change.sequence())
        .execute();
  }

  static void revise(Change change, Instrument instrument, int version) {
    int rows =
        change
            .handle()
            .createUpdate(UPDATE)
            .bindMethods(instrument)
            .bind("searchKey", searchKey(instrument))
            .bind("sequence", change.sequence())
            .bind("version", version)
            .execute();
    change.mustBeOne(rows, "instrument", instrument.id());
  }

  private static String searchKey(Instrument instrument) {
    return SearchText.fold(
        instrument.maker(), instrument.model(), instrument.serial(), instrument.tag());
  }
}
