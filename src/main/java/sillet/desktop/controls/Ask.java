package sillet.desktop.controls;

import java.nio.file.Path;
import java.util.Optional;
import sillet.logbook.text.Message;

/** Questions that need a window of the system or of our own; a test answers them itself. */
public interface Ask {
  /** Where to write a file; empty when the technician thinks better of it. */
  Optional<Path> fileToSave(String suggestedName);

  /** Which file to open; empty when the technician thinks better of it. */
  Optional<Path> fileToOpen();

  /** A yes or no. Only where data would be lost otherwise. */
  boolean confirm(Message question);

  /** Something went wrong that belongs to no field on the screen. Waits until it is read. */
  void problem(Message what);
}
