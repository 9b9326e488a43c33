package sillet.store.engine;

import java.nio.file.Path;

/**
 * Builds the address of a database. H2 runs what stands after a semicolon as settings, some of them
 * code, and reads a backslash as a folder sign, so a path that holds either is refused.
 */
public final class DatabaseUrl {
  /** What H2 adds to the path in its address. */
  public static final String SUFFIX = ".mv.db";

  private static final String FILE = "jdbc:h2:file:";

  /** Every commit is written at once; the database stays open until it is closed on purpose. */
  private static final String WORKING = ";WRITE_DELAY=0;DB_CLOSE_DELAY=-1;TRACE_LEVEL_FILE=0";

  /** Only ever at the end of the file: what went into freed space was not found after a kill. */
  private static final String AT_THE_END = ";REUSE_SPACE=FALSE";

  private DatabaseUrl() {}

  /**
   * Tells whether a path may stand in an address.
   *
   * @param path as text
   * @param separator the sign between folders on this system
   * @return true if H2 would take it as this path and as nothing else
   */
  public static boolean allows(String path, String separator) {
    boolean backslashMeansAnother = path.indexOf('\\') >= 0 && !separator.equals("\\");
    return path.indexOf(';') < 0
        && path.chars().noneMatch(Character::isISOControl)
        && !backslashMeansAnother;
  }

  static String toWork(Path file, String scheme) {
    return plain(file, scheme) + WORKING + AT_THE_END + ";IFEXISTS=TRUE";
  }

  static String toCreate(Path file, String scheme) {
    return plain(file, scheme) + WORKING;
  }

  /** Whether an address is that of a file. */
  static boolean ofAFile(String url) {
    return url.startsWith(FILE);
  }

  /** To give back freed space, from an address without settings. */
  static String toTidy(String url) {
    return url + WORKING + ";IFEXISTS=TRUE";
  }

  static String toLook(Path file, String scheme) {
    return plain(file, scheme) + ";ACCESS_MODE_DATA=r;TRACE_LEVEL_FILE=0;IFEXISTS=TRUE";
  }

  static String inMemory(String name) {
    return "jdbc:h2:mem:" + name + WORKING;
  }

  private static String plain(Path file, String scheme) {
    String path = file.toAbsolutePath().toString();
    if (!path.endsWith(SUFFIX) || !allows(path, file.getFileSystem().getSeparator())) {
      throw new LogbookProblem(ProblemKind.BAD_PLACE, path, null);
    }
    return FILE + scheme + path.substring(0, path.length() - SUFFIX.length());
  }
}
