package sillet.logbook.forecast;

import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.FretCents;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.Verdict;
import sillet.logbook.strings.FittedString;
import sillet.logbook.text.Message;

/**
 * What a change will ask of one string.
 *
 * @param now as it is
 * @param then what will be on the instrument in its place
 * @param tension now and then; null where no tension gives one of the pitches, the notes say so
 * @param figures the move from where the saddle stands now to where the new string wants it; {@code
 *     cents12Before} is fret 12 of the new string with the saddle left alone; null if it could not
 *     be solved, the notes say why
 * @param verdict whether that fits into the travel
 * @param neck notes of the new string by fret, with the saddle left alone and after the move
 * @param notes sentences for people, the most important first
 */
public record StringForecast(
    BenchString now,
    FittedString then,
    @Nullable StringTension tension,
    @Nullable MoveFigures figures,
    Verdict verdict,
    List<FretCents> neck,
    List<Message> notes) {

  /** Copies the lists. */
  public StringForecast {
    neck = List.copyOf(neck);
    notes = List.copyOf(notes);
  }
}
