package sillet.store;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** Looks into the file of a closed logbook past the store, table by table. */
public final class Tables {
  private Tables() {}

  /** Every row of every table as text, in a fixed order; the history of the schema left out. */
  public static Map<String, List<String>> of(Path file) throws SQLException {
    Map<String, List<String>> all = new TreeMap<>();
    try (Connection connection = connect(file);
        Statement statement = connection.createStatement()) {
      for (String table : column(statement, NAMES)) {
        all.put(table, rows(statement, table));
      }
    }
    return all;
  }

  private static final String NAMES =
      "SELECT table_name FROM INFORMATION_SCHEMA.TABLES"
          + " WHERE table_schema = 'PUBLIC' AND table_name <> 'flyway_schema_history'";

  /** Does something to a closed logbook that the store would never do. */
  public static void execute(Path file, String sql) throws SQLException {
    try (Connection connection = connect(file);
        Statement statement = connection.createStatement()) {
      statement.execute(sql);
    }
  }

  private static Connection connect(Path file) throws SQLException {
    String path = file.toString().replace(".mv.db", "");
    return DriverManager.getConnection(
        "jdbc:h2:file:" + path + ";IFEXISTS=TRUE;DB_CLOSE_DELAY=0", "sa", "");
  }

  private static List<String> column(Statement statement, String sql) throws SQLException {
    List<String> values = new ArrayList<>();
    try (ResultSet result = statement.executeQuery(sql)) {
      while (result.next()) {
        values.add(result.getString(1));
      }
    }
    return values;
  }

  private static List<String> rows(Statement statement, String table) throws SQLException {
    List<String> rows = new ArrayList<>();
    try (ResultSet result = statement.executeQuery("SELECT * FROM " + table)) {
      int columns = result.getMetaData().getColumnCount();
      while (result.next()) {
        StringBuilder row = new StringBuilder();
        for (int i = 1; i <= columns; i++) {
          row.append(result.getMetaData().getColumnName(i)).append('=');
          row.append(result.getString(i)).append(' ');
        }
        rows.add(row.toString());
      }
    }
    rows.sort(null);
    return rows;
  }
}
