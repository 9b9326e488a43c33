package sillet.store.engine;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;

/**
 * Looks at a file without the right to write, before it is opened for work: H2 would make an empty
 * database out of an empty file and mend a broken one by forgetting what it cannot read.
 */
final class FirstLook {
  private FirstLook() {}

  /**
   * Looks.
   *
   * @param file an existing file
   * @param scheme prefix of the file layer
   * @return the version of its tables, not newer than this program's
   * @throws LogbookProblem if it is in use, newer, or cannot be read as a logbook
   */
  static int at(Path file, String scheme) {
    String place = file.toString();
    try (Connection connection =
        Databases.source(DatabaseUrl.toLook(file, scheme)).getConnection()) {
      Databases.refuseSecond(connection, place);
      int version = version(connection, place);
      try (Statement statement = connection.createStatement()) {
        // the file may say of itself that it stays open without connections
        statement.execute("SHUTDOWN");
      }
      return version;
    } catch (SQLException trouble) {
      throw ProblemSigns.readWhileLooking(trouble, place);
    }
  }

  private static int version(Connection connection, String place) throws SQLException {
    int version =
        Schema.version(connection)
            .orElseThrow(() -> new LogbookProblem(ProblemKind.DAMAGED, place, null));
    if (version > Schema.NEWEST) {
      throw new LogbookProblem(ProblemKind.NEWER, place, null);
    }
    return version;
  }
}
