package sillet.desktop.forecast;

import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import sillet.logbook.units.Figures;
import sillet.logbook.units.Pitch;

/** The name of a note so many semitones higher or lower. */
final class ShiftedNote {
  private static final Pattern NOTE = Pattern.compile("([A-G])([#b]?)(-?\\d)");
  private static final List<String> NAMES =
      List.of("C", "C#", "D", "Eb", "E", "F", "F#", "G", "G#", "A", "Bb", "B");
  private static final String SEMITONES_FROM_C = "C D EF G A B";
  private static final int OCTAVE = 12;

  private ShiftedNote() {}

  /** Whether a pitch is a note, and not a frequency. */
  static boolean isNote(Pitch pitch) {
    return NOTE.matcher(pitch.typed()).matches();
  }

  /** A note stays a note; hertz stay hertz. */
  static String of(Pitch pitch, int semitones) {
    Matcher note = NOTE.matcher(pitch.typed());
    if (!note.matches()) {
      return Figures.fixed(pitch.hz() * Math.pow(2, semitones / (double) OCTAVE), 2);
    }
    int sharp = note.group(2).equals("#") ? 1 : note.group(2).equals("b") ? -1 : 0;
    int from = SEMITONES_FROM_C.indexOf(note.group(1)) + sharp;
    int to = from + OCTAVE * Integer.parseInt(note.group(3)) + semitones;
    return NAMES.get(Math.floorMod(to, OCTAVE)) + Math.floorDiv(to, OCTAVE);
  }
}
