package sillet.store.columns;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Instant;
import java.time.LocalDate;
import java.time.OffsetDateTime;
import java.util.UUID;
import org.jdbi.v3.core.mapper.RowMapper;
import org.jspecify.annotations.Nullable;

/** One row of a result, read by the types of the logbook. */
public final class Row {
  private final ResultSet result;

  private Row(ResultSet result) {
    this.result = result;
  }

  /** Makes a record of a row. */
  @FunctionalInterface
  public interface Reads<T> {
    /**
     * Reads the row.
     *
     * @param row where the result stands
     * @return the record
     * @throws SQLException if a column is missing or of another type
     */
    T from(Row row) throws SQLException;
  }

  /**
   * Hands rows to Jdbi.
   *
   * @param reads makes a record of a row
   * @return the same for Jdbi
   */
  public static <T> RowMapper<T> map(Reads<T> reads) {
    return (result, context) -> reads.from(new Row(result));
  }

  public UUID id(String column) throws SQLException {
    return there(idOrNull(column), column);
  }

  public @Nullable UUID idOrNull(String column) throws SQLException {
    return result.getObject(column, UUID.class);
  }

  public String text(String column) throws SQLException {
    return there(result.getString(column), column);
  }

  public int integer(String column) throws SQLException {
    return there(integerOrNull(column), column);
  }

  public @Nullable Integer integerOrNull(String column) throws SQLException {
    return result.getObject(column, Integer.class);
  }

  public long sequence(String column) throws SQLException {
    return there(result.getObject(column, Long.class), column);
  }

  public double number(String column) throws SQLException {
    return there(numberOrNull(column), column);
  }

  public @Nullable Double numberOrNull(String column) throws SQLException {
    return result.getObject(column, Double.class);
  }

  public boolean truth(String column) throws SQLException {
    return there(result.getObject(column, Boolean.class), column);
  }

  public LocalDate day(String column) throws SQLException {
    return there(dayOrNull(column), column);
  }

  public @Nullable LocalDate dayOrNull(String column) throws SQLException {
    return result.getObject(column, LocalDate.class);
  }

  public Instant time(String column) throws SQLException {
    return there(result.getObject(column, OffsetDateTime.class), column).toInstant();
  }

  /**
   * Reads a kind by its word.
   *
   * @param column where the word stands
   * @param type the enumeration
   * @return what the word stands for
   * @throws SQLException if this program knows no such word
   */
  public <E extends Enum<E>> E kind(String column, Class<E> type) throws SQLException {
    try {
      return Words.of(type).read(text(column));
    } catch (IllegalArgumentException unknown) {
      throw new SQLException("column " + column, unknown);
    }
  }

  private static <T> T there(@Nullable T value, String column) throws SQLException {
    if (value == null) {
      throw new SQLException("column " + column + " is empty");
    }
    return value;
  }
}
