package sillet.sheets.csv;

import java.io.Closeable;
import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Message;

/** A sheet on the disk, open for as long as it is worked with, so that it can be read twice. */
public final class SheetFile implements Closeable {
  private final FileChannel channel;

  private SheetFile(FileChannel channel) {
    this.channel = channel;
  }

  /**
   * Opens a file.
   *
   * @throws SheetRefused if there is no such file, or it cannot be read
   */
  public static SheetFile open(Path path) {
    String name = path.toString();
    if (!Files.exists(path)) {
      throw SheetRefused.file("file.missing", name);
    }
    if (Files.isDirectory(path)) {
      throw SheetRefused.file("file.folder", name);
    }
    if (!Files.isRegularFile(path)) {
      throw SheetRefused.file("file.not-plain", name);
    }
    try {
      return new SheetFile(FileChannel.open(path));
    } catch (IOException refused) {
      throw SheetRefused.file("file.closed", name);
    }
  }

  /**
   * Reads the file from its beginning.
   *
   * @param refusals takes what is wrong with single rows
   * @throws Unreadable if this is no text
   */
  public CsvRows rows(Remarks refusals) throws Unreadable {
    try {
      char separator = separator();
      return new CsvRows(lines(), separator, refusals);
    } catch (IOException broken) {
      throw new Unreadable(
          new Remark(
              Place.file(), Message.of("file.unreadable", String.valueOf(broken.getMessage()))));
    }
  }

  private Lines lines() throws IOException {
    channel.position(0);
    return new Lines(new Characters(channel));
  }

  private char separator() throws IOException {
    Lines lines = lines();
    List<String> first = new ArrayList<>();
    try {
      @Nullable String line = lines.next();
      while (line != null && first.size() < Separator.LINES) {
        first.add(line);
        line = lines.next();
      }
    } catch (Unreadable metAgain) {
      // whoever reads the rows comes to the same place and reports it after the rows before it
      return Separator.of(first);
    }
    return Separator.of(first);
  }

  @Override
  public void close() throws IOException {
    channel.close();
  }
}
