package sillet.store.place;

import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import org.jspecify.annotations.Nullable;
import sillet.store.engine.DatabaseUrl;
import sillet.store.engine.LogbookProblem;
import sillet.store.engine.ProblemKind;

/**
 * Where one logbook lies.
 *
 * @param file absolute path of its file, which ends in {@code .mv.db}
 */
public record LogbookPlace(Path file) {
  /** The variable that names a place when no option does. */
  public static final String VARIABLE = "SILLET_LOGBOOK";

  private static final String USUAL_FILE = "logbook" + DatabaseUrl.SUFFIX;
  private static final String FOLDER = "sillet";

  /** Refuses paths that the database would read as something else. */
  public LogbookPlace {
    file = file.toAbsolutePath().normalize();
    if (!DatabaseUrl.allows(file.toString(), file.getFileSystem().getSeparator())
        || !file.toString().endsWith(DatabaseUrl.SUFFIX)) {
      throw new LogbookProblem(ProblemKind.BAD_PLACE, file.toString(), null);
    }
  }

  /**
   * The place that was asked for: by option, else by variable, else the usual one.
   *
   * @param option text of the option, null if it was not given
   * @param around the process
   * @return the place
   * @throws LogbookProblem of kind BAD_PLACE if the text cannot be one
   */
  public static LogbookPlace choose(@Nullable String option, Surroundings around) {
    String named = option == null ? around.variable(VARIABLE) : option;
    return named == null ? usual(around) : of(named);
  }

  /**
   * A place named by a text: the file of a logbook, with or without {@code .mv.db}, or a folder
   * (one that exists, or any name with a separator at its end) in which {@code logbook.mv.db} lies.
   *
   * @param text as typed
   * @return the place
   * @throws LogbookProblem of kind BAD_PLACE if the text is blank or holds a semicolon, a control
   *     character or a foreign separator
   */
  public static LogbookPlace of(String text) {
    Path path;
    try {
      path = Path.of(text);
    } catch (InvalidPathException unfit) {
      throw new LogbookProblem(ProblemKind.BAD_PLACE, text, unfit);
    }
    if (text.isBlank() || !DatabaseUrl.allows(text, path.getFileSystem().getSeparator())) {
      throw new LogbookProblem(ProblemKind.BAD_PLACE, text, null);
    }
    boolean folder = text.endsWith("/") || text.endsWith(path.getFileSystem().getSeparator());
    if (folder || Files.isDirectory(path)) {
      return new LogbookPlace(path.resolve(USUAL_FILE));
    }
    return new LogbookPlace(
        text.endsWith(DatabaseUrl.SUFFIX) ? path : Path.of(text + DatabaseUrl.SUFFIX));
  }

  /**
   * The usual place: in the platform's folder for the data of programs.
   *
   * @param around the process
   * @return the place
   */
  public static LogbookPlace usual(Surroundings around) {
    return new LogbookPlace(dataFolder(around).resolve(FOLDER).resolve(USUAL_FILE));
  }

  private static Path dataFolder(Surroundings around) {
    if (around.windows()) {
      String roaming = around.variable("APPDATA");
      return roaming == null
          ? around.home().resolve("AppData").resolve("Roaming")
          : Path.of(roaming);
    }
    if (around.mac()) {
      return around.home().resolve("Library").resolve("Application Support");
    }
    String data = around.variable("XDG_DATA_HOME");
    // the XDG base directory specification has a relative path there ignored
    return data == null || !Path.of(data).isAbsolute()
        ? around.home().resolve(".local").resolve("share")
        : Path.of(data);
  }
}
