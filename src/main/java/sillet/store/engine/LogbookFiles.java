package sillet.store.engine;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.FileAttribute;
import java.nio.file.attribute.PosixFilePermissions;

/**
 * Folder and file of a logbook, for their owner only and made before H2 sees them: what H2 makes
 * itself, everybody may read. Nothing here may open the file while a database works in it, since
 * closing any handle on a file frees the lock that keeps a second program out.
 */
final class LogbookFiles {
  private static final String FOLDER_RIGHTS = "rwx------";
  private static final String FILE_RIGHTS = "rw-------";

  private LogbookFiles() {}

  /** Makes a file beside the place of the logbook in which a new one can grow. */
  static Path draftFor(Path file) throws IOException {
    Path folder = folderOf(file);
    Files.createDirectories(folder, onlyOwner(folder, FOLDER_RIGHTS));
    return Files.createTempFile(
        folder, "new-logbook-", DatabaseUrl.SUFFIX, onlyOwner(folder, FILE_RIGHTS));
  }

  /**
   * Puts a finished logbook into its place, whole or not at all, and never over another one.
   *
   * @throws FileAlreadyExistsException if something lies there by now
   */
  static void publish(Path draft, Path file) throws IOException {
    try (FileChannel channel = FileChannel.open(draft, StandardOpenOption.WRITE)) {
      channel.force(true);
    }
    try {
      // a second name, unlike a move, fails when somebody else was faster
      Files.createLink(file, draft);
      Files.delete(draft);
    } catch (FileAlreadyExistsException taken) {
      throw taken;
    } catch (UnsupportedOperationException | FileSystemException noLinks) {
      Files.move(draft, file);
    }
    forceFolder(folderOf(file));
  }

  private static void forceFolder(Path folder) throws IOException {
    if (posix(folder)) {
      try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
        channel.force(true);
      }
    }
  }

  private static Path folderOf(Path file) {
    Path parent = file.toAbsolutePath().getParent();
    if (parent == null) {
      throw new LogbookProblem(ProblemKind.BAD_PLACE, file.toString(), null);
    }
    return parent;
  }

  private static FileAttribute<?>[] onlyOwner(Path path, String rights) {
    return posix(path)
        ? new FileAttribute<?>[] {
          PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString(rights))
        }
        : new FileAttribute<?>[0];
  }

  private static boolean posix(Path path) {
    return path.getFileSystem().supportedFileAttributeViews().contains("posix");
  }
}
