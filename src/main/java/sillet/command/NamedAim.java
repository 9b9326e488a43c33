package sillet.command;

import sillet.logbook.moves.AimChoice;

/** The aims the command line knows by name. */
enum NamedAim {
  OCTAVE,
  NECK;

  AimChoice choice() {
    return switch (this) {
      case OCTAVE -> AimChoice.OCTAVE;
      case NECK -> AimChoice.NECK;
    };
  }
}
