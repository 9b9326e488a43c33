package sillet.store.saving;

import org.jdbi.v3.core.statement.PreparedBatch;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;

/** What actions do to the drawer of string sets. */
final class StringSetEffects {
  private static final String INSERT_STRING =
      """
      INSERT INTO string_set_string
        (set_id, string_number, gauge_in, construction, core_in, unit_mass_g_m)
      VALUES (:id, :number, :gaugeIn, :construction, :coreIn, :unitMassGPerM)
      """;

  private StringSetEffects() {}

  static void keep(Change change, StringSet set) {
    int rows =
        change
            .handle()
            .createUpdate(
                "UPDATE string_set SET version = version + 1, name = :name WHERE id = :id")
            .bindMethods(set)
            .execute();
    if (rows == 0) {
      change
          .handle()
          .createUpdate("INSERT INTO string_set (id, version, name) VALUES (:id, 1, :name)")
          .bindMethods(set)
          .execute();
    }
    change
        .handle()
        .createUpdate("DELETE FROM string_set_string WHERE set_id = :id")
        .bind("id", set.id())
        .execute();
    strings(change, set);
  }

  private static void strings(Change change, StringSet set) {
    PreparedBatch batch = change.handle().prepareBatch(INSERT_STRING);
    int number = 1;
    for (StringMake make : set.strings()) {
      batch.bindMethods(make).bind("id", set.id()).bind("number", number).add();
      number++;
    }
    batch.execute();
  }
}
