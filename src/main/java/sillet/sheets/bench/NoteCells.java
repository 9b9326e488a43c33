package sillet.sheets.bench;

import java.util.Locale;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.readings.Reference;
import sillet.logbook.moves.NoteReadings;
import sillet.logbook.plausible.Plausibility;
import sillet.logbook.text.Message;
import sillet.logbook.text.Quoted;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.units.Tries;

/** Reads what the tuner said. */
final class NoteCells {
  private static final Plausibility USUAL = new Plausibility(LengthUnit.MM);

  private NoteCells() {}

  static NoteReadings read(Cells cells) {
    TreeMap<Integer, Tries> frets = new TreeMap<>();
    for (int fret = 1; fret <= Columns.FRETS; fret++) {
      Tries tries = tries(cells, Columns.fret(fret));
      if (tries != null) {
        frets.put(fret, tries);
      }
    }
    Tries open = tries(cells, Columns.OPEN);
    Reference against =
        BenchCells.word(cells, Columns.AGAINST, Reference.values(), NoteCells::word);
    return new NoteReadings(
        frets, open, against == null ? Reference.OPEN : against, sdCents(cells));
  }

  private static @Nullable Tries tries(Cells cells, String name) {
    String text = cells.text(name);
    if (text.isEmpty()) {
      return null;
    }
    try {
      return Tries.parse(text);
    } catch (Rejection rejection) {
      boolean noNumber = rejection.reason().key().equals("number.none");
      cells.refuse(
          name, noNumber ? Message.of("bench.reading-none", Quoted.of(text)) : rejection.reason());
      return null;
    }
  }

  private static double sdCents(Cells cells) {
    Double sd = cells.notBelowZero(Columns.SD);
    if (sd == null) {
      return NoteReadings.USUAL_SD_CENTS;
    }
    cells.warn(Columns.SD, USUAL.sdCents(sd));
    return sd;
  }

  private static String word(Reference reference) {
    return reference.name().toLowerCase(Locale.ROOT);
  }
}
