package sillet.store.engine;

import java.io.IOException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.util.UUID;
import java.util.function.Supplier;

/** Opens and creates logbooks and hands out their sessions. */
public final class Engine {
  private static final String MEMORY = "memory";

  private final String scheme;

  /** The engine for files on the disk and databases in memory. */
  public Engine() {
    this("");
  }

  /**
   * An engine that reaches its files through a layer known to H2.
   *
   * @param scheme prefix of the layer with its colon, empty for the disk itself
   */
  Engine(String scheme) {
    this.scheme = scheme;
  }

  /**
   * Opens an existing logbook, brought up to date.
   *
   * @param file with the suffix of H2
   * @return the open session
   * @throws LogbookProblem if there is none, or it is in use, damaged, newer or read-only
   */
  public Session open(Path file) {
    String place = file.toString();
    if (!Files.isRegularFile(file)) {
      throw new LogbookProblem(ProblemKind.NO_SUCH, place, null);
    }
    return session(
        place,
        () -> {
          int version = FirstLook.at(file, scheme);
          return Databases.connect(DatabaseUrl.toWork(file, scheme), place, version);
        });
  }

  /**
   * Makes an empty logbook and opens it. It appears at its place whole or not at all.
   *
   * @param file with the suffix of H2; nothing may be there
   * @return the open session
   * @throws LogbookProblem if something is there, or the place cannot be written
   */
  public Session create(Path file) {
    String place = file.toString();
    if (Files.exists(file)) {
      throw new LogbookProblem(ProblemKind.EXISTS, place, null);
    }
    try {
      Path draft = LogbookFiles.draftFor(file);
      try {
        session(place, () -> Databases.connect(DatabaseUrl.toCreate(draft, scheme), place, 0))
            .close();
        refuseUnfinished(draft, place);
        LogbookFiles.publish(draft, file);
      } finally {
        Files.deleteIfExists(draft);
      }
    } catch (FileAlreadyExistsException taken) {
      throw new LogbookProblem(ProblemKind.EXISTS, place, taken);
    } catch (IOException trouble) {
      throw ProblemSigns.read(trouble, place);
    }
    return open(file);
  }

  /** H2 may fail to write at its close and keep silent. */
  private void refuseUnfinished(Path draft, String place) {
    try {
      FirstLook.at(draft, scheme);
    } catch (LogbookProblem problem) {
      throw new LogbookProblem(ProblemKind.DISK, place, problem);
    }
  }

  /**
   * Makes an empty logbook that lives until it is closed.
   *
   * @return the open session
   */
  public Session inMemory() {
    String url = DatabaseUrl.inMemory(UUID.randomUUID().toString());
    return session(MEMORY, () -> Databases.connect(url, MEMORY, 0));
  }

  private static Session session(String place, Supplier<Connection> opening) {
    LogbookThread thread = new LogbookThread(place);
    boolean opened = false;
    try {
      Session session = new Session(place, thread, thread.call(opening));
      opened = true;
      return session;
    } finally {
      if (!opened) {
        thread.close();
      }
    }
  }
}
