package sillet.logbook.moves;

import java.util.Map;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.wire.Construction;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.units.Pitch;
import sillet.logbook.units.Tries;

/** Strings for tests: a 648 mm scale, an M3 screw (0.50 mm a turn, ISO 261). */
final class BenchStrings {
  static final double M3_PITCH_MM = 0.5;

  private BenchStrings() {}

  static BenchString plain10(String cents12) {
    return string(1, "E4", .010, Construction.PLAIN_STEEL, cents12, room(null, null, false));
  }

  static BenchString plain17(String cents12) {
    return string(3, "G3", .017, Construction.PLAIN_STEEL, cents12, room(null, null, false));
  }

  static BenchString wound46(String cents12) {
    return string(6, "E2", .046, Construction.WOUND_STEEL, cents12, room(null, null, false));
  }

  static BenchString plain10(String cents12, SaddleRoom room) {
    return string(1, "E4", .010, Construction.PLAIN_STEEL, cents12, room);
  }

  static SaddleRoom room(@Nullable Double backMm, @Nullable Double forwardMm, boolean onePiece) {
    return new SaddleRoom(
        onePiece ? null : M3_PITCH_MM,
        backMm,
        forwardMm,
        onePiece ? SaddleKind.ONE_PIECE : SaddleKind.SCREW,
        null,
        NutMovable.NO);
  }

  static BenchString string(
      int number,
      String pitch,
      double gaugeIn,
      Construction construction,
      String cents12,
      SaddleRoom room) {
    FittedString fitted =
        new FittedString(
            number, Pitch.parse(pitch, 440), 648, StringMake.of(gaugeIn, construction));
    NoteReadings readings = NoteReadings.of(Map.of(12, Tries.parse(cents12)));
    return new BenchString("test", fitted, Heights.NOT_KNOWN, room, readings);
  }
}
