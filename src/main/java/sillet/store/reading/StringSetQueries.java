package sillet.store.reading;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.UUID;
import org.jdbi.v3.core.Handle;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;
import sillet.store.columns.Row;
import sillet.store.engine.Session;

/** Questions about the drawer of string sets. */
public final class StringSetQueries {
  private final Session session;

  /**
   * Asks a session.
   *
   * @param session open, its columns taught
   */
  public StringSetQueries(Session session) {
    this.session = session;
  }

  private record Numbered(UUID setId, StringMake make) {}

  /**
   * Every set.
   *
   * @return by name
   */
  public List<StringSet> all() {
    return session.read(StringSetQueries::all);
  }

  private static List<StringSet> all(Handle handle) {
    Map<UUID, List<StringMake>> strings = new HashMap<>();
    handle
        .createQuery("SELECT * FROM string_set_string ORDER BY set_id, string_number")
        .map(Row.map(row -> new Numbered(row.id("set_id"), Records.make(row))))
        .forEach(
            one -> strings.computeIfAbsent(one.setId(), id -> new ArrayList<>()).add(one.make()));
    return handle
        .createQuery("SELECT id, name FROM string_set ORDER BY name, id")
        .map(
            Row.map(
                row ->
                    new StringSet(
                        row.id("id"),
                        row.text("name"),
                        strings.getOrDefault(row.id("id"), List.of()))))
        .list();
  }
}
