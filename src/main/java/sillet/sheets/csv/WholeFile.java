package sillet.sheets.csv;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.channels.Channels;
import java.nio.channels.FileChannel;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.UUID;

/**
 * A file that is there whole or not at all: written beside its place, put on the disk, then moved
 * over. What stood there before stays until that moment.
 */
public final class WholeFile {
  /** Writes what belongs into the file. */
  @FunctionalInterface
  public interface Content {
    void writeTo(OutputStream out) throws IOException;
  }

  private WholeFile() {}

  /**
   * Writes a file.
   *
   * @param target where; a device or a pipe is written to directly, since nothing may take its
   *     place
   * @throws IOException if it could not be written; then nothing has changed
   */
  public static void write(Path target, Content content) throws IOException {
    if (Files.exists(target) && !Files.isRegularFile(target)) {
      try (OutputStream out = Files.newOutputStream(target, StandardOpenOption.WRITE)) {
        content.writeTo(out);
      }
      return;
    }
    // a link stays a link: its file is replaced
    Path place = Files.exists(target) ? target.toRealPath() : target.toAbsolutePath();
    Path beside = place.resolveSibling("." + place.getFileName() + "." + UUID.randomUUID());
    Path folder = place.getParent();
    if (folder == null || !Files.isDirectory(folder)) {
      throw new NoSuchFileException(target.toString());
    }
    try {
      writeBeside(beside, content);
      moveOver(beside, place);
    } catch (AccessDeniedException denied) {
      // the name that was asked for, not that of the draft
      AccessDeniedException named = new AccessDeniedException(target.toString());
      named.initCause(denied);
      throw named;
    } finally {
      Files.deleteIfExists(beside);
    }
  }

  private static void writeBeside(Path beside, Content content) throws IOException {
    try (FileChannel channel =
            FileChannel.open(beside, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE);
        OutputStream out = Channels.newOutputStream(channel)) {
      // for whoever ends the program in the middle of it
      beside.toFile().deleteOnExit();
      content.writeTo(out);
      channel.force(true);
    }
  }

  private static void moveOver(Path beside, Path place) throws IOException {
    try {
      Files.move(beside, place, StandardCopyOption.ATOMIC_MOVE);
    } catch (AtomicMoveNotSupportedException notHere) {
      Files.move(beside, place, StandardCopyOption.REPLACE_EXISTING);
    }
  }
}
