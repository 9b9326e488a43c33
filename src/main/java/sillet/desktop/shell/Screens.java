package sillet.desktop.shell;

import sillet.desktop.controls.Screen;

/** Makes the screen of a place. */
interface Screens {
  Screen at(Place place);
}
