package sillet.desktop.shell;

import javafx.application.Application;
import sillet.store.place.LogbookPlace;

/** The way into the window. */
public final class SilletWindow {
  private SilletWindow() {}

  /**
   * Opens the window and returns when it is closed. There must be a display: the toolkit throws
   * where there is none.
   *
   * @param own where the shop's logbook lies or will lie
   */
  public static void open(LogbookPlace own) {
    Application.launch(WindowApplication.class, own.file().toString());
  }
}
