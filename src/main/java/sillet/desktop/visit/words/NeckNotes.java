package sillet.desktop.visit.words;

import java.util.ArrayList;
import java.util.List;
import sillet.desktop.visit.readings.CentsText;
import sillet.logbook.moves.FretCents;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;
import sillet.logbook.visits.StringPass;

/**
 * The notes of one string along the neck in figures.
 *
 * @param head which string
 * @param sum over frets 1 to 12, now and after the move; or that it has not been read
 * @param notes by fret; empty while nothing was read
 */
public record NeckNotes(String head, String sum, List<Note> notes) {
  /** Beyond the octave only what was read is shown, as on the drawing. */
  private static final int LAST_ESTIMATED = 12;

  /**
   * One note.
   *
   * @param fret its number
   * @param read else estimated, then the figures stand in brackets
   * @param now cents as it is
   * @param after cents after the move
   */
  public record Note(String fret, boolean read, String now, String after) {}

  public NeckNotes {
    notes = List.copyOf(notes);
  }

  /** The notes of a string in a pass. */
  public static NeckNotes of(StringPass string, Texts texts) {
    var fitted = string.string().string();
    String head =
        texts.say("visit.neck.string", Integer.toString(fitted.number()), fitted.pitch().typed());
    MoveAdvice advice = string.advice();
    MoveFigures figures = advice == null ? null : advice.figures();
    if (advice == null || figures == null) {
      return new NeckNotes(head, texts.say("visit.words.not-read"), List.of());
    }
    List<Note> notes = new ArrayList<>();
    advice.neck().stream()
        .filter(cents -> cents.read() || cents.fret() <= LAST_ESTIMATED)
        .forEach(cents -> notes.add(note(cents)));
    String sum =
        texts.say(
            "visit.neck.rms",
            Figures.fixed(figures.rmsBefore(), 1),
            Figures.fixed(figures.rmsAfter(), 1));
    return new NeckNotes(head, sum, notes);
  }

  private static Note note(FretCents cents) {
    String now = CentsText.of(cents.nowCents());
    String after = CentsText.of(cents.afterCents());
    return new Note(
        Integer.toString(cents.fret()),
        cents.read(),
        cents.read() ? now : "(" + now + ")",
        cents.read() ? after : "(" + after + ")");
  }
}
