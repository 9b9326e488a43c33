package sillet.store.engine;

import java.io.EOFException;
import java.io.IOException;
import java.nio.channels.NonWritableChannelException;
import java.nio.file.AccessDeniedException;
import java.nio.file.ReadOnlyFileSystemException;
import java.sql.SQLException;
import java.util.Set;
import org.h2.api.ErrorCode;
import org.h2.mvstore.DataUtils;
import org.h2.mvstore.MVStoreException;
import org.jspecify.annotations.Nullable;

/** Recognises a problem by SQLState, vendor code and type, never by the words of a message. */
final class ProblemSigns {
  private static final String CUT_OFF = "22001";
  private static final String ENTERED_BEFORE = "23505";
  private static final String NO_TABLE = "42S02";
  private static final String REFERS_TO_NOTHING = "23503";
  private static final String REFERS_TO_NOTHING_IN_H2 = "23506";

  /**
   * Another owner, so no logbook; what stumbled; wants to write into what it may only read, which
   * only an empty file makes it do.
   */
  private static final Set<Integer> UNREADABLE_CODES =
      Set.of(
          ErrorCode.WRONG_USER_OR_PASSWORD,
          ErrorCode.GENERAL_ERROR_1,
          ErrorCode.DATABASE_IS_READ_ONLY);

  private static final int FARTHEST_CAUSE = 20;

  private ProblemSigns() {}

  /**
   * Names what happened.
   *
   * @param trouble what was thrown
   * @param place where the logbook lies
   * @return the problem; the same object where it is one already
   */
  static LogbookProblem read(Throwable trouble, String place) {
    return trouble instanceof LogbookProblem known
        ? known
        : new LogbookProblem(kind(trouble), place, trouble);
  }

  /**
   * Names what happened while a file was looked at. What ends too early, makes the database
   * stumble, has none of the expected tables or another owner, cannot be read as a logbook.
   *
   * @param trouble what was thrown
   * @param place where the logbook lies
   * @return the problem
   */
  static LogbookProblem readWhileLooking(Throwable trouble, String place) {
    SQLException sql = find(trouble, SQLException.class);
    boolean unreadable =
        find(trouble, EOFException.class) != null
            || (sql != null && UNREADABLE_CODES.contains(sql.getErrorCode()));
    return unreadable
        ? new LogbookProblem(ProblemKind.DAMAGED, place, trouble)
        : read(trouble, place);
  }

  private static ProblemKind kind(Throwable trouble) {
    if (find(trouble, AccessDeniedException.class) != null
        || find(trouble, ReadOnlyFileSystemException.class) != null
        || find(trouble, NonWritableChannelException.class) != null) {
      return ProblemKind.READ_ONLY;
    }
    MVStoreException store = find(trouble, MVStoreException.class);
    if (store != null && store.getErrorCode() == DataUtils.ERROR_FILE_CORRUPT) {
      return ProblemKind.DAMAGED;
    }
    SQLException sql = find(trouble, SQLException.class);
    ProblemKind kind = sql == null ? ProblemKind.UNEXPECTED : ofSql(sql);
    // trouble with the disk closes the database, which then speaks of that first
    boolean vague = kind == ProblemKind.UNEXPECTED || kind == ProblemKind.CLOSED;
    return vague && find(trouble, IOException.class) != null ? ProblemKind.DISK : kind;
  }

  private static <T extends Throwable> @Nullable T find(Throwable trouble, Class<T> type) {
    Throwable cause = trouble;
    for (int depth = 0; cause != null && depth < FARTHEST_CAUSE; depth++) {
      if (type.isInstance(cause)) {
        return type.cast(cause);
      }
      cause = cause.getCause();
    }
    return null;
  }

  private static ProblemKind ofSql(SQLException sql) {
    return switch (String.valueOf(sql.getSQLState())) {
      case CUT_OFF -> ProblemKind.TOO_LONG;
      case ENTERED_BEFORE -> ProblemKind.CONFLICT;
      case NO_TABLE -> ProblemKind.DAMAGED;
      case REFERS_TO_NOTHING, REFERS_TO_NOTHING_IN_H2 -> ProblemKind.NOT_THERE;
      default -> ofCode(sql.getErrorCode());
    };
  }

  private static ProblemKind ofCode(int code) {
    return switch (code) {
      case ErrorCode.DATABASE_ALREADY_OPEN_1 -> ProblemKind.IN_USE;
      case ErrorCode.FILE_CORRUPTED_1 -> ProblemKind.DAMAGED;
      case ErrorCode.FILE_VERSION_ERROR_1 -> ProblemKind.NEWER;
      case ErrorCode.DATABASE_IS_READ_ONLY -> ProblemKind.READ_ONLY;
      case ErrorCode.DATABASE_NOT_FOUND_WITH_IF_EXISTS_1, ErrorCode.DATABASE_NOT_FOUND_1 ->
          ProblemKind.NO_SUCH;
      case ErrorCode.IO_EXCEPTION_1, ErrorCode.IO_EXCEPTION_2 -> ProblemKind.DISK;
      case ErrorCode.DATABASE_IS_CLOSED,
          ErrorCode.DATABASE_CALLED_AT_SHUTDOWN,
          ErrorCode.OBJECT_CLOSED ->
          ProblemKind.CLOSED;
      default -> ProblemKind.UNEXPECTED;
    };
  }
}
