package sillet.desktop.shell;

import sillet.desktop.theme.TextSize;
import sillet.desktop.theme.Theme;

/** How the window looks to this person. */
record Settings(Theme theme, TextSize textSize) {
  /** Light at first start, at the usual size. */
  static final Settings USUAL = new Settings(Theme.LIGHT, TextSize.USUAL);

  Settings with(Theme other) {
    return new Settings(other, textSize);
  }

  Settings with(TextSize other) {
    return new Settings(theme, other);
  }
}
