package sillet.store.engine;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;

/**
 * Looks at a file without the right to write, before it is opened for work: H2 would make an empty
 * database out of an empty file and mend a broken one by forgetting what it cannot read.
 */
final class FirstLook {
  private static final int TWO_HEADERS = 2 * 4096;

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
    refuseTooShort(file, place);
    try (Connection connection = Databases.only(DatabaseUrl.toLook(file, scheme), place)) {
      int version;
      try {
        version = version(connection, place);
        refuseGaps(connection, place);
      } catch (SQLException | RuntimeException trouble) {
        Databases.abandon(connection, trouble);
        throw trouble;
      }
      // the file may say of itself that it stays open without connections
      Databases.shutDown(connection);
      return version;
    } catch (SQLException trouble) {
      throw ProblemSigns.readWhileLooking(trouble, place);
    }
  }

  /**
   * What has not even two headers, H2 fails to read and then keeps locked for this process. (It
   * does the same to a file cut so that nothing is left of its content; that one is damaged at the
   * first look and in use at the second, until the process ends.)
   */
  private static void refuseTooShort(Path file, String place) {
    try {
      if (Files.size(file) < TWO_HEADERS) {
        throw new LogbookProblem(ProblemKind.DAMAGED, place, null);
      }
    } catch (IOException trouble) {
      throw ProblemSigns.read(trouble, place);
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

  /** Actions are numbered without gaps, so one that is missing shows. */
  private static void refuseGaps(Connection connection, String place) throws SQLException {
    try (Statement statement = connection.createStatement();
        ResultSet rows = statement.executeQuery("SELECT COUNT(*), MAX(sequence) FROM action")) {
      rows.next();
      if (rows.getLong(1) != rows.getLong(2)) {
        throw new LogbookProblem(ProblemKind.DAMAGED, place, null);
      }
    }
  }
}
