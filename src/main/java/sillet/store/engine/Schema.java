package sillet.store.engine;

import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.OptionalInt;
import java.util.logging.Level;
import java.util.logging.Logger;
import java.util.regex.Pattern;
import javax.sql.DataSource;
import org.flywaydb.core.Flyway;

/**
 * Which tables a database has and which it should have. Flyway is slow to start, so it is asked
 * only when the newest row of its history is not the newest script.
 */
final class Schema {
  /** The number of the newest script in db/migration. */
  static final int NEWEST = 3;

  private static final String NEWEST_ROW =
      "SELECT \"version\" FROM \"flyway_schema_history\" WHERE \"success\" = TRUE"
          + " ORDER BY \"installed_rank\" DESC";
  private static final Pattern NUMBER = Pattern.compile("\\d{1,9}");

  private Schema() {}

  /**
   * Reads how far a database is.
   *
   * @return the number of the newest script it has seen; nothing if its history has no row this
   *     program can read
   */
  static OptionalInt version(Connection connection) throws SQLException {
    try (Statement statement = connection.createStatement();
        ResultSet rows = statement.executeQuery(NEWEST_ROW)) {
      if (!rows.next()) {
        return OptionalInt.empty();
      }
      String version = String.valueOf(rows.getString(1));
      return NUMBER.matcher(version).matches()
          ? OptionalInt.of(Integer.parseInt(version))
          : OptionalInt.of(Integer.MAX_VALUE);
    }
  }

  /** Brings the tables up to the newest script. */
  static void migrate(DataSource source) {
    // it would report between the lines of a command; what goes wrong is thrown as well
    Logger flywayLog = Logger.getLogger("org.flywaydb");
    flywayLog.setLevel(Level.OFF);
    Flyway.configure()
        .dataSource(source)
        .locations("classpath:db/migration")
        .validateMigrationNaming(true)
        .load()
        .migrate();
  }
}
