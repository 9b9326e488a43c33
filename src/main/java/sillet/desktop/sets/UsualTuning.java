package sillet.desktop.sets;

import java.util.List;
import sillet.acoustics.wire.Construction;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;

/**
 * The tuning and scale that a set is first shown at, guessed from how many strings it has and how
 * thick they are; to be typed over. Common practice, no source.
 */
enum UsualTuning {
  SIX("E4 B3 G3 D3 A2 E2", 648),
  SIX_NYLON("E4 B3 G3 D3 A2 E2", 650),
  SEVEN("E4 B3 G3 D3 A2 E2 B1", 648),
  TWELVE("E4 E4 B3 B3 G3 G4 D3 D4 A2 A3 E2 E3", 648),
  BASS_FOUR("G2 D2 A1 E1", 864),
  BASS_FIVE("G2 D2 A1 E1 B0", 864),
  BASS_SIX("C3 G2 D2 A1 E1 B0", 864),
  TENOR("A4 D4 G3 C3", 580),
  UKULELE("A4 E4 C4 G4", 380),
  BANJO("D4 B3 G3 D3 G4", 670),
  MANDOLIN("E5 E5 A4 A4 D4 D4 G3 G3", 352),
  OTHER("", 648);

  private static final double BASS_FROM_IN = 0.028;

  private final String pitches;
  private final double scaleMm;

  UsualTuning(String pitches, double scaleMm) {
    this.pitches = pitches;
    this.scaleMm = scaleMm;
  }

  String pitches() {
    return pitches;
  }

  double scaleMm() {
    return scaleMm;
  }

  static UsualTuning of(StringSet set) {
    List<StringMake> strings = set.strings();
    if (strings.isEmpty()) {
      return OTHER;
    }
    boolean soft = soft(strings.get(0).construction());
    boolean thick = !soft && strings.get(0).gaugeIn() >= BASS_FROM_IN;
    return switch (strings.size()) {
      case 4 -> thick ? BASS_FOUR : soft ? UKULELE : TENOR;
      case 5 -> thick ? BASS_FIVE : BANJO;
      case 6 -> thick ? BASS_SIX : soft ? SIX_NYLON : SIX;
      case 7 -> SEVEN;
      case 8 -> MANDOLIN;
      case 12 -> TWELVE;
      default -> OTHER;
    };
  }

  private static boolean soft(Construction construction) {
    return switch (construction) {
      case PLAIN_NYLON, PLAIN_FLUOROCARBON, WOUND_NYLON, PLAIN_GUT -> true;
      case PLAIN_STEEL, WOUND_STEEL, WOUND_NICKEL, WOUND_BRONZE -> false;
    };
  }
}
