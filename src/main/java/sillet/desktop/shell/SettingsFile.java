package sillet.desktop.shell;

import static java.nio.file.StandardCopyOption.ATOMIC_MOVE;
import static java.nio.file.StandardCopyOption.REPLACE_EXISTING;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.attribute.FileAttribute;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.HashMap;
import java.util.Map;
import sillet.desktop.theme.TextSize;
import sillet.desktop.theme.Theme;
import sillet.logbook.text.Rejection;

/**
 * The small file beside the logbook that keeps theme and text size. It is written beside its place
 * and moved there, so that it is never half written. What it does not know stays as usual.
 */
final class SettingsFile {
  private static final String NAME = "window-settings.txt";
  private static final String THEME = "theme";
  private static final String TEXT = "text-percent";

  private final Path folder;
  private final Path file;

  SettingsFile(Path folder) {
    this.folder = folder;
    this.file = folder.resolve(NAME);
  }

  Path file() {
    return file;
  }

  /**
   * Reads the file.
   *
   * @return what it says; as usual where there is none
   * @throws Rejection if there is one that cannot be read
   */
  Settings fetch() {
    try {
      return read();
    } catch (IOException trouble) {
      throw Rejection.of("shell.settings-not-read", file.toString());
    }
  }

  /**
   * Writes the file.
   *
   * @return what was written
   * @throws Rejection if it does not come to lie at its place; what lay there stays
   */
  Settings keep(Settings settings) {
    try {
      write(settings);
      return settings;
    } catch (IOException trouble) {
      throw Rejection.of("shell.settings-not-kept", file.toString());
    }
  }

  private Settings read() throws IOException {
    Map<String, String> lines = new HashMap<>();
    try {
      for (String line : Files.readString(file, StandardCharsets.UTF_8).split("\n", -1)) {
        int sign = line.indexOf('=');
        if (sign > 0) {
          lines.put(line.substring(0, sign).strip(), line.substring(sign + 1).strip());
        }
      }
    } catch (NoSuchFileException none) {
      return Settings.USUAL;
    }
    Theme theme = Theme.ofWord(lines.getOrDefault(THEME, "")).orElse(Settings.USUAL.theme());
    return new Settings(theme, textSize(lines.getOrDefault(TEXT, "")));
  }

  private void write(Settings settings) throws IOException {
    Files.createDirectories(folder, onlyOwner());
    Path beside = folder.resolve(NAME + ".new");
    String text =
        THEME
            + "="
            + settings.theme().word()
            + "\n"
            + TEXT
            + "="
            + settings.textSize().percent()
            + "\n";
    Files.writeString(beside, text, StandardCharsets.UTF_8);
    Files.move(beside, file, ATOMIC_MOVE, REPLACE_EXISTING);
  }

  /** The folder is the logbook's too, and nobody else's business. */
  private FileAttribute<?>[] onlyOwner() {
    return folder.getFileSystem().supportedFileAttributeViews().contains("posix")
        ? new FileAttribute<?>[] {
          PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString("rwx------"))
        }
        : new FileAttribute<?>[0];
  }

  private static TextSize textSize(String written) {
    return written.matches("\\d{1,4}")
        ? TextSize.nearest(Integer.parseInt(written))
        : Settings.USUAL.textSize();
  }
}
