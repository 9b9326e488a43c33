package sillet.store.columns;

import java.lang.reflect.Type;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.sql.Types;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.time.temporal.ChronoUnit;
import java.util.Optional;
import java.util.UUID;
import org.jdbi.v3.core.Jdbi;
import org.jdbi.v3.core.argument.Argument;
import org.jdbi.v3.core.argument.ArgumentFactory;
import org.jdbi.v3.core.config.ConfigRegistry;
import org.jspecify.annotations.Nullable;

/** Teaches Jdbi how the logbook's values go into columns, alike on every database. */
public final class ColumnTypes {
  private ColumnTypes() {}

  /**
   * Registers the arguments.
   *
   * @param jdbi the one to teach
   */
  public static void teach(Jdbi jdbi) {
    Words.all().forEach(words -> jdbi.registerArgument(byWord(words)));
    jdbi.registerArgument(
        new Writes<>(
            Instant.class,
            Types.TIMESTAMP_WITH_TIMEZONE,
            (row, place, value) -> row.setObject(place, kept(value).atOffset(ZoneOffset.UTC))));
    jdbi.registerArgument(new Writes<>(LocalDate.class, Types.DATE, PreparedStatement::setObject));
    jdbi.registerArgument(new Writes<>(UUID.class, Types.OTHER, PreparedStatement::setObject));
  }

  /**
   * A time as a column keeps it.
   *
   * @param time any
   * @return the same to the microsecond
   */
  public static Instant kept(Instant time) {
    return time.truncatedTo(ChronoUnit.MICROS);
  }

  private static <E extends Enum<E>> Writes<E> byWord(Words<E> words) {
    return new Writes<>(
        words.type(),
        Types.VARCHAR,
        (row, place, value) -> row.setString(place, words.write(value)));
  }

  private interface Setter<T> {
    void set(PreparedStatement row, int place, T value) throws SQLException;
  }

  private static final class Writes<T> implements ArgumentFactory {
    private final Class<T> type;
    private final int sqlType;
    private final Setter<T> setter;

    Writes(Class<T> type, int sqlType, Setter<T> setter) {
      this.type = type;
      this.sqlType = sqlType;
      this.setter = setter;
    }

    @Override
    public Optional<Argument> build(Type asked, @Nullable Object value, ConfigRegistry config) {
      if (asked != type && !type.isInstance(value)) {
        return Optional.empty();
      }
      return Optional.of(
          value == null
              ? (place, row, context) -> row.setNull(place, sqlType)
              : (place, row, context) -> setter.set(row, place, type.cast(value)));
    }
  }
}
