package sillet.store.engine;

import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import org.flywaydb.core.api.FlywayException;
import org.h2.jdbcx.JdbcDataSource;

/** Connects to a database for work and brings its tables up to date. */
final class Databases {
  private static final String USER = "sa";

  private Databases() {}

  static JdbcDataSource source(String url) {
    JdbcDataSource source = new JdbcDataSource();
    source.setURL(url);
    source.setUser(USER);
    return source;
  }

  /**
   * Connects.
   *
   * @param url which database, with its settings
   * @param place where it lies
   * @param version how far its tables are, 0 for none
   * @return a connection, the only one to this database
   */
  static Connection connect(String url, String place, int version) {
    JdbcDataSource source = source(url);
    try {
      Connection connection = source.getConnection();
      try {
        refuseSecond(connection, place);
      } catch (SQLException | RuntimeException trouble) {
        connection.close();
        throw trouble;
      }
      bringUpToDate(connection, source, place, version);
      return connection;
    } catch (SQLException | FlywayException trouble) {
      throw ProblemSigns.read(trouble, place);
    }
  }

  /**
   * H2 keeps a second program out, but not a second connection of the same program, and two would
   * not know of each other.
   */
  static void refuseSecond(Connection connection, String place) throws SQLException {
    try (Statement statement = connection.createStatement();
        ResultSet rows =
            statement.executeQuery("SELECT COUNT(*) FROM INFORMATION_SCHEMA.SESSIONS")) {
      rows.next();
      if (rows.getInt(1) > 1) {
        throw new LogbookProblem(ProblemKind.IN_USE, place, null);
      }
    }
  }

  private static void bringUpToDate(
      Connection connection, JdbcDataSource source, String place, int version) throws SQLException {
    try {
      // H2 opens what it may not write as read-only and says nothing
      if (connection.isReadOnly()) {
        throw new LogbookProblem(ProblemKind.READ_ONLY, place, null);
      }
      if (version < Schema.NEWEST) {
        Schema.migrate(source);
      }
    } catch (SQLException | RuntimeException trouble) {
      abandon(connection, trouble);
      throw trouble;
    }
  }

  private static void abandon(Connection connection, Exception reason) {
    try (connection;
        Statement statement = connection.createStatement()) {
      statement.execute("SHUTDOWN");
    } catch (SQLException alsoFailed) {
      reason.addSuppressed(alsoFailed);
    }
  }
}
