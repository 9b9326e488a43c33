package sillet.desktop.shell;

import java.util.logging.Level;
import java.util.logging.Logger;
import javafx.application.Application;
import sillet.store.place.LogbookPlace;

/** The way into the window. */
public final class SilletWindow {
  /** Held here because a logger nobody holds forgets its level. */
  private static final Logger TOOLKIT = Logger.getLogger("javafx");

  private SilletWindow() {}

  /**
   * Opens the window and returns when it is closed. There must be a display: the toolkit throws
   * where there is none.
   *
   * @param own where the shop's logbook lies or will lie
   */
  public static void open(LogbookPlace own) {
    // the toolkit warns at each start from the class path, which is how Sillet is shipped
    TOOLKIT.setLevel(Level.SEVERE);
    Application.launch(WindowApplication.class, own.file().toString());
  }
}
