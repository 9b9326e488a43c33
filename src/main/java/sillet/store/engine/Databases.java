package sillet.store.engine;

import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import javax.sql.DataSource;
import org.flywaydb.core.api.FlywayException;
import org.h2.api.ErrorCode;
import org.h2.jdbcx.JdbcDataSource;

/** Connects to a database for work and brings its tables up to date. */
final class Databases {
  private static final String USER = "sa";

  private Databases() {}

  private static DataSource source(String url) {
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
    try {
      Connection connection = only(url, place);
      bringUpToDate(connection, source(url), place, version);
      return connection;
    } catch (SQLException | FlywayException trouble) {
      throw ProblemSigns.read(trouble, place);
    }
  }

  /**
   * Connects, and makes sure that it is the only connection. H2 keeps a second program out, but not
   * a second connection of the same program, and two would not know of each other.
   */
  static Connection only(String url, String place) throws SQLException {
    Connection connection = source(url).getConnection();
    boolean alone = false;
    try (Statement statement = connection.createStatement();
        ResultSet rows =
            statement.executeQuery("SELECT COUNT(*) FROM INFORMATION_SCHEMA.SESSIONS")) {
      rows.next();
      alone = rows.getInt(1) == 1;
    } finally {
      if (!alone) {
        connection.close();
      }
    }
    if (!alone) {
      throw new LogbookProblem(ProblemKind.IN_USE, place, null);
    }
    return connection;
  }

  /** Closes the database whatever it says of itself; nothing happens if it closed itself before. */
  static void shutDown(Connection connection) throws SQLException {
    try (Statement statement = connection.createStatement()) {
      statement.execute("SHUTDOWN");
    } catch (SQLException trouble) {
      if (trouble.getErrorCode() != ErrorCode.DATABASE_IS_CLOSED) {
        throw trouble;
      }
    }
  }

  /**
   * Closes the database, then opens and closes it once more so that freed space is given back:
   * while it works it only appends ({@link DatabaseUrl#toWork}). Where another program has opened
   * it in between, that one tidies when it closes.
   */
  static void shutDownTidily(Connection connection) throws SQLException {
    String tidying = connection.isClosed() ? "" : connection.getMetaData().getURL();
    shutDown(connection);
    if (DatabaseUrl.ofAFile(tidying)) {
      try (Connection again = source(DatabaseUrl.toTidy(tidying)).getConnection()) {
        shutDown(again);
      } catch (SQLException trouble) {
        if (trouble.getErrorCode() != ErrorCode.DATABASE_ALREADY_OPEN_1) {
          throw trouble;
        }
      }
    }
  }

  private static void bringUpToDate(
      Connection connection, DataSource source, String place, int version) throws SQLException {
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

  /** Closes the database after trouble, which is what will be spoken of. */
  static void abandon(Connection connection, Exception reason) {
    try (connection) {
      shutDown(connection);
    } catch (SQLException alsoFailed) {
      reason.addSuppressed(alsoFailed);
    }
  }
}
