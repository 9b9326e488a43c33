package sillet.logbook.units;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.logbook.text.Quoted;
import sillet.logbook.text.Rejection;

/**
 * The pitch a string is tuned to, as typed and in hertz.
 *
 * @param typed a note with octave as {@code E4}, {@code F#3}, {@code Bb2}, or hertz as {@code
 *     329.63}
 * @param hz frequency, above zero
 */
public record Pitch(String typed, double hz) {
  /** The usual reference, A4 in hertz (ISO 16:1975). */
  public static final double CONCERT_A4_HZ = 440;

  private static final Pattern NOTE = Pattern.compile("([A-Ga-g])([#b\u266f\u266d]?)(-?\\d)");
  private static final String SEMITONES_FROM_C = "C D EF G A B";
  private static final int A4_FROM_C0 = 57;

  /**
   * Reads a pitch.
   *
   * @param text a note with its octave, or hertz
   * @param referenceHz what A4 is here, in hertz
   * @return the pitch
   * @throws Rejection if it is neither
   */
  public static Pitch parse(String text, double referenceHz) {
    String trimmed = text.strip();
    Matcher note = NOTE.matcher(trimmed);
    return note.matches() ? ofNote(note, referenceHz) : ofHertz(trimmed);
  }

  private static Pitch ofNote(Matcher note, double referenceHz) {
    String letter = note.group(1).toUpperCase(Locale.ROOT);
    String accidental = note.group(2).replace('\u266f', '#').replace('\u266d', 'b');
    int shift = accidental.isEmpty() ? 0 : accidental.equals("#") ? 1 : -1;
    int octave = Integer.parseInt(note.group(3));
    int fromA4 = SEMITONES_FROM_C.indexOf(letter) + shift + 12 * octave - A4_FROM_C0;
    double hz = EqualTemperament.frequency(fromA4, referenceHz);
    return new Pitch(letter + accidental + octave, hz);
  }

  private static Pitch ofHertz(String text) {
    double hz;
    try {
      hz = DecimalText.parse(text).value();
    } catch (Rejection unreadable) {
      if (unreadable.reason().key().equals("number.ambiguous")) {
        throw unreadable;
      }
      throw Rejection.of("pitch.none", Quoted.of(text));
    }
    if (hz <= 0) {
      throw Rejection.of("pitch.none", Quoted.of(text));
    }
    return new Pitch(text, hz);
  }

  /**
   * The same pitch, tuned a little off on purpose.
   *
   * @param cents positive is sharp
   * @return the pitch with its frequency shifted, the name kept
   */
  public Pitch shifted(double cents) {
    return new Pitch(typed, hz * Math.pow(2, cents / 1200));
  }
}
